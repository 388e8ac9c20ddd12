export { cases }

import { rollBalance, type BalanceValues } from '#shared/calculators/roll-balance/balance.ts'
import { calculator } from '#shared/calculators/roll-balance/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const base = { calculator: 'roll-balance' } as const
const pound = 0.45359237
const poundForce = 4.4482216152605
const foot = 304.8

const smallCar: BalanceValues = {
  mass: 3.2,
  frontWeight: (100 * 0.155) / 0.325,
  wheelbase: 325,
  cgHeight: 75,
  trackFront: 250,
  trackRear: 250,
  rollCentreFront: 12,
  rollCentreRear: 22,
  wheelRateFront: 2.4,
  wheelRateRear: 2.9,
  barRateFront: 0,
  barRateRear: 0,
  lateralAcceleration: 1,
}
/** The road car of Barton and Fieldhouse: sprung weight only, its axles split 54 to 46. */
const bartonAxles: BalanceValues = {
  mass: 1280,
  frontWeight: 54,
  wheelbase: 2500,
  cgHeight: 550,
  trackFront: 1460,
  trackRear: 1460,
  rollCentreFront: 70,
  rollCentreRear: 320,
  wheelRateFront: 20,
  wheelRateRear: 9,
  barRateFront: 0,
  barRateRear: 0,
  lateralAcceleration: 0.6,
}
/** The same body on its lever of 365 mm and 28,650 N·m/rad in all, half at each end. */
const bartonLean: BalanceValues = {
  ...bartonAxles,
  cgHeight: 365,
  rollCentreFront: 0,
  rollCentreRear: 0,
  lateralAcceleration: 1,
  wheelRateFront: 28.65 / 1.46 ** 2,
  wheelRateRear: 28.65 / 1.46 ** 2,
}
/** The race car of the textbook, 3,400 lb; its roll stiffnesses as rates on a track of 5 ft. */
const raceCar: BalanceValues = {
  mass: 3400 * pound,
  frontWeight: 60,
  wheelbase: 9.5 * foot,
  cgHeight: 1.5 * foot,
  trackFront: 5 * foot,
  trackRear: 5 * foot,
  rollCentreFront: 0.25 * foot,
  rollCentreRear: 0.625 * foot,
  wheelRateFront: 1222,
  wheelRateRear: 873,
  barRateFront: 0,
  barRateRear: 0,
  lateralAcceleration: 1,
}

/**
 * The textbook leaves out that the weight leans the car further. On springs ten million times as stiff the car hardly
 * leans, that part vanishes, and the shares are the textbook's.
 */
const hardlyLeaning = (values: BalanceValues) =>
  rollBalance({
    ...values,
    wheelRateFront: values.wheelRateFront * 1e7,
    wheelRateRear: values.wheelRateRear * 1e7,
  })

/** The lean by halving intervals, with the sines and tangents that the formula takes as the angle. Degrees. */
function leanByHalving(values: BalanceValues): number {
  const { lever } = rollBalance(values)
  const weight = values.mass * 9.80665
  const spring = (rate: number, track: number, angle: number) =>
    2 * rate * (track / 2) * Math.tan(angle) * (track / 2) * Math.cos(angle)
  const unbalanced = (angle: number) =>
    weight * values.lateralAcceleration * lever * Math.cos(angle) +
    weight * lever * Math.sin(angle) -
    spring(values.wheelRateFront + values.barRateFront, values.trackFront, angle) -
    spring(values.wheelRateRear + values.barRateRear, values.trackRear, angle)
  let [low, high] = [0, 0.5]
  for (let halving = 0; halving < 60; halving += 1) {
    const middle = (low + high) / 2
    if (unbalanced(middle) > 0) low = middle
    else high = middle
  }
  return (low * 180) / Math.PI
}

const barton =
  'D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering, Springer 2018, page 174 (fliphtml5.com/osspz/szqt/Automotive_Chassis_Engineering/185)'
const milliken =
  'The form of W. F. and D. L. Milliken, Race Car Vehicle Dynamics, chapter 16; inputs of its example read in a public program, result computed with mpmath 1.3.0'
