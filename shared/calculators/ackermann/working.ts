export { ackermannWorking }

import { degreesIn, tangent } from '../common/degrees.ts'
import { fn, frac, math, num, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking } from '../definition.ts'
import type { Steering } from './steering.ts'

type Outputs = Record<'idealInnerAngle' | 'ackermann' | 'turnRadius', number>

const inner = sub('δ', 'in')
const outer = sub('δ', 'out')
const ideal = sub('δ', 'ideal')
const cot = (angle: MathPart) => fn('cot', angle)
const share = (one: MathPart, two: MathPart, three: MathPart) =>
  row(100, '×', frac(row(one, '−', two), row(three, '−', two)))

function ackermannWorking(inputs: Steering, outputs: Outputs): CalculatorWorking {
  const { wheelbase, kingpinSpacing, outerAngle, innerAngle } = inputs
  const cotIdeal = 1 / tangent(outerAngle) - kingpinSpacing / wheelbase
  const [out, into] = [degreesIn(outerAngle, 6), degreesIn(innerAngle, 6)]
  return {
    symbols: [
      { symbol: math('L'), means: say`wheelbase, ${figure(wheelbase, 'mm', 6)}` },
      { symbol: math('t'), means: say`between the steering pivots, ${figure(kingpinSpacing, 'mm', 6)}` },
      { symbol: math(outer), means: say`outer wheel, ${figure(outerAngle, 'deg', 6)}` },
      { symbol: math(inner), means: say`inner wheel, ${figure(innerAngle, 'deg', 6)}` },
      { symbol: math(ideal), means: say`inner wheel that follows the turn without scrubbing` },
      { symbol: math('R'), means: say`radius of the turn at the middle of the rear axle` },
    ],
    steps: [
      {
        title: 'Cotangent of the ideal inner angle',
        formula: math(cot(ideal), '=', cot(outer), '−', frac('t', 'L')),
        numbers: math(cot(ideal), '=', cot(out), '−', frac(num(kingpinSpacing, 6), num(wheelbase, 6))),
        result: figure(cotIdeal, '1', 5),
      },
      {
        title: 'The ideal inner angle itself',
        formula: math(ideal, '=', fn('arccot', row('(', cot(ideal), ')'))),
        numbers: math(ideal, '=', fn('arccot', num(cotIdeal, 5))),
        result: figure(outputs.idealInnerAngle, 'deg', 5),
      },
      {
        title: 'How much of the ideal difference is there',
        formula: math('A', '=', share(inner, outer, ideal)),
        numbers: math('A', '=', share(into, out, degreesIn(outputs.idealInnerAngle, 5))),
        result: figure(outputs.ackermann, '%', 4),
      },
      {
        title: 'Radius of the turn',
        formula: math('R', '=', 'L', '×', cot(outer), '−', frac('t', 2)),
        numbers: math('R', '=', num(wheelbase, 6), '×', cot(out), '−', frac(num(kingpinSpacing, 6), 2)),
        result: figure(outputs.turnRadius, 'mm', 5),
      },
    ],
  }
}
