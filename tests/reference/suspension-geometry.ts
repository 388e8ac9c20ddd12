export { cases }

import { lusolve } from 'mathjs'
import { poseAt, slopesAtRest, travelOf } from '#shared/calculators/suspension-geometry/curves.ts'
import { calculator } from '#shared/calculators/suspension-geometry/index.ts'
import {
  instantCentre,
  linkageFrom,
  motionOf,
  velocityOf,
  type Linkage,
  type Point,
} from '#shared/calculators/suspension-geometry/linkage.ts'
import { outputOf, type ReferenceCase } from './reference-case.ts'

const base = { calculator: 'suspension-geometry', unit: 'mm' } as const
const lastDigit = 'half a unit of the last digit given'
const rounding = 'rounding of double precision in a sum of products of lengths'
const sympy = 'Both lines cut with exact fractions by sympy 1.14.0'

type Corners = readonly [
  lowerInner: Point,
  lowerOuter: Point,
  upperInner: Point,
  upperOuter: Point,
  contactY: number,
]
/** The last is a full-size car at four tenths of its size, which scales every length. */
const inclined: Corners = [[20, 24], [100, 20], [30, 62], [90, 59], 120]
const typical: Corners = [[22, 26], [108, 21], [34, 58], [104, 64], 125]
const outboard: Corners = [[20, 22], [105, 30], [35, 70], [100, 60], 122]
const fullSize: Corners = [[140, 80], [280, 72], [160, 180], [264, 192], 300]

function inputsOf([lowerInner, lowerOuter, upperInner, upperOuter, contactY]: Corners): Record<
  string,
  number
> {
  return {
    lowerInnerY: lowerInner[0],
    lowerInnerZ: lowerInner[1],
    lowerOuterY: lowerOuter[0],
    lowerOuterZ: lowerOuter[1],
    upperInnerY: upperInner[0],
    upperInnerZ: upperInner[1],
    upperOuterY: upperOuter[0],
    upperOuterZ: upperOuter[1],
    contactY,
    travelUp: 10,
    travelDown: 10,
  }
}

function linkageOf([lowerInner, lowerOuter, upperInner, upperOuter, contactY]: Corners): Linkage {
  const tieRod = { tieRodInner: [30, 40], tieRodOuter: [106, 42] } as const
  return {
    lowerInner,
    lowerOuter,
    upperInner,
    upperOuter,
    contact: [contactY, 0],
    ...tieRod,
    steeringArm: -18,
  }
}

const output = (corners: Corners, key: string) => () => outputOf(calculator, inputsOf(corners), key)
const pose = (linkage: Linkage, at: number) => poseAt(linkage, travelOf(linkage, 12, 12), at)

const centres = (
  [
    ['typical', typical, 'instantCentreY', -83698 / 433],
    ['typical', typical, 'instantCentreZ', 16678 / 433],
    ['typical', typical, 'rollCentreHeight', 2084750 / 137823],
    ['centre outboard', outboard, 'instantCentreY', 30535 / 137],
    ['centre outboard', outboard, 'instantCentreZ', 5630 / 137],
    ['centre outboard', outboard, 'rollCentreHeight', -686860 / 13821],
    ['full size at 0.4', fullSize, 'instantCentreY', (0.4 * -167300) / 157],
    ['full size at 0.4', fullSize, 'instantCentreZ', (0.4 * 44100) / 157],
    ['full size at 0.4', fullSize, 'rollCentreHeight', (0.4 * 661500) / 5701],
    ['parallel, inclined', inclined, 'rollCentreHeight', 6],
  ] as const
).map(([name, corners, key, expected]): ReferenceCase => ({
  ...base,
  what: `${key}, linkage “${name}”`,
  source: sympy,
  evidence: 'computed independently',
  expected,
  tolerance: 1e-9,
  toleranceReason: rounding,
  got: output(corners, key),
}))

