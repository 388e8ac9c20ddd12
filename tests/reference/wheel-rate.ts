export { cases }

import { evaluate, type Matrix } from 'mathjs'
import { atTheWheel } from '#shared/calculators/wheel-rate/corner.ts'
import { calculator } from '#shared/calculators/wheel-rate/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

type Key = 'wheelRate' | 'rideFrequency' | 'criticalDamping' | 'dampingRatio' | 'staticDeflection'

const pound = 0.45359237
const poundForce = 4.4482216152605
const smallCar = { springRate: 2.5, motionRatio: 0.62, sprungMass: 0.9, damping: 91.808061 }
const small = (key: Key) => () => outputOf(calculator, smallCar, key)

/**
 * The corner let go at 1 mm and integrated by the solver of mathjs: how long until it is at its next top, and how much of
 * the millimetre is left there. Nothing of the project's formulas is in it, only forces.
 */
function swing({ springRate, motionRatio, sprungMass, damping }: typeof smallCar) {
  const scope = { k: springRate * 1000, c: damping, r: motionRatio, m: sprungMass }
  const solved = evaluate(
    `pull(x, v) = r * (k * r * x + c * r * v)
    moving(t, y) = [y[2], -pull(y[1], y[2]) / m]
    solveODE(moving, [0, 0.4], [1, 0], { method: "RK45", tol: 1e-10, maxStep: 0.001 })`,
    scope,
  ).entries.at(-1) as { t: Matrix; y: Matrix }
  const times = solved.t.toArray() as number[]
  const states = solved.y.toArray() as [place: number, speed: number][]
  for (let index = 2; index < states.length; index += 1) {
    const [[placeBefore, before], [placeAfter, after]] = [
      states[index - 1] ?? [0, 0],
      states[index] ?? [0, 0],
    ]
    if (before <= 0 || after > 0) continue
    const [from = 0, to = 0] = [times[index - 1], times[index]]
    return {
      period: from + (before / (before - after)) * (to - from),
      left: Math.max(placeBefore, placeAfter),
    }
  }
  throw new Error('It does not swing back.')
}

const light = { ...smallCar, damping: 45.90403 }
const { period, left } = swing(light)
/** The logarithmic decrement of the integrated swing: for one period ln(1/left) = 2πζ/√(1 − ζ²). */
const decrement = Math.log(1 / left)
const dampingFromSwing = decrement / Math.hypot(2 * Math.PI, decrement)
const frequencyFromSwing = Math.hypot(2 * Math.PI, decrement) / (2 * Math.PI * period)

const meriam = (example: string) =>
  `J. L. Meriam and L. G. Kraige, Engineering Mechanics: Dynamics, sample problem ${example}, in the public Python companion notebooks of FOSSEE`
const mpmath = 'The formulas evaluated with mpmath 1.3.0 at 30 digits'
const lastDigit = 'half a unit of the last digit given'
const base = { calculator: 'wheel-rate' } as const
const weight = { springRate: (160 * poundForce) / 304.8, motionRatio: 1, sprungMass: 25 * pound, damping: 0 }
const damped = { springRate: 0.032, motionRatio: 1, sprungMass: 8, damping: 20 }

const cases: readonly ReferenceCase[] = [
  {
    ...base,
    what: 'body of 25 lb on a spring of 160 lb/ft: sag',
    source: `${meriam('8/1')}: 1.875 in`,
    evidence: 'read in a transcription',
    unit: 'in',
    expected: 1.875,
    tolerance: 1e-9,
    toleranceReason: 'weight over rate, an exact fraction; only rounding of doubles is left',
    got: () => atTheWheel(weight).staticDeflection / 25.4,
  },
  {
    ...base,
    what: 'the same body: frequency',
    source: `${meriam('8/1')}: 14.36 rad/s`,
    evidence: 'read in a transcription',
    unit: 'Hz',
    ...relative(14.36 / (2 * Math.PI), 1e-3),
    toleranceReason: 'the book takes gravity as 32.2 ft/s² and prints four digits',
    got: () => atTheWheel(weight).rideFrequency,
  },
  {
    ...base,
    what: 'body of 8 kg, spring 32 N/m, damper 20 N·s/m: damping ratio',
    source: `${meriam('8/2')}: 0.625`,
    evidence: 'read in a transcription',
    unit: '1',
    expected: 0.625,
    tolerance: 1e-12,
    toleranceReason: 'an exact fraction; only rounding of doubles is left',
    got: () => atTheWheel(damped).dampingRatio,
  },
  {
    ...base,
    what: 'road wheel of 40 kg between spring and tyre of 320.63 N/mm together: frequency',
    source:
      'D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering, Springer 2018, page 213 (fliphtml5.com/osspz/szqt/Automotive_Chassis_Engineering/224): 14.25 Hz',
    evidence: 'read',
    unit: 'Hz',
    expected: 14.25,
    tolerance: 0.005,
    toleranceReason: 'half a unit of the last printed digit',
    got: () => atTheWheel({ springRate: 320.63, motionRatio: 1, sprungMass: 40, damping: 0 }).rideFrequency,
  },
  ...(
    [
      ['wheelRate', 'N/mm', 0.961, 1e-9],
      ['rideFrequency', 'Hz', 5.200685, 5e-7],
      ['staticDeflection', 'mm', 9.184168, 5e-7],
      ['criticalDamping', 'N·s/m', 58.818364, 5e-7],
      ['dampingRatio', '1', 0.6, 1e-8],
    ] as const
  ).map(([key, unit, expected, tolerance]): ReferenceCase => ({
    ...base,
    what: `${key} of a small car: spring 2.5 N/mm, motion ratio 0.62, 0.9 kg, 91.808061 N·s/m`,
    source: mpmath,
    evidence: 'computed independently',
    unit,
    expected,
    tolerance,
    toleranceReason: lastDigit,
    got: small(key),
  })),
  {
    ...base,
    what: 'damping ratio of the same car with half the damping, from how its swing fades',
    source:
      'The motion integrated from forces alone with solveODE (Runge–Kutta 4/5) of mathjs 15.2.0, and its logarithmic decrement',
    evidence: 'computed independently',
    unit: '1',
    ...relative(dampingFromSwing, 1e-4),
    toleranceReason: 'the top of the swing is taken at a step of the integrator, at most 1 ms away',
    got: () => outputOf(calculator, light, 'dampingRatio'),
  },
  {
    ...base,
    what: 'ride frequency of the same car, from how long that swing takes',
    source: 'The motion integrated from forces alone with solveODE (Runge–Kutta 4/5) of mathjs 15.2.0',
    evidence: 'computed independently',
    unit: 'Hz',
    ...relative(frequencyFromSwing, 1e-4),
    toleranceReason: 'the moment of the turn is found by a straight line within a step of at most 1 ms',
    got: () => outputOf(calculator, light, 'rideFrequency'),
  },
]
