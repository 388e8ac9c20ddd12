export { cases }

import { all, create, type BigNumber } from 'mathjs'
import { blendLogLinear, blendRefutas } from '#shared/calculators/fluid-blend/blend.ts'
import { calculator } from '#shared/calculators/fluid-blend/index.ts'
import { outputOf, type ReferenceCase } from './reference-case.ts'

const highFraction =
  (lowViscosity: number, highViscosity: number, targetViscosity: number, key = 'highFraction') =>
  () =>
    outputOf(calculator, { lowViscosity, highViscosity, targetViscosity }, key)

// The published rule typed into a general-purpose computer algebra library, with 40 digits instead of the
// double's 16.
const precise = create(all ?? {}, { number: 'BigNumber', precision: 40 })
const mathjs = (expression: string): number => (precise.evaluate(expression) as BigNumber).toNumber()
const vbn = (viscosity: number) => `(14.534 * log(log(${viscosity} + 0.8)) + 10.975)`

const published =
  'The two rules worked for three oils of 46, 100 and 10 cSt at shares 0.5, 0.3 and 0.2 on a general chemical-engineering page'
const mpmath =
  'The published formula evaluated with mpmath 1.3.0 at 30 digits (and again in GNU Octave 7.3.0 for the 100 and 1,000 cSt pair)'
const threeOils = [
  { share: 0.5, viscosity: 46 },
  { share: 0.3, viscosity: 100 },
  { share: 0.2, viscosity: 10 },
]
const lastDigit = 'half a unit of the last printed digit'

const base = { calculator: 'fluid-blend', unit: '1' } as const
const cases: readonly ReferenceCase[] = [
  {
    ...base,
    what: 'log-linear blend of three oils',
    source: published,
    evidence: 'read',
    unit: 'cSt',
    expected: 42.79,
    tolerance: 0.005,
    toleranceReason: lastDigit,
    got: () => blendLogLinear(threeOils),
  },
  {
    ...base,
    what: 'Refutas blend of the same three oils',
    source: published,
    evidence: 'read',
    unit: 'cSt',
    expected: 39.23,
    tolerance: 0.005,
    toleranceReason: lastDigit,
    got: () => blendRefutas(threeOils),
  },
  {
    ...base,
    what: 'share of 1,000 in 100 cSt for 200 cSt, which is the common logarithm of 2',
    source: 'Any table of common logarithms: log₁₀ 2 = 0.30103',
    evidence: 'from memory',
    expected: 0.30103,
    tolerance: 5e-6,
    toleranceReason: lastDigit,
    got: highFraction(100, 1000, 200),
  },
  ...(
    [
      [350, 1000, 500, 0.33974798, 0.35833961],
      [100, 1000, 200, 0.30103, 0.34476499],
      [350, 500, 450, 0.70460354, 0.71062252],
      [5000, 10000, 7000, 0.48542683, 0.49519226],
    ] as const
  ).flatMap(([low, high, target, logLinear, refutas]): ReferenceCase[] => [
    {
      ...base,
      what: `share of ${high} in ${low} cSt for ${target} cSt, log-linear`,
      source: `Arrhenius' rule. ${mpmath}`,
      evidence: 'computed independently',
      expected: logLinear,
      tolerance: 5e-9,
      toleranceReason: lastDigit,
      got: highFraction(low, high, target),
    },
    {
      ...base,
      what: `share of ${high} in ${low} cSt for ${target} cSt, Refutas`,
      source: `Maples' blending number. ${mpmath}`,
      evidence: 'computed independently',
      expected: refutas,
      tolerance: 5e-9,
      toleranceReason: lastDigit,
      got: highFraction(low, high, target, 'highFractionVbn'),
    },
  ]),
  {
    ...base,
    what: 'share of 30,000 in 20,000 cSt for 25,000 cSt, Refutas',
    source: 'Maples’ blending number evaluated with mathjs 15 at 40 digits',
    evidence: 'computed independently',
    expected: mathjs(`(${vbn(25000)} - ${vbn(20000)}) / (${vbn(30000)} - ${vbn(20000)})`),
    tolerance: 1e-12,
    toleranceReason: 'rounding of double precision in a difference of near numbers',
    got: highFraction(20000, 30000, 25000, 'highFractionVbn'),
  },
]