const slopes: readonly ReferenceCase[] = [
  {
    ...base,
    unit: 'deg/mm',
    what: 'camberGain, linkage “typical”',
    source:
      '−180/π over the distance from contact to instant centre, the latter by sympy 1.14.0, and a difference of solved positions by scipy 1.17.1',
    evidence: 'computed independently',
    expected: -0.1800068,
    tolerance: 5e-8,
    toleranceReason: lastDigit,
    got: output(typical, 'camberGain'),
  },
  {
    ...base,
    unit: '1',
    what: 'sideways move of the contact for each mm of rise, linkage “typical”',
    source:
      'z of the instant centre over its distance, by sympy 1.14.0, and a difference of solved positions by scipy 1.17.1',
    evidence: 'computed independently',
    expected: 0.1210103,
    tolerance: 5e-8,
    toleranceReason: lastDigit,
    got: () => velocityOf(motionOf(linkageOf(typical)), [125, 0])[0],
  },
  {
    ...base,
    unit: 'mm',
    what: 'height of the instant centre of the linkage (0,0) (4,1) (0,3) (4,2), ground at −1',
    source: sympy,
    evidence: 'computed independently',
    expected: 1.5,
    tolerance: 1e-12,
    toleranceReason: rounding,
    got: () => {
      const small = linkageOf([[0, 0], [4, 1], [0, 3], [4, 2], 5])
      return instantCentre(small, motionOf(small)).at[1]
    },
  },
]

/** Rise, camber in degrees, sideways move of the contact, roll centre above the ground. */
const travelled = [
  ['typical', typical, -10, 1.6763, -1.707445, 27.335413],
  ['typical', typical, -5, 0.868391, -0.727935, 21.180554],
  ['typical', typical, 5, -0.933344, 0.48459, 9.165292],
  ['typical', typical, 10, -1.937184, 0.732266, 3.29343],
  ['parallel, inclined', inclined, -10, -0.344753, -1.034566, 18.822623],
  ['parallel, inclined', inclined, -5, -0.081313, -0.38214, 12.33639],
  ['parallel, inclined', inclined, 5, -0.075038, 0.120194, -0.207457],
  ['parallel, inclined', inclined, 10, -0.292452, -0.015652, -6.296777],
] as const

const overTravel = travelled.flatMap(([name, corners, at, camber, sideways, rollCentre]): ReferenceCase[] => {
  const linkage = linkageOf(corners)
  const common = {
    ...base,
    source:
      name === 'typical'
        ? 'Circles cut with scipy 1.17.1; camber and sideways move again by GNU Octave 7.3.0, fsolve on the lengths of a rigid body'
        : 'Circles cut with scipy 1.17.1',
    evidence: 'computed independently',
    tolerance: 5e-7,
    toleranceReason: lastDigit,
  } as const
  const where = `${at} mm up, linkage “${name}”`
  return [
    {
      ...common,
      unit: 'deg',
      what: `camber, ${where}`,
      expected: camber,
      got: () => pose(linkage, at).camber,
    },
    {
      ...common,
      what: `sideways move, ${where}`,
      expected: sideways,
      got: () => pose(linkage, at).track / 2 - linkage.contact[0],
    },
    {
      ...common,
      what: `roll centre, ${where}`,
      expected: rollCentre,
      got: () => pose(linkage, at).rollCentre,
    },
  ]
})

/**
 * A suspension in three dimensions with caster and a real kingpin: the nearest thing there is to the front view's
 * tie rod rule. Height of the rod's inner end, rise, toe.
 */
const inThreeDimensions = [
  [40, -5, 0.213092],
  [40, 5, -0.22469],
  [44, -10, -1.185389],
  [44, -5, -0.5786],
  [44, 5, 0.556974],
  [44, 10, 1.098129],
  [36, -10, 2.004982],
  [36, 5, -1.005611],
  [36, 10, -2.020321],
] as const

const steered = inThreeDimensions.map(([innerZ, at, expected]): ReferenceCase => ({
  ...base,
  unit: 'deg',
  what: `toe ${at} mm up, tie rod’s inner end at ${innerZ} mm`,
  source:
    'The same points in three dimensions with caster, solved two ways with scipy 1.17.1: six constraints of a rigid body, and an analytic chain with a turn about the kingpin',
  evidence: 'computed independently',
  expected,
  tolerance: 0.02 * Math.abs(expected),
  toleranceReason:
    'seen from the front only, the slant of the kingpin and the arm’s own swing over 2° are left out: up to 2 %',
  got: () => pose({ ...linkageOf(typical), tieRodInner: [30, innerZ] }, at).toe,
}))

type JointKey = 'lowerInner' | 'lowerOuter' | 'upperInner' | 'upperOuter' | 'tieRodInner' | 'tieRodOuter'
const usual = Object.fromEntries(calculator.inputs.map((input) => [input.key, input.default])) as Record<
  (typeof calculator.inputs)[number]['key'],
  number
>

/**
 * The usual linkage as lengths that must stay, solved with mathjs and without circles or angles: unknown are the
 * two outer joints, the contact and the rod's end; known are seven distances and the rise.
 */
