export { cases }

import { evaluate, type Unit } from 'mathjs'
import { angleOfToe } from '#shared/calculators/toe/toe.ts'
import { calculator } from '#shared/calculators/toe/index.ts'
import { outputOf, type ReferenceCase } from './reference-case.ts'

const toe =
  (toeAngle: number, rimDiameter: number, key = 'toeDistance') =>
  () =>
    outputOf(calculator, { toeAngle, rimDiameter }, key)

const mpmath = 'D sin α evaluated with mpmath 1.3.0 at 30 digits'
const byUnits = 'mathjs 15, which carries degrees, inches and millimetres as units of its own'
const lastDigit = 'half a unit of the last digit given'
const rounding = 'rounding of double precision'

const base = { calculator: 'toe', unit: 'mm' } as const
const cases: readonly ReferenceCase[] = [
  ...(
    [
      [85, 1, 1.4834545],
      [85, 2, 2.9664572],
      [83, 1.5, 2.1726867],
      [400, 0.25, 1.7453237],
      [431.8, 0.2, 1.5072633],
    ] as const
  ).map(([diameter, angle, expected]): ReferenceCase => ({
    ...base,
    what: `${angle}° over ${diameter} mm, one wheel`,
    source: mpmath,
    evidence: 'computed independently',
    expected,
    tolerance: 5e-8,
    toleranceReason: lastDigit,
    got: toe(angle, diameter),
  })),
  {
    ...base,
    what: 'both wheels at 2° on an 83 mm rim',
    source: `83 mm × (sin 2° + sin 2°) with ${byUnits}`,
    evidence: 'computed independently',
    expected: (evaluate('83 mm * (sin(2 deg) + sin(2 deg))') as Unit).toNumber('mm'),
    tolerance: 1e-12,
    toleranceReason: rounding,
    got: toe(2, 83, 'totalToe'),
  },
  {
    ...base,
    what: 'toe-out of 0.75° on a rim of 3.25 in',
    source: `3.25 in × sin(−0.75°) with ${byUnits}`,
    evidence: 'computed independently',
    expected: (evaluate('3.25 inch * sin(-0.75 deg)') as Unit).toNumber('mm'),
    tolerance: 1e-12,
    toleranceReason: rounding,
    got: toe(-0.75, 3.25 * 25.4),
  },
  ...(
    [
      ['1 mm over 85 mm', 1, 85, 0.6740835],
      ['1/16 in over 28 in', 25.4 / 16, 28 * 25.4, 0.1278925],
    ] as const
  ).map(([what, distance, diameter, expected]): ReferenceCase => ({
    ...base,
    unit: 'deg',
    what: `the angle of ${what}`,
    source: 'asin(s/D) evaluated with mpmath 1.3.0 at 30 digits',
    evidence: 'computed independently',
    expected,
    tolerance: 5e-8,
    toleranceReason: lastDigit,
    got: () => angleOfToe(distance, diameter),
  })),
]
