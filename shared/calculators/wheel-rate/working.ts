export { wheelRateWorking }

import { frac, math, num, power, root, row, sub, type MathPart } from '../mathml.ts'
import { figure, say } from '../sentence.ts'
import type { CalculatorWorking } from '../definition.ts'
import type { CornerValues } from './corner.ts'

type Outputs = Record<
  'wheelRate' | 'rideFrequency' | 'criticalDamping' | 'dampingRatio' | 'staticDeflection',
  number
>

const wheel = sub('k', 'w')
const critical = sub('c', 'crit')
// On one line: where a browser has no font for mathematics, a root sign does not grow over a fraction.
const frequency = (rate: MathPart, mass: MathPart) =>
  row(frac('1', row('2', '×', 'π')), '×', root(rate, '/', mass))

function wheelRateWorking(
  { springRate, motionRatio, sprungMass, damping }: CornerValues,
  outputs: Outputs,
): CalculatorWorking {
  const [ratio, mass, perMetre] = [num(motionRatio, 6), num(sprungMass, 6), num(outputs.wheelRate * 1000, 5)]
  return {
    symbols: [
      { symbol: math('k'), means: say`rate of the spring, ${figure(springRate, 'N/mm', 6)}` },
      {
        symbol: math('r'),
        means: say`motion ratio: shock travel over wheel travel, ${figure(motionRatio, '1', 6)}`,
      },
      { symbol: math('m'), means: say`sprung weight of one wheel, ${figure(sprungMass, 'kg', 6)}` },
      { symbol: math('c'), means: say`damping at the shock, ${figure(damping, 'N·s/m', 6)}` },
      { symbol: math(wheel), means: say`rate at the wheel; in N/m it is 1,000 times the number in N/mm` },
      { symbol: math('g'), means: say`gravity, 9.80665 m/s²` },
    ],
    steps: [
      {
        title: 'Rate at the wheel',
        formula: math(wheel, '=', 'k', '×', power('r', '2')),
        numbers: math(wheel, '=', num(springRate, 6), '×', power(ratio, '2')),
        result: figure(outputs.wheelRate, 'N/mm', 4),
      },
      {
        title: 'How fast it would swing without a damper, with the rate in N/m',
        formula: math('f', '=', frequency(wheel, 'm')),
        numbers: math('f', '=', frequency(perMetre, mass)),
        result: figure(outputs.rideFrequency, 'Hz', 4),
      },
      {
        title: 'Damping at which it just no longer swings',
        formula: math(critical, '=', '2', '×', root(wheel, '×', 'm')),
        numbers: math(critical, '=', '2', '×', root(perMetre, '×', mass)),
        result: figure(outputs.criticalDamping, 'N·s/m', 4),
      },
      {
        title: 'Share of that which the shock gives at the wheel',
        formula: math('ζ', '=', frac(row('c', '×', power('r', '2')), critical)),
        numbers: math(
          'ζ',
          '=',
          frac(row(num(damping, 6), '×', power(ratio, '2')), num(outputs.criticalDamping)),
        ),
        result: figure(outputs.dampingRatio, '1', 4),
      },
      {
        title: 'How far the wheel gives under the weight alone, in mm with the rate in N/mm',
        formula: math('δ', '=', frac(row('m', '×', 'g'), wheel)),
        numbers: math('δ', '=', frac(row(mass, '×', '9.80665'), num(outputs.wheelRate, 5))),
        result: figure(outputs.staticDeflection, 'mm', 4),
      },
    ],
  }
}
