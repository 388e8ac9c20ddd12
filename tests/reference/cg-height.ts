export { cases }

import { all, create, type MathNumericType, type Matrix } from 'mathjs'
import { calculator } from '#shared/calculators/cg-height/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const mathjs = create(all ?? {})
const got = (inputs: Record<string, number>) => () => outputOf(calculator, inputs, 'cgHeight')

/**
 * The experiment itself: a rigid car turned with mathjs' rotation matrix until its front axle stands
 * `raisedBy` higher, and both axle loads solved from force and moment balance by lusolve.
 */
function frontAxleLoad(car: {
  mass: number
  wheelbase: number
  share: number
  aboveAxles: number
  raisedBy: number
}) {
  const angle = Math.asin(car.raisedBy / car.wheelbase)
  const turn = mathjs.rotationMatrix(angle) as Matrix<MathNumericType>
  const turned = (x: number, y: number) => mathjs.multiply(turn, mathjs.matrix([x, y])).toArray() as number[]
  const [front = NaN] = turned(car.wheelbase, 0)
  const [centre = NaN] = turned(car.share * car.wheelbase, car.aboveAxles)
  const grams = car.mass * 1000
  const loads = mathjs.lusolve(
    mathjs.matrix([
      [1, 1],
      [front, 0],
    ]),
    mathjs.matrix([grams, grams * centre]),
  ) as Matrix<MathNumericType>
  return (loads.toArray() as number[][])[0]?.[0] ?? NaN
}
const simulated = (car: {
  mass: number
  wheelbase: number
  share: number
  aboveAxles: number
  raisedBy: number
  tyreRadius: number
}): ReferenceCase => ({
  calculator: 'cg-height',
  unit: 'mm',
  what: `${car.mass} kg on ${car.wheelbase} mm, axle raised ${car.raisedBy} mm, centre of gravity ${car.aboveAxles} mm over the axles`,
  source:
    'The raised rigid car simulated with mathjs 15: rotationMatrix for the tilt, lusolve for the axle loads',
  evidence: 'computed independently',
  ...relative(car.tyreRadius + car.aboveAxles, 1e-9),
  toleranceReason: 'rounding of double precision in the difference of two near loads',
  got: got({
    mass: car.mass,
    wheelbase: car.wheelbase,
    raisedBy: car.raisedBy,
    tyreRadius: car.tyreRadius,
    frontLevel: car.mass * 1000 * car.share,
    frontRaised: frontAxleLoad(car),
  }),
})

const forward =
  'A rigid lifted car simulated forwards with Python 3.11 and mpmath 1.3.0, rear axle raised, loads of the other axle given'
const base = { calculator: 'cg-height', unit: 'mm', evidence: 'computed independently' } as const
const cases: readonly ReferenceCase[] = [
  // There the rear axle was raised and the front read; the raised axle carries the rest of the car.
  ...(
    [
      { mass: 3.2, wheelbase: 325, level: 1526.15385, raised: 1586.65094, by: 100, radius: 56, height: 75 },
      {
        mass: 1.65,
        wheelbase: 280,
        level: (1650 * 120) / 280,
        raised: 743.48082,
        by: 120,
        radius: 42,
        height: 55,
      },
    ] as const
  ).map(({ mass, wheelbase, level, raised, by, radius, height }): ReferenceCase => ({
    ...base,
    what: `${mass} kg on ${wheelbase} mm, one axle raised ${by} mm, the other gains ${(raised - level).toFixed(1)} g`,
    source: forward,
    expected: height,
    tolerance: 1e-5,
    toleranceReason: 'the loads are given to eight digits, which is 0.3 mm a gram times 0.00001 g',
    got: got({
      mass,
      wheelbase,
      frontLevel: mass * 1000 - level,
      frontRaised: mass * 1000 - raised,
      raisedBy: by,
      tyreRadius: radius,
    }),
  })),
  {
    ...base,
    what: 'full-size car of 3,400 lb, wheelbase 9.5 ft, axle raised 2 ft (a thousandth of the weight, 30 mm for a foot)',
    source: forward,
    expected: 45,
    tolerance: 1e-4,
    toleranceReason: 'the load is given to eight digits; 30 mm stand for 1 ft, so 1.5 ft are 45 mm',
    got: got({
      mass: 3.4,
      wheelbase: 285,
      frontLevel: 3400 - 2040,
      frontRaised: 3400 - 2078.5368,
      raisedBy: 60,
      tyreRadius: 30,
    }),
  },
  {
    ...base,
    what: 'van: axles 1,150 and 1,350 kg, wheelbase 3,640 mm, front raised 1 m, then 1,051.88223 kg in front (a tenth of the size)',
    source:
      'The chain of formulas (1) to (9) in a van maker’s body-builder guideline (vwn-aufbaurichtlinien.de, section 3.5, read), evaluated with mpmath 1.3.0: 500 mm above the axle line',
    expected: 50 + 57.5,
    tolerance: 1e-5,
    toleranceReason: 'the load is given to a hundredth of a gram in a car of this size',
    got: got({
      mass: 2.5,
      wheelbase: 364,
      frontLevel: 1150,
      frontRaised: 1051.88223,
      raisedBy: 100,
      tyreRadius: 57.5,
    }),
  },
  simulated({ mass: 3.6, wheelbase: 325, share: 0.48, aboveAxles: -12.5, raisedBy: 100, tyreRadius: 57.5 }),
  simulated({ mass: 1.7, wheelbase: 255, share: 0.41, aboveAxles: 6, raisedBy: 150, tyreRadius: 32 }),
]
