export { cases }

import { cot, derivative, evaluate } from 'mathjs'
import { ackermannShares, idealOuterAngle } from '#shared/calculators/ackermann/steering.ts'
import { calculator } from '#shared/calculators/ackermann/index.ts'
import { outputOf, type ReferenceCase } from './reference-case.ts'

const run =
  (wheelbase: number, kingpinSpacing: number, outerAngle: number, innerAngle: number, key: string) => () =>
    outputOf(calculator, { wheelbase, kingpinSpacing, outerAngle, innerAngle }, key)

const mpmath =
  'The condition cot δ_out − cot δ_in = t/L solved for the outer wheel with mpmath 1.3.0 at 30 digits'
const lastDigit = 'half a unit of the last digit given'
const base = { calculator: 'ackermann', unit: 'deg' } as const

/** The ideal inner angle without an arctangent: Newton's method with a derivative taken by mathjs. */
function innerByIteration(spacing: number, wheelbase: number, outer: number): number {
  const condition = `cot(${outer} deg) - cot(x) - ${spacing}/${wheelbase}`
  const slope = derivative(`-cot(x)`, 'x')
  let x = (outer * Math.PI) / 180
  for (let round = 0; round < 50; round += 1) {
    x -= (evaluate(condition, { x }) as number) / (slope.evaluate({ x }) as number)
  }
  if (Math.abs(cot((outer * Math.PI) / 180) - cot(x) - spacing / wheelbase) > 1e-12)
    throw new Error('No root.')
  return (x * 180) / Math.PI
}

const cases: readonly ReferenceCase[] = [
  {
    ...base,
    what: 'outer wheel for 18° inside, pivots 0.44 of the wheelbase apart',
    source: 'S. S. Rattan, Theory of Machines, chapter on lower-pair mechanisms, worked example: 15.9°',
    evidence: 'from memory',
    expected: 15.9,
    tolerance: 0.05,
    toleranceReason: 'half a unit of the last printed digit',
    got: () => idealOuterAngle({ wheelbase: 1000, kingpinSpacing: 440 }, 18),
  },
  {
    ...base,
    what: 'outer wheel for 28° inside, wheelbase 2.6 m, pivots 1.5 m apart',
    source: `Inputs of an engineering examination question; its answer was not visible. ${mpmath}`,
    evidence: 'computed independently',
    expected: 22.141056,
    tolerance: 5e-7,
    toleranceReason: lastDigit,
    got: () => idealOuterAngle({ wheelbase: 2600, kingpinSpacing: 1500 }, 28),
  },
  // The same tables read backwards: from their outer angle the calculator must find their inner one.
  ...(
    [
      [120, 280, 30, 24.836098, 544.974226],
      [120, 280, 20, 17.476953, 829.293677],
      [150, 325, 35, 27.88727, 539.148102],
    ] as const
  ).flatMap(([spacing, wheelbase, inner, outer, radius]): ReferenceCase[] => [
    {
      ...base,
      what: `ideal inner wheel for ${outer}° outside, ${spacing} mm on ${wheelbase} mm`,
      source: mpmath,
      evidence: 'computed independently',
      expected: inner,
      tolerance: 1e-6,
      toleranceReason:
        'half a unit of the last digit of the outer angle, which grows on the way to the inner one',
      got: run(wheelbase, spacing, outer, inner, 'idealInnerAngle'),
    },
    {
      ...base,
      unit: 'mm',
      what: `turn radius for ${outer}° outside, ${spacing} mm on ${wheelbase} mm`,
      source: 'L/tan δ_in + t/2 with the inner angle, evaluated with mpmath 1.3.0 at 30 digits',
      evidence: 'computed independently',
      expected: radius,
      tolerance: 5e-5,
      toleranceReason: 'half a unit of the last digit of the outer angle moves the radius by as much',
      got: run(wheelbase, spacing, outer, inner, 'turnRadius'),
    },
  ]),
  ...(
    [
      ['angles against the ideal inner wheel', 'byInner', 27, 49.18614],
      ['angles against the ideal outer wheel', 'byOuter', 27, 58.0956],
      ['cotangents', 'byCotangent', 27, 53.79726],
      ['angles against the ideal inner wheel', 'byInner', 32, -23.59066],
      ['angles against the ideal outer wheel', 'byOuter', 32, -38.7304],
      ['cotangents', 'byCotangent', 32, -30.7338],
    ] as const
  ).map(([what, key, outer, expected]): ReferenceCase => ({
    ...base,
    unit: '%',
    what: `Ackermann by ${what}, 30° inside and ${outer}° outside, 120 mm on 280 mm`,
    source: 'The three definitions evaluated with mpmath 1.3.0 at 30 digits',
    evidence: 'computed independently',
    expected,
    tolerance: 5e-6,
    toleranceReason: lastDigit,
    got: () =>
      ackermannShares({ wheelbase: 280, kingpinSpacing: 120, outerAngle: outer, innerAngle: 30 })[key],
  })),
  ...(
    [
      [200, 325, 25],
      [200, 325, 50],
      [120, 280, 3],
    ] as const
  ).map(([spacing, wheelbase, outer]): ReferenceCase => ({
    ...base,
    what: `ideal inner wheel for ${outer}° outside, ${spacing} mm on ${wheelbase} mm`,
    source: 'Newton’s method on the condition of cotangents with mathjs 15, its derivative taken by mathjs',
    evidence: 'computed independently',
    expected: innerByIteration(spacing, wheelbase, outer),
    tolerance: 1e-9,
    toleranceReason: 'rounding of double precision over the iteration',
    got: run(wheelbase, spacing, outer, outer, 'idealInnerAngle'),
  })),
]
