export { gearingWorking }

import { frac, math, num, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking } from '../definition.ts'
import type { GearTeeth } from './drive.ts'

type Inputs = GearTeeth & Record<'tyreDiameter' | 'motorKv' | 'cells' | 'voltsPerCell', number>
type Outputs = Record<'finalDriveRatio' | 'rollout' | 'motorSpeed' | 'speed', number>

const z = (gear: string) => sub('z', gear)
const steps = (spur: MathPart, pinion: MathPart, ring: MathPart, diffPinion: MathPart) =>
  row(frac(spur, pinion), '×', frac(ring, diffPinion))

function gearingWorking(inputs: Inputs, outputs: Outputs): CalculatorWorking {
  const { spurTeeth, pinionTeeth, ringTeeth, diffPinionTeeth, tyreDiameter, motorKv, cells, voltsPerCell } =
    inputs
  const teeth = (count: number) => num(count, 6)
  return {
    symbols: [
      {
        symbol: math(z('spur')),
        means: say`teeth of the spur gear, ${String(spurTeeth)}; the pinion has ${String(pinionTeeth)}`,
      },
      {
        symbol: math(z('ring')),
        means: say`teeth of the ring gear, ${String(ringTeeth)}; the diff’s pinion has ${String(diffPinionTeeth)}`,
      },
      { symbol: math('i'), means: say`final drive: turns of the motor for one turn of the wheels` },
      { symbol: math('D'), means: say`tyre diameter under load, ${figure(tyreDiameter, 'mm', 6)}` },
      { symbol: math('K'), means: say`motor constant kV, ${figure(motorKv, 'rpm/V', 6)}` },
      {
        symbol: math('U'),
        means: say`voltage of the battery: ${String(cells)} × ${figure(voltsPerCell, 'V', 4)}`,
      },
    ],
    steps: [
      {
        title: 'Final drive: driven over driving teeth, step by step',
        formula: math('i', '=', steps(z('spur'), z('pinion'), z('ring'), z('diff pinion'))),
        numbers: math(
          'i',
          '=',
          steps(teeth(spurTeeth), teeth(pinionTeeth), teeth(ringTeeth), teeth(diffPinionTeeth)),
        ),
        result: figure(outputs.finalDriveRatio, '1', 5),
      },
      {
        title: 'Distance for one turn of the motor',
        formula: math('s', '=', frac(row('π', '×', 'D'), 'i')),
        numbers: math('s', '=', frac(row('π', '×', num(tyreDiameter, 6)), num(outputs.finalDriveRatio, 5))),
        result: figure(outputs.rollout, 'mm/rev', 4),
      },
      {
        title: 'Speed of the motor without load',
        formula: math('n', '=', 'K', '×', 'U'),
        numbers: math('n', '=', num(motorKv, 6), '×', num(cells, 6), '×', num(voltsPerCell, 4)),
        result: figure(outputs.motorSpeed, 'rpm', 6),
      },
      {
        title: 'Speed of the car without load: 60 minutes to the hour, 1,000,000 mm to the kilometre',
        formula: math('v', '=', frac(row('n', '×', 's', '×', '60'), '1,000,000')),
        numbers: math(
          'v',
          '=',
          frac(row(num(outputs.motorSpeed, 6), '×', num(outputs.rollout, 5), '×', '60'), '1,000,000'),
        ),
        result: figure(outputs.speed, 'km/h', 4),
      },
    ],
  }
}
