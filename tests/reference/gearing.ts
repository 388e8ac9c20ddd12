export { cases }

import { evaluate } from 'mathjs'
import { rollout } from '#shared/calculators/gearing/drive.ts'
import { calculator } from '#shared/calculators/gearing/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const output =
  (key: string, inputs: Record<string, number> = {}) =>
  () =>
    outputOf(calculator, inputs, key)

// 44/14 with 26/10 inside, 85 mm, 3,500 rpm/V on 7.4 V; and 48/13 with 43/13 inside, 112 mm, 2,000 rpm/V on 14.8 V.
const small = {
  spurTeeth: 44,
  pinionTeeth: 14,
  ringTeeth: 26,
  diffPinionTeeth: 10,
  tyreDiameter: 85,
  motorKv: 3500,
  cells: 2,
  voltsPerCell: 3.7,
}
const large = {
  spurTeeth: 48,
  pinionTeeth: 13,
  ringTeeth: 43,
  diffPinionTeeth: 13,
  tyreDiameter: 112,
  motorKv: 2000,
  cells: 4,
  voltsPerCell: 3.7,
}
const step = (spurTeeth: number, pinionTeeth: number) =>
  outputOf(calculator, { spurTeeth, pinionTeeth, ringTeeth: 1, diffPinionTeeth: 1 }, 'finalDriveRatio')

const base = { calculator: 'gearing' } as const
const mpmath = 'Ratio, circumference and speed evaluated with mpmath 1.3.0 at 30 digits'
const lastDigit = 'half a unit of the last digit given'
const rounding = 'the same arithmetic; only rounding of doubles is left'

const cases: readonly ReferenceCase[] = [
  {
    ...base,
    what: 'train of three steps, 20 to 50, 25 to 75 and 26 to 65 teeth, driven at 975 rev/min',
    source:
      'R. S. Khurmi and J. K. Gupta, Theory of Machines, example 13.1 (page 432), in the public Python companion notebooks of FOSSEE: 52 rev/min',
    evidence: 'read in a transcription',
    unit: 'rpm',
    expected: 52,
    tolerance: 1e-9,
    toleranceReason: 'the answer is a whole number; only rounding of doubles is left',
    got: () =>
      975 /
      (output('finalDriveRatio', { spurTeeth: 50, pinionTeeth: 20, ringTeeth: 75, diffPinionTeeth: 25 })() *
        step(65, 26)),
  },
  {
    ...base,
    what: 'speed of the default car by the engineering form v = 0.06 n U/i',
    source:
      'The formula was read at engineersedge.com (Vehicle Speed basis of engine rpm, tire size and gear ratios: n in rev/min, U in m, v in km/h); its value for this car was worked out here',
    evidence: 'computed independently',
    unit: 'km/h',
    ...relative((0.06 * 2050 * 4 * 3.7 * 2 * Math.PI * 0.0575) / ((46 / 15) * (43 / 11)), 1e-12),
    toleranceReason: rounding,
    got: output('speed'),
  },
  {
    ...base,
    what: 'turns of a wheel of 20 in at 55 mph',
    source:
      'A public article on engine speed at a road speed (speedyauto.cc, autoknowledge, 201603/201231), worked step by step: 924.4 rev/min',
    evidence: 'read',
    unit: 'rpm',
    expected: 924.4,
    tolerance: 0.06,
    toleranceReason: 'printed to a tenth after an earlier step was rounded to a tenth too',
    got: () =>
      (55 * 1609344) /
      60 /
      rollout(20 * 25.4, { spurTeeth: 1, pinionTeeth: 1, ringTeeth: 1, diffPinionTeeth: 1 }),
  },
  {
    ...base,
    what: 'speed of the default car with units carried along',
    source: 'mathjs 15.2.0: the expression with mm, minutes and km/h as its own units',
    evidence: 'computed independently',
    unit: 'km/h',
    ...relative(
      evaluate('number((115 mm * pi / (46/15 * 43/11)) * (2050 * 4 * 3.7) / (1 minute), km/hour)') as number,
      1e-12,
    ),
    toleranceReason: rounding,
    got: output('speed'),
  },
  ...(
    [
      ['44/14 with 26/10', small, 'finalDriveRatio', '1', 8.17143, 5e-6],
      ['44/14 with 26/10, 85 mm', small, 'rollout', 'mm/rev', 32.67915, 5e-6],
      ['3,500 rpm/V on 7.4 V', small, 'motorSpeed', 'rpm', 25900, 1e-6],
      ['44/14 with 26/10, 85 mm, 3,500 rpm/V on 7.4 V', small, 'speed', 'km/h', 50.7834, 5e-5],
      ['48/13 with 43/13', large, 'finalDriveRatio', '1', 12.21302, 5e-6],
      ['48/13 with 43/13, 112 mm', large, 'rollout', 'mm/rev', 28.81011, 5e-6],
      ['48/13 with 43/13, 112 mm, 2,000 rpm/V on 14.8 V', large, 'speed', 'km/h', 51.1668, 5e-5],
    ] as const
  ).map(([what, inputs, key, unit, expected, tolerance]): ReferenceCase => ({
    ...base,
    what: `${key} of ${what}`,
    source: mpmath,
    evidence: 'computed independently',
    unit,
    expected,
    tolerance,
    toleranceReason: lastDigit,
    got: output(key, inputs),
  })),
]
