export { cases }

import { all, create, type MathNumericType, type Matrix } from 'mathjs'
import { calculator } from '#shared/calculators/corner-weights/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const mathjs = create(all ?? {})

interface Car {
  frontLeft: number
  frontRight: number
  rearLeft: number
  rearRight: number
  wheelbase?: number
  trackFront?: number
  trackRear?: number
}
const got = (car: Car, key: string) => () => outputOf(calculator, { ...car }, key)

// Two cars of the project's list of check values; the shares and moments were evaluated with another tool.
const buggy: Car = {
  frontLeft: 750,
  frontRight: 790,
  rearLeft: 880,
  rearRight: 900,
  trackFront: 250,
  trackRear: 255,
}
const small: Car = {
  frontLeft: 400,
  frontRight: 420,
  rearLeft: 560,
  rearRight: 580,
  wheelbase: 280,
  trackFront: 212,
  trackRear: 214,
}
const mpmath =
  'Shares and moments as in Milliken & Milliken, Race Car Vehicle Dynamics, chapter 18 (from memory), evaluated with mpmath 1.3.0 at 30 digits'
const lastDigit = 'half a unit of the last digit given'
const halves = (front: number, rear: number): Car => ({
  frontLeft: front / 2,
  frontRight: front / 2,
  rearLeft: rear / 2,
  rearRight: rear / 2,
})

/**
 * Where the centre of gravity must be so that the car stands still: the three conditions of equilibrium
 * written as a linear system in weight, W·x and W·y, and solved by mathjs.
 */
function centreOfGravity({
  frontLeft,
  frontRight,
  rearLeft,
  rearRight,
  trackFront = 255,
  trackRear = 255,
  wheelbase = 325,
}: Car) {
  const wheels = [
    [0, trackFront / 2, frontLeft],
    [0, -trackFront / 2, frontRight],
    [wheelbase, trackRear / 2, rearLeft],
    [wheelbase, -trackRear / 2, rearRight],
  ] as const
  // Three different sums over the wheels, so that each of the three unknowns appears in two of them.
  const weights = [
    [1, 1, 0],
    [700, 0, 1],
    [-400, 300, 1],
  ]
  const right = weights.map(([one = 0, alongX = 0, alongY = 0]) =>
    wheels.reduce((sum, [x, y, load]) => sum + load * (one + alongX * x + alongY * y), 0),
  )
  const solved = mathjs.lusolve(mathjs.matrix(weights), mathjs.matrix(right)) as Matrix<MathNumericType>
  const [weight, momentX, momentY] = (solved.toArray() as number[][]).map(([value = NaN]) => value) as [
    number,
    number,
    number,
  ]
  return { x: momentX / weight, y: momentY / weight }
}
const uneven: Car = {
  frontLeft: 812,
  frontRight: 903,
  rearLeft: 997,
  rearRight: 921,
  trackFront: 248,
  trackRear: 252,
}
const solved = centreOfGravity(uneven)

const base = { calculator: 'corner-weights' } as const
const cases: readonly ReferenceCase[] = [
  ...(
    [
      ['whole car', 'total', buggy, 3320, 'g'],
      ['share of the front', 'frontShare', buggy, 46.385542, '%'],
      ['share of the left', 'leftShare', buggy, 49.096386, '%'],
      ['cross weight', 'crossWeight', buggy, 50.301205, '%'],
      ['centre of gravity behind the front axle', 'cgFromFrontAxle', buggy, 174.246988, 'mm'],
      ['centre of gravity, right counted minus', 'cgFromCentreLine', buggy, -2.274096, 'mm'],
      ['share of the front of the smaller car', 'frontShare', small, 41.836735, '%'],
      ['cross weight of the smaller car, exactly even', 'crossWeight', small, 50, '%'],
      ['centre of gravity of the smaller car', 'cgFromFrontAxle', small, 162.857143, 'mm'],
      [
        'centre of gravity of the smaller car, right counted minus',
        'cgFromCentreLine',
        small,
        -2.173469,
        'mm',
      ],
    ] as const
  ).map(([what, key, car, expected, unit]): ReferenceCase => ({
    ...base,
    what: `${what} (${car.frontLeft}, ${car.frontRight}, ${car.rearLeft}, ${car.rearRight} g)`,
    source: mpmath,
    evidence: 'computed independently',
    unit,
    expected,
    tolerance: 5e-7,
    toleranceReason: lastDigit,
    got: got(car, key),
  })),
  {
    ...base,
    what: 'car with 4,500 N on the front axle and 3,500 N on the rear, axles 2.4 m apart (a tenth of the size here)',
    source:
      'Worked school problem, asklearnings.org/asktema/6436263: the centre of gravity lies 1.05 m from the front wheels',
    evidence: 'read',
    unit: 'mm',
    ...relative(105, 1e-9),
    toleranceReason: 'the printed answer is exact: 2.4 m × 3,500/8,000',
    got: got({ ...halves(4500, 3500), wheelbase: 240 }, 'cgFromFrontAxle'),
  },
  {
    ...base,
    what: 'car of 1,800 kg whose front wheels carry 375 kg each and rear wheels 525 kg each, axles 1.8 m apart (a tenth of the size)',
    source:
      'Worked school problem, ask.learncbse.in/t/a-car-of-weight-1800-kg/13959: the centre of gravity is 1.05 m behind the front axle',
    evidence: 'read',
    unit: 'mm',
    ...relative(105, 1e-9),
    toleranceReason: 'the printed answer is exact',
    got: got(
      { frontLeft: 375, frontRight: 375, rearLeft: 525, rearRight: 525, wheelbase: 180 },
      'cgFromFrontAxle',
    ),
  },
  {
    ...base,
    what: 'small car of 1,808 lb with 813.6 lb on the front axle, axles 73.5 in apart (taken as g and twice as many mm)',
    source:
      'Moments worked on smartcarofamerica.com/threads/want-the-cg-of-the-451.18642: 40.425 in behind the front axle',
    evidence: 'read',
    unit: 'mm',
    expected: 80.85,
    tolerance: 0.001,
    toleranceReason: 'half a unit of the last printed digit, 0.0005 in, taken twice',
    got: got({ ...halves(813.6, 994.4), wheelbase: 147 }, 'cgFromFrontAxle'),
  },
  ...(
    [
      ['behind the front axle', 'cgFromFrontAxle', solved.x],
      ['left of the centre line', 'cgFromCentreLine', solved.y],
    ] as const
  ).map(([what, key, expected]): ReferenceCase => ({
    ...base,
    what: `centre of gravity ${what} (812, 903, 997, 921 g)`,
    source:
      'Equilibrium about three axes outside the car, solved as a linear system with mathjs 15 (lusolve)',
    evidence: 'computed independently',
    unit: 'mm',
    ...relative(expected, 1e-10),
    toleranceReason: 'rounding of double precision in the elimination',
    got: got(uneven, key),
  })),
]