function byConstraints(rise: number) {
  const point = (name: JointKey): Point => [usual[`${name}Y`], usual[`${name}Z`]]
  const fixed = {
    lowerInner: point('lowerInner'),
    upperInner: point('upperInner'),
    tieRodInner: point('tieRodInner'),
  }
  const rest = [...point('lowerOuter'), ...point('upperOuter'), usual.contactY, 0, ...point('tieRodOuter')]
  const at = (unknown: readonly number[], index: number): Point => [
    unknown[2 * index] ?? NaN,
    unknown[2 * index + 1] ?? NaN,
  ]
  const apart = (a: Point, b: Point) => (a[0] - b[0]) ** 2 + (a[1] - b[1]) ** 2
  const lengths = (unknown: readonly number[]) => {
    const [low, up, contact, rod] = [0, 1, 2, 3].map((index) => at(unknown, index)) as [
      Point,
      Point,
      Point,
      Point,
    ]
    return [
      apart(low, fixed.lowerInner),
      apart(up, fixed.upperInner),
      apart(low, up),
      apart(contact, low),
      apart(contact, up),
      apart(rod, low),
      apart(rod, up),
    ]
  }
  const wanted = lengths(rest)
  const missing = (unknown: readonly number[]) => [
    ...lengths(unknown).map((length, index) => length - (wanted[index] ?? NaN)),
    (unknown[5] ?? NaN) - rise,
  ]
  let unknown = rest.map((value, index) => value + (index % 2 === 1 ? rise : 0))
  for (let round = 0; round < 40; round += 1) {
    const now = missing(unknown)
    const jacobian = now.map((_, line) =>
      unknown.map((value, column) => {
        const nudged = (by: number) => missing(unknown.with(column, value + by))[line] ?? NaN
        // Squared distances are quadratic: their central difference is exact.
        return (nudged(1) - nudged(-1)) / 2
      }),
    )
    const step = lusolve(
      jacobian,
      now.map((value) => -value),
    ) as number[][]
    unknown = unknown.map((value, index) => value + (step[index]?.[0] ?? NaN))
  }
  const turned = (from: readonly number[]) => {
    const [low, up] = [at(from, 0), at(from, 1)]
    return Math.atan2(up[1] - low[1], up[0] - low[0])
  }
  const [rod, inner] = [at(unknown, 3), fixed.tieRodInner]
  const rodLength = Math.sqrt(apart(at(rest, 3), inner))
  // The rod's end goes sideways until the length is right: one equation with one unknown, by Newton's method.
  let across = rod[0]
  for (let round = 0; round < 40; round += 1) {
    across -=
      ((across - inner[0]) ** 2 + (rod[1] - inner[1]) ** 2 - rodLength ** 2) / (2 * (across - inner[0]))
  }
  return {
    camber: (-(turned(unknown) - turned(rest)) * 180) / Math.PI,
    track: 2 * (unknown[4] ?? NaN),
    toe: (Math.asin((rod[0] - across) / usual.steeringArm) * 180) / Math.PI,
  }
}

const defaults = linkageFrom(usual)

const constrained = [-20, -8, 12, 25].flatMap((rise): ReferenceCase[] => {
  const solved = byConstraints(rise)
  return (['camber', 'track', 'toe'] as const).map((key) => ({
    ...base,
    unit: key === 'track' ? 'mm' : 'deg',
    what: `${key} of the usual values, ${rise} mm up`,
    source:
      'Seven distances and the rise as equations, solved together by Newton’s method with mathjs 15 (lusolve), without circles or angles',
    evidence: 'computed independently' as const,
    expected: solved[key],
    tolerance: 1e-8,
    toleranceReason: 'rounding of squared lengths over two iterations',
    got: () => poseAt(defaults, travelOf(defaults, 25, 20), rise)[key],
  }))
})

const bumpSteer: ReferenceCase = {
  ...base,
  unit: 'deg/mm',
  what: 'bump steer of the usual values',
  source: 'Difference of the toe at ±0.001 mm, each solved from its distances with mathjs 15',
  evidence: 'computed independently',
  expected: (byConstraints(0.001).toe - byConstraints(-0.001).toe) / 0.002,
  tolerance: 1e-7,
  toleranceReason: 'a difference over 0.002 mm keeps about seven digits of double precision',
  got: () => slopesAtRest(defaults).bumpSteer,
}

const cases: readonly ReferenceCase[] = [
  ...centres,
  ...slopes,
  ...overTravel,
  ...steered,
  ...constrained,
  bumpSteer,
]