const lastDigit = 'half a unit of the last digit given'
const defaults = Object.fromEntries(
  calculator.inputs.map((input) => [input.key, input.default]),
) as BalanceValues

const cases: readonly ReferenceCase[] = [
  ...(
    [
      ['front', 195],
      ['rear', 760],
    ] as const
  ).map(([end, expected]): ReferenceCase => ({
    ...base,
    what: `road car at 0.6 g: what moves across through the roll centre at the ${end}`,
    source: `${barton}: ${expected} N`,
    evidence: 'read',
    unit: 'N',
    expected,
    tolerance: 0.7,
    toleranceReason: 'printed without decimals, and the book takes gravity as 9.81 m/s², 0.03 % more',
    got: () => rollBalance(bartonAxles)[end].geometric,
  })),
  {
    ...base,
    what: 'the same car: lean for each g, with the weight’s part in it',
    source: `${barton}: 10.9 deg/g`,
    evidence: 'read',
    unit: 'deg',
    expected: 10.9,
    tolerance: 0.05,
    toleranceReason: 'half a unit of the last printed digit',
    got: () => rollBalance(bartonLean).rollAngle,
  },
  {
    ...base,
    what: 'roll stiffness of 100 lbf/in at the wheel on a track of 10 in',
    source: 'The imperial rule K = k t²/1375 in lbf·ft/deg, read in a public vehicle program',
    evidence: 'read',
    unit: 'N·m/deg',
    ...relative(((100 * 10 ** 2) / 1375) * poundForce * 0.3048, 1e-4),
    toleranceReason: '1375 is rounded from 24 × 180/π = 1375.099',
    got: () =>
      outputOf(
        calculator,
        { wheelRateFront: (100 * poundForce) / 25.4, barRateFront: 0, trackFront: 254 },
        'rollStiffnessFront',
      ),
  },
  ...(
    [
      ['front', 538.3036],
      ['rear', 481.6964],
    ] as const
  ).map(([end, expected]): ReferenceCase => ({
    ...base,
    what: `race car of 3,400 lb at 1 g, hardly leaning: what moves across at the ${end}`,
    source: milliken,
    evidence: 'computed independently',
    unit: 'lbf',
    ...relative(expected, 1e-6),
    toleranceReason: 'given with seven digits; what is left of the lean is smaller still',
    got: () => hardlyLeaning(raceCar)[end].moved / poundForce,
  })),
  ...(
    [
      ['front', 4.002083],
      ['rear', 5.412301],
    ] as const
  ).map(([end, expected]): ReferenceCase => ({
    ...base,
    what: `small car of 3.2 kg at 1 g, hardly leaning: what moves across at the ${end}`,
    source: 'The same form for a small car, computed with mpmath 1.3.0',
    evidence: 'computed independently',
    unit: 'N',
    ...relative(expected, 1e-6),
    toleranceReason: 'given with seven digits; what is left of the lean is smaller still',
    got: () => hardlyLeaning(smallCar)[end].moved,
  })),
  ...(
    [
      ['rollStiffnessFront', 'N·m/deg', 1.308997],
      ['rollStiffnessRear', 'N·m/deg', 1.581705],
      ['rollAngle', 'deg', 0.63408],
    ] as const
  ).map(([key, unit, expected]): ReferenceCase => ({
    ...base,
    what: `small car of 3.2 kg: ${key}`,
    source:
      'Roll stiffness from wheel rate and track, and lean with the weight’s part, computed with mpmath 1.3.0',
    evidence: 'computed independently',
    unit,
    expected,
    tolerance: 5.1e-7,
    toleranceReason: lastDigit,
    got: () => outputOf(calculator, smallCar, key),
  })),
  {
    ...base,
    what: 'lean of the default car, with sines and tangents in place of the angle',
    source: 'The balance of moments solved at test time by halving intervals, without the formula',
    evidence: 'computed independently',
    unit: 'deg',
    ...relative(leanByHalving(defaults), 1e-3),
    toleranceReason: 'at 1.9 degrees the formula’s small angle is worth 0.05 %',
    got: () => outputOf(calculator, {}, 'rollAngle'),
  },
]
