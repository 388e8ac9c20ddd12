export { heightWorking }

import { fn, frac, math, num, row, sub, type MathPart } from '../mathml.ts'
import { degreesIn } from '../common/degrees.ts'
import { figure, say } from '../sentence.ts'
import { raisedCar } from './raised-car.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<'mass' | 'wheelbase' | 'frontLevel' | 'frontRaised' | 'raisedBy' | 'tyreRadius', number>

const level = sub('F', 'level')
const raised = sub('F', 'raised')
const above = sub('h', 'axles')
const height = (radius: MathPart, over: MathPart) => row(radius, '+', over)

function heightWorking(inputs: Inputs, { cgHeight }: { cgHeight: number }): CalculatorWorking {
  const { mass, wheelbase, frontLevel, frontRaised, raisedBy, tyreRadius } = inputs
  const { angle, aboveAxles } = raisedCar(inputs)
  const length = num(wheelbase, 6)
  return {
    symbols: [
      { symbol: math('m'), means: say`weight of the car, ${figure(mass, 'kg', 6)}; in grams for the sum` },
      { symbol: math('L'), means: say`wheelbase, ${figure(wheelbase, 'mm', 6)}` },
      { symbol: math(level), means: say`front axle on the scale, car level, ${figure(frontLevel, 'g', 6)}` },
      {
        symbol: math(raised),
        means: say`front axle on the scale, that axle raised, ${figure(frontRaised, 'g', 6)}`,
      },
      { symbol: math('e'), means: say`how far it was raised, ${figure(raisedBy, 'mm', 6)}` },
      { symbol: math('r'), means: say`tyre radius, ${figure(tyreRadius, 'mm', 6)}` },
    ],
    steps: [
      {
        title: 'How far the car is tilted',
        formula: math(fn('sin', 'θ'), '=', frac('e', 'L')),
        numbers: math(fn('sin', 'θ'), '=', frac(num(raisedBy, 6), length)),
        result: figure(angle, 'deg', 5),
      },
      {
        title: 'Load that leaves the raised axle',
        formula: math('Δ', '=', level, '−', raised),
        numbers: math('Δ', '=', num(frontLevel, 6), '−', num(frontRaised, 6)),
        result: figure(frontLevel - frontRaised, 'g', 4),
      },
      {
        title: 'Centre of gravity above the line through the axles; minus means below',
        formula: math(above, '=', 'L', '×', frac('Δ', row('m', '×', fn('tan', 'θ')))),
        numbers: math(
          above,
          '=',
          length,
          '×',
          frac(num(frontLevel - frontRaised), row(num(mass * 1000, 6), '×', fn('tan', degreesIn(angle, 5)))),
        ),
        result: figure(aboveAxles, 'mm', 4),
      },
      {
        title: 'Above the ground',
        formula: math('h', '=', height('r', above)),
        numbers: math('h', '=', height(num(tyreRadius, 6), num(aboveAxles))),
        result: figure(cgHeight, 'mm', 4),
      },
    ],
  }
}
