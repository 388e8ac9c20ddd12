export { toeWorking }

import { degreesIn } from '../common/degrees.ts'
import { fn, math, num, sub } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<'toeAngle' | 'rimDiameter', number>
type Outputs = Record<'toeDistance' | 'totalToe', number>

function toeWorking({ toeAngle, rimDiameter }: Inputs, outputs: Outputs): CalculatorWorking {
  const both = sub('s', 'both')
  return {
    symbols: [
      { symbol: math('s'), means: say`front edge nearer the centre line than the back edge, one wheel` },
      { symbol: math('D'), means: say`diameter at which the gauge touches, ${figure(rimDiameter, 'mm', 6)}` },
      { symbol: math('δ'), means: say`toe of one wheel, toe-in positive, ${figure(toeAngle, 'deg', 6)}` },
    ],
    steps: [
      {
        title: 'One wheel, front edge to back edge',
        formula: math('s', '=', 'D', '×', fn('sin', 'δ')),
        numbers: math('s', '=', num(rimDiameter, 6), '×', fn('sin', degreesIn(toeAngle, 6))),
        result: figure(outputs.toeDistance, 'mm', 4),
      },
      {
        title: 'Both wheels, when each has the same',
        formula: math(both, '=', 2, '×', 's'),
        numbers: math(both, '=', 2, '×', num(outputs.toeDistance)),
        result: figure(outputs.totalToe, 'mm', 4),
      },
    ],
  }
}
