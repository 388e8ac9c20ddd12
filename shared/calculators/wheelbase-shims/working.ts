export { axleWorking }

import { fenced, frac, math, num, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { movedAxle } from './moved-axle.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<'wheelbase' | 'frontWeight' | 'rearAxleBack', number>
type Outputs = Record<'newWheelbase' | 'newFrontWeight' | 'rearLoadChange', number>

const longer = sub('L', 'new')
const after = sub('f', 'new')
const share = (distance: MathPart, back: MathPart, length: MathPart) =>
  row(100, '×', frac(row(distance, '+', back), length))

function axleWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { wheelbase, frontWeight, rearAxleBack } = inputs
  const { toRearAxle } = movedAxle(inputs)
  const back = num(rearAxleBack, 6)
  return {
    symbols: [
      { symbol: math('L'), means: say`wheelbase, ${figure(wheelbase, 'mm', 6)}` },
      { symbol: math('f'), means: say`weight on the front wheels, ${figure(frontWeight, '%', 6)}` },
      { symbol: math('e'), means: say`how far the rear axle moves back, ${figure(rearAxleBack, 'mm', 6)}` },
      { symbol: math('b'), means: say`distance of the centre of gravity from the rear axle, before` },
    ],
    steps: [
      {
        title: 'Centre of gravity before the rear axle, from the front share',
        formula: math('b', '=', 'L', '×', frac('f', 100)),
        numbers: math('b', '=', num(wheelbase, 6), '×', frac(num(frontWeight, 6), 100)),
        result: figure(toRearAxle, 'mm', 5),
      },
      {
        title: 'New wheelbase',
        formula: math(longer, '=', 'L', '+', 'e'),
        numbers: math(longer, '=', num(wheelbase, 6), '+', back),
        result: figure(outputs.newWheelbase, 'mm', 6),
      },
      {
        title: 'New share on the front wheels: the rear axle has moved away from the centre of gravity',
        formula: math(after, '=', share('b', 'e', longer)),
        numbers: math(after, '=', share(num(toRearAxle, 6), back, num(outputs.newWheelbase, 6))),
        result: figure(outputs.newFrontWeight, '%', 5),
      },
      {
        title: 'Change on the rear wheels, in per cent of the car’s weight',
        formula: math('Δ', '=', fenced(100, '−', after), '−', fenced(100, '−', 'f')),
        numbers: math('Δ', '=', num(frontWeight, 6), '−', num(outputs.newFrontWeight, 6)),
        result: figure(outputs.rearLoadChange, '%', 4),
      },
    ],
  }
}
