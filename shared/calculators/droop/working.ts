export { droopWorking }

import { degreesIn } from '../common/degrees.ts'
import { fenced, fn, frac, math, num } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking } from '../definition.ts'

type Inputs = Record<'armLength' | 'screwRadius' | 'screwPitch' | 'turns', number>
type Outputs = Record<'screwTravel' | 'armAngle' | 'wheelTravel', number>

function droopWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { armLength, screwRadius, screwPitch, turns } = inputs
  return {
    symbols: [
      { symbol: math('p'), means: say`pitch of the screw, ${figure(screwPitch, 'mm', 6)}` },
      { symbol: math('n'), means: say`turns out, ${figure(turns, '1', 6)}` },
      { symbol: math('s'), means: say`how far the screw goes` },
      { symbol: math('r'), means: say`inner pin to screw, ${figure(screwRadius, 'mm', 6)}` },
      { symbol: math('θ'), means: say`how far the arm swings` },
      { symbol: math('L'), means: say`inner pin to outer pin, ${figure(armLength, 'mm', 6)}` },
      { symbol: math('w'), means: say`change of droop at the wheel` },
    ],
    steps: [
      {
        title: 'How far the screw goes',
        formula: math('s', '=', 'p', '×', 'n'),
        numbers: math('s', '=', num(screwPitch, 6), '×', num(turns, 6)),
        result: figure(outputs.screwTravel, 'mm', 4),
      },
      {
        title: 'How far the arm swings',
        formula: math('θ', '=', fn('arctan', fenced(frac('s', 'r')))),
        numbers: math('θ', '=', fn('arctan', fenced(frac(num(outputs.screwTravel), num(screwRadius, 6))))),
        result: figure(outputs.armAngle, 'deg', 4),
      },
      {
        title: 'How far the wheel moves',
        formula: math('w', '=', 'L', '×', fn('sin', 'θ')),
        numbers: math('w', '=', num(armLength, 6), '×', fn('sin', degreesIn(outputs.armAngle))),
        result: figure(outputs.wheelTravel, 'mm', 4),
      },
    ],
  }
}
