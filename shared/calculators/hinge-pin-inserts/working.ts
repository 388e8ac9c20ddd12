export { insertsWorking }

import { degreesIn } from '../common/degrees.ts'
import { fenced, fn, frac, math, num, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking } from '../definition.ts'
import type { Axle, Inserts } from './inserts.ts'

const front = (letter: string) => sub(letter, 'front')
const rear = (letter: string) => sub(letter, 'rear')
const slope = (base: MathPart, one: MathPart, other: MathPart, spacing: MathPart) =>
  row(base, '+', fn('arctan', fenced(frac(row(one, '−', other), spacing))))
const half = (one: MathPart, other: MathPart) => frac(row(one, '+', other), 2)

function insertsWorking(inputs: Inserts, outputs: Axle): CalculatorWorking {
  const { blockSpacing, frontOut, frontUp, rearOut, rearUp, baseToe, baseAngle } = inputs
  const mm = (value: number) => num(value, 6)
  const [toe0, angle0] = [sub('δ', '0'), sub('β', '0')]
  return {
    symbols: [
      { symbol: math('b'), means: say`front block to rear block, ${figure(blockSpacing, 'mm', 6)}` },
      { symbol: math(front('y')), means: say`hole out in the front block, ${figure(frontOut, 'mm', 6)}` },
      { symbol: math(rear('y')), means: say`hole out in the rear block, ${figure(rearOut, 'mm', 6)}` },
      { symbol: math(front('z')), means: say`hole up in the front block, ${figure(frontUp, 'mm', 6)}` },
      { symbol: math(rear('z')), means: say`hole up in the rear block, ${figure(rearUp, 'mm', 6)}` },
      { symbol: math(toe0), means: say`toe without inserts, ${figure(baseToe, 'deg', 6)}` },
      { symbol: math(angle0), means: say`pin angle without inserts, ${figure(baseAngle, 'deg', 6)}` },
    ],
    steps: [
      {
        title: 'Toe: the pin seen from above',
        formula: math('δ', '=', slope(toe0, rear('y'), front('y'), 'b')),
        numbers: math('δ', '=', slope(degreesIn(baseToe, 6), mm(rearOut), mm(frontOut), mm(blockSpacing))),
        result: figure(outputs.toe, 'deg', 4),
      },
      {
        title: 'Pin angle: the pin seen from the side',
        formula: math('β', '=', slope(angle0, front('z'), rear('z'), 'b')),
        numbers: math('β', '=', slope(degreesIn(baseAngle, 6), mm(frontUp), mm(rearUp), mm(blockSpacing))),
        result: figure(outputs.pinAngle, 'deg', 4),
      },
      {
        title: 'Height: the middle of the pin',
        formula: math('h', '=', half(front('z'), rear('z'))),
        numbers: math('h', '=', half(mm(frontUp), mm(rearUp))),
        result: figure(outputs.pinHeight, 'mm', 4),
      },
      {
        title: 'Track: the middle of the pin, on both sides',
        formula: math('t', '=', 2, '×', half(front('y'), rear('y'))),
        numbers: math('t', '=', 2, '×', half(mm(frontOut), mm(rearOut))),
        result: figure(outputs.trackChange, 'mm', 4),
      },
    ],
  }
}
