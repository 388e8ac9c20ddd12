export { squatWorking }

import { fenced, fn, frac, math, num, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import { degreesIn } from '../common/degrees.ts'
import { standardGravity } from '../common/standard-gravity.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<
  'pinAngle' | 'wheelbase' | 'cgHeight' | 'rearDriveShare' | 'mass' | 'acceleration',
  number
>
type Outputs = Record<'antiSquat' | 'loadTransfer' | 'springLoad', number>

const moved = sub('F', 'moved')
const sprung = sub('F', 'springs')
const share = (p: MathPart, angle: MathPart, length: MathPart, height: MathPart) =>
  row(p, '×', fn('tan', angle), '×', frac(length, height))
const transfer = (m: MathPart, a: MathPart, gravity: MathPart, height: MathPart, length: MathPart) =>
  frac(row(m, '×', a, '×', gravity, '×', height), length)

function squatWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { pinAngle, wheelbase, cgHeight, rearDriveShare, mass, acceleration } = inputs
  const [length, height] = [num(wheelbase, 6), num(cgHeight, 6)]
  const angle = degreesIn(pinAngle, 6)
  return {
    symbols: [
      {
        symbol: math('p'),
        means: say`the rear wheels’ share of the drive, ${figure(rearDriveShare, '%', 6)}`,
      },
      {
        symbol: math('β'),
        means: say`tilt of the rear hinge pins, front end higher counts plus, ${figure(pinAngle, 'deg', 6)}`,
      },
      { symbol: math('L'), means: say`wheelbase, ${figure(wheelbase, 'mm', 6)}` },
      { symbol: math('h'), means: say`height of the centre of gravity, ${figure(cgHeight, 'mm', 6)}` },
      { symbol: math('m'), means: say`weight of the car, ${figure(mass, 'kg', 6)}` },
      { symbol: math('a'), means: say`acceleration, ${figure(acceleration, 'g0', 6)}` },
      { symbol: math('g'), means: say`standard gravity, 9.80665 m/s²` },
    ],
    steps: [
      {
        title: 'Anti-squat: the part of the moved load that the arms carry',
        formula: math('A', '=', share('p', 'β', 'L', 'h')),
        numbers: math('A', '=', share(row(num(rearDriveShare, 6), '%'), angle, length, height)),
        result: figure(outputs.antiSquat, '%', 4),
      },
      {
        title: 'Load that moves from the front axle to the rear, in N',
        formula: math(moved, '=', transfer('m', 'a', 'g', 'h', 'L')),
        numbers: math(
          moved,
          '=',
          transfer(num(mass, 6), num(acceleration, 6), standardGravity, height, length),
        ),
        result: figure(outputs.loadTransfer, 'N', 4),
      },
      {
        title: 'What the rear springs still carry of it',
        formula: math(sprung, '=', moved, '×', fenced(1, '−', 'A')),
        numbers: math(
          sprung,
          '=',
          num(outputs.loadTransfer),
          '×',
          fenced(1, '−', num(outputs.antiSquat / 100)),
        ),
        result: figure(outputs.springLoad, 'N', 4),
      },
    ],
  }
}
