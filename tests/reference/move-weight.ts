export { cases }

import { all, create, type Matrix } from 'mathjs'
import { calculator } from '#shared/calculators/move-weight/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const mathjs = create(all ?? {})
const got = (inputs: Record<string, number>, key: string) => () => outputOf(calculator, inputs, key)

/** Ships in tons and feet, as kilograms in thousands and millimetres in tens: only ratios matter. */
const ship = (tons: number, weight: number, feet: number) => ({
  mass: tons / 1000,
  partMass: weight,
  moveUp: feet * 5,
})
const nicholls = (exercise: number, page: number) =>
  `Nicholls’s Seamanship and Nautical Knowledge, exercise ${exercise}, p. ${page}, with its printed answer (archive.org)`

/** A car of 36 equal pieces: the mean of all places, computed as a matrix mean by mathjs before and after. */
function meanOfPieces(): number {
  const places = Array.from({ length: 36 }, (_, index) => [9 * index - 40, 7 * (index % 5), 3 * (index % 7)])
  const moved = places.map((place, index) =>
    index < 4 ? [place[0] ?? 0, place[1] ?? 0, (place[2] ?? 0) - 12] : place,
  )
  const heights = (all: number[][]) =>
    (mathjs.mean(mathjs.matrix(all), 0) as unknown as Matrix).toArray() as number[]
  return (heights(moved)[2] ?? NaN) - (heights(places)[2] ?? NaN)
}

const base = { calculator: 'move-weight', unit: 'mm' } as const
const cases: readonly ReferenceCase[] = [
  {
    ...base,
    what: 'ship of 2,000 tons, 10 tons shifted 20 ft: the centre of gravity moves 0.1 ft (5 mm for a foot)',
    source: nicholls(35, 535),
    evidence: 'read',
    ...relative(0.1 * 5, 1e-9),
    toleranceReason: 'the printed answer is exact: 10 × 20/2,000',
    got: got(ship(2000, 10, 20), 'cgUp'),
  },
  {
    ...base,
    what: 'ship of 4,000 tons, 40 tons lowered 20 ft: metacentric height from 1.2 to 1.4 ft (5 mm for a foot)',
    source: nicholls(32, 535),
    evidence: 'read',
    ...relative(-0.2 * 5, 1e-9),
    toleranceReason: 'the printed heights differ by exactly 40 × 20/4,000',
    got: got(ship(4000, 40, -20), 'cgUp'),
  },
  {
    ...base,
    what: 'ship of 5,000 tons, 200 tons from 10 ft above to 10 ft below: from −3 to 6.6 inches (5 mm for a foot)',
    source: nicholls(23, 532),
    evidence: 'read',
    ...relative((-9.6 / 12) * 5, 1e-9),
    toleranceReason: 'the printed heights differ by exactly 0.8 ft',
    got: got(ship(5000, 200, -20), 'cgUp'),
  },
  {
    ...base,
    what: 'ship of 4,515 tonnes listed by 15 tonnes shifted 4.2 m: the centre of gravity moves 0.014 m (10 mm for a metre)',
    source:
      'Ship Stability for Masters and Mates, 6th edition, exercise 14.2, worked in public (tawhid07.blogspot.com)',
    evidence: 'read in a transcription',
    expected: 0.14,
    tolerance: 0.005,
    toleranceReason: 'half a unit of the last printed digit, 0.0005 m, at this size',
    got: got({ mass: 4.515, partMass: 15, moveLeft: 42 }, 'cgLeft'),
  },
  {
    ...base,
    what: 'four of 36 equal pieces of 100 g lowered 12 mm',
    source: 'Mean place of all pieces before and after, taken with mathjs 15 (mean of a matrix)',
    evidence: 'computed independently',
    ...relative(meanOfPieces(), 1e-9),
    toleranceReason: 'rounding of double precision in the difference of two means',
    got: got({ mass: 3.6, partMass: 400, moveUp: -12 }, 'cgUp'),
  },
  {
    ...base,
    unit: '%',
    what: 'car of 3.6 kg, 48 % in front: 400 g from 130 to 140 mm before the rear axle, wheelbase 325 mm',
    source: 'Both axle loads solved from force and moment balance of two bodies with mathjs 15 (lusolve)',
    evidence: 'computed independently',
    ...relative(frontShareOfTwoBodies(), 1e-12),
    toleranceReason: 'rounding of double precision',
    got: got({}, 'newFrontWeight'),
  },
]

/** The battery at 140 mm, and the rest of the car where it must be for 48 % with the battery at 130 mm. */
function frontShareOfTwoBodies(): number {
  const rest = (3600 * 0.48 * 325 - 400 * 130) / 3200
  const loads = mathjs.lusolve(
    mathjs.matrix([
      [1, 1],
      [325, 0],
    ]),
    mathjs.matrix([3600, 3200 * rest + 400 * 140]),
  ) as Matrix
  return ((loads.toArray() as number[][])[0]?.[0] ?? NaN) / 36
}
