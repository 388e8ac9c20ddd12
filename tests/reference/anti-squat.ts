export { cases }

import { all, create, type MathNumericType, type Matrix, type Unit } from 'mathjs'
import { calculator } from '#shared/calculators/anti-squat/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const mathjs = create(all ?? {})
const got = (inputs: Record<string, number>, key: string) => () => outputOf(calculator, inputs, key)

/**
 * A car of two rigid parts, body and rear wheels, held in equilibrium by mathjs: unknown are both axle loads,
 * the rear spring's force and the guiding force of the arms, which is at right angles to the wheel's path.
 * Anti-squat is what the spring does not gain. Weight 1, so forces are in weights of the car.
 */
function solvedAsLinkage({
  pinAngle = 0,
  wheelbase = 0,
  cgHeight = 0,
  rearDriveShare = 0,
  acceleration = 0.5,
}) {
  const [sine, cosine] = [Math.sin((pinAngle * Math.PI) / 180), Math.cos((pinAngle * Math.PI) / 180)]
  const at = (a: number) => {
    const drive = (rearDriveShare / 100) * a
    // Rows: wheel along the car, wheel upwards, whole car upwards, whole car about the front contact.
    const matrix = [
      [0, 0, 0, cosine],
      [0, 1, -1, sine],
      [1, 1, 0, 0],
      [0, wheelbase, 0, 0],
    ]
    const right = [-drive, 0, 1, a * cgHeight + 0.52 * wheelbase]
    const solution = mathjs.lusolve(mathjs.matrix(matrix), mathjs.matrix(right)) as Matrix<MathNumericType>
    const [, rear = NaN, spring = NaN] = (solution.toArray() as number[][]).map(([value]) => value)
    return { rear, spring }
  }
  const [still, driven] = [at(0), at(acceleration)]
  return 100 * (1 - (driven.spring - still.spring) / (driven.rear - still.rear))
}

const twoWays = 'The formula and virtual work along the wheel’s path, both evaluated with mpmath 1.3.0'
const lastDigit = 'half a unit of the last digit given'
const base = { calculator: 'anti-squat', unit: '%' } as const
const cases: readonly ReferenceCase[] = [
  ...(
    [
      [3, 280, 65, 100, 22.57566, 5e-6],
      [3, 280, 65, 50, 11.28783, 5e-6],
      [2, 325, 90, 50, 6.305139, 5e-7],
    ] as const
  ).map(([pinAngle, wheelbase, cgHeight, rearDriveShare, expected, tolerance]): ReferenceCase => ({
    ...base,
    what: `pins ${pinAngle}°, wheelbase ${wheelbase}, height ${cgHeight} mm, ${rearDriveShare} % at the rear`,
    source: twoWays,
    evidence: 'computed independently',
    expected,
    tolerance,
    toleranceReason: lastDigit,
    got: got({ pinAngle, wheelbase, cgHeight, rearDriveShare }, 'antiSquat'),
  })),
  ...[
    { pinAngle: 2, wheelbase: 325, cgHeight: 45, rearDriveShare: 60 },
    { pinAngle: -4.5, wheelbase: 290, cgHeight: 38, rearDriveShare: 100 },
    { pinAngle: 12, wheelbase: 400, cgHeight: 70, rearDriveShare: 55 },
  ].map((inputs): ReferenceCase => ({
    ...base,
    what: `the car as a linkage in equilibrium, pins ${inputs.pinAngle}°, ${inputs.rearDriveShare} % at the rear`,
    source: 'Equilibrium of body and rear wheels as a linear system, solved with mathjs 15 (lusolve)',
    evidence: 'computed independently',
    ...relative(solvedAsLinkage(inputs), 1e-10),
    toleranceReason: 'rounding of double precision in the elimination',
    got: got(inputs, 'antiSquat'),
  })),
  {
    ...base,
    what: 'full-size car, 60 % of the force at the axle, 5.6° asked for 25 % (a tenth of the size)',
    source:
      'A kit-car builder’s worked example after H. Adams, Chassis Engineering (super7thheaven.co.uk): 25 % takes 5.6°',
    evidence: 'read',
    expected: 25,
    tolerance: 0.25,
    toleranceReason: 'half a unit of the last printed digit of the angle, 0.05°, is 0.22 %',
    got: got({ pinAngle: 5.6, wheelbase: 255, cgHeight: 60, rearDriveShare: 60 }, 'antiSquat'),
  },
  {
    ...base,
    unit: 'N',
    what: 'load moved in a car of 3,220 lb pushed with 804.4 lb, centre of gravity 24 in, axles 120 in (g for lb, mm for in)',
    source:
      'Meriam & Kraige, Dynamics, sample problem 6/1: axle loads 1,441.1 and 1,762.9 lb, so 160.88 lb move; inputs from a transcription, result worked out from them',
    evidence: 'read in a transcription',
    // Axle loads differ by twice the moved load, because the axles stand evenly before and behind.
    ...relative((((1762.9 - 1441.1) / 2) * 9.80665) / 1000, 5e-4),
    toleranceReason: 'the two axle loads are printed to a tenth of a pound, and their difference halved',
    got: got({ mass: 3.22, acceleration: 804.4 / 3220, cgHeight: 24, wheelbase: 120 }, 'loadTransfer'),
  },
  {
    ...base,
    unit: 'N',
    what: 'load moved at 0.5 g by 3.6 kg, 45 mm up on a wheelbase of 325 mm',
    source:
      'Barton & Fieldhouse, Automotive Chassis Engineering, p. 25, term m a h/(a + b) of equation 1.29, evaluated with units by mathjs 15',
    evidence: 'computed independently',
    ...relative((mathjs.evaluate('3.6 kg * 0.5 * gravity * 45 mm / 325 mm') as Unit).toNumber('N'), 1e-12),
    toleranceReason: 'rounding of double precision',
    got: got({}, 'loadTransfer'),
  },
]
