export { cases }

import { flatten, lusolve, matrix, zeros, type Matrix } from 'mathjs'
import { barCompliance, endRate } from '#shared/calculators/sway-bar/bar.ts'
import { calculator } from '#shared/calculators/sway-bar/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const steel = { shearModulus: 79.3, youngsModulus: 207 }
const rate = (diameter: number, middleLength: number, armLength: number) => () =>
  outputOf(calculator, { diameter, middleLength, armLength }, 'endRate')

/**
 * Half of the bar as a grid of two beams (finite elements), solved by mathjs: three nodes (the middle of the bar, the
 * bend in its bearing, the link), each with a rise and a turn about either axis. The middle of the bar may not
 * turn about the bar, because the other half turns the other way; and it may not rise. N/mm at the link.
 */
function rateByElements(diameter: number, middleLength: number, armLength: number): number {
  const polar = (Math.PI * diameter ** 4) / 32
  const stiffness = zeros(9, 9) as Matrix
  addBeam(stiffness, [0, 1], [1, 0], middleLength / 2, polar)
  addBeam(stiffness, [1, 2], [0, 1], armLength, polar)
  // Held: rise and both turns that the symmetry forbids in the middle (0, 1), rise at the bearing (3). The turn
  // about the other axis is free everywhere.
  const free = [2, 4, 5, 6, 7, 8]
  const reduced = free.map((row) => free.map((column) => stiffness.get([row, column]) as number))
  const load = free.map((index) => (index === 6 ? 1 : 0))
  const moved = flatten(lusolve(matrix(reduced), load) as Matrix).toArray() as number[]
  return 1 / (moved[free.indexOf(6)] ?? NaN)
}

/** Adds a beam along `direction` between two nodes: bending out of the plane and twist. */
function addBeam(
  into: Matrix,
  nodes: [number, number],
  direction: [number, number],
  length: number,
  polar: number,
): void {
  const bend = 207_000 * (polar / 2)
  const twist = (79_300 * polar) / length
  const [c, s] = direction
  const [k1, k2, k3, k4] = [
    (12 * bend) / length ** 3,
    (6 * bend) / length ** 2,
    (4 * bend) / length,
    (2 * bend) / length,
  ]
  // In the beam's own axes: rise, turn about the beam, slope along the beam; first end, then second.
  const own = [
    [k1, 0, k2, -k1, 0, k2],
    [0, twist, 0, 0, -twist, 0],
    [k2, 0, k3, -k2, 0, k4],
    [-k1, 0, -k2, k1, 0, -k2],
    [0, -twist, 0, 0, twist, 0],
    [k2, 0, k4, -k2, 0, k3],
  ]
  // Slope along the beam is a turn about the axis square to it.
  const turn = [
    [1, 0, 0],
    [0, c, s],
    [0, s, -c],
  ]
  const place = (end: number, dof: number) => (nodes[end] ?? 0) * 3 + dof
  for (let p = 0; p < 6; p += 1) {
    for (let q = 0; q < 6; q += 1) {
      for (let i = 0; i < 3; i += 1) {
        for (let j = 0; j < 3; j += 1) {
          const [row, column] = [place(p < 3 ? 0 : 1, i), place(q < 3 ? 0 : 1, j)]
          const share = (turn[p % 3]?.[i] ?? 0) * (own[p]?.[q] ?? 0) * (turn[q % 3]?.[j] ?? 0)
          into.set([row, column], (into.get([row, column]) as number) + share)
        }
      }
    }
  }
}

const base = { calculator: 'sway-bar', unit: 'N/mm' } as const
const frame =
  'Closed form and a 3-D frame of Euler–Bernoulli beams with bearings at the bends, both computed in Python (NumPy 2.4.6)'
const inch = 25.4
const perInch = 4.4482216152605 / 25.4

const cases: readonly ReferenceCase[] = [
  ...(
    [
      [1.2, 60, 25, 0.7099],
      [1.5, 60, 25, 1.733155],
      [2.0, 80, 30, 2.903888],
      [2.4, 80, 30, 6.021501],
    ] as const
  ).map(([diameter, middle, arm, expected]): ReferenceCase => ({
    ...base,
    what: `bar ${diameter} mm, middle ${middle} mm, arm ${arm} mm`,
    source: frame,
    evidence: 'computed independently',
    expected,
    tolerance: 5e-7,
    toleranceReason: 'half a unit of the last digit given',
    got: rate(diameter, middle, arm),
  })),
  ...(
    [
      [2.4, 70, 30],
      [3, 45, 42],
    ] as const
  ).map(([diameter, middle, arm]): ReferenceCase => ({
    ...base,
    what: `bar ${diameter} mm, middle ${middle} mm, arm ${arm} mm, as a grid of beams`,
    source: 'Finite elements: the stiffness matrix of half the bar solved with lusolve of mathjs 15.2.0',
    evidence: 'computed independently',
    ...relative(rateByElements(diameter, middle, arm), 1e-9),
    toleranceReason: 'beam elements are exact for loads at their ends; only rounding of doubles is left',
    got: rate(diameter, middle, arm),
  })),
  {
    ...base,
    what: 'road-car bar of 0.75 in, middle 36 in, arms 10 in',
    source:
      'The imperial form of textbooks, 500,000 d⁴/(0.4422 a² b + 0.2264 a³) lbf/in between the two ends, doubled for one end',
    evidence: 'from memory',
    ...relative(((2 * 500_000 * 0.75 ** 4) / (0.4422 * 100 * 36 + 0.2264 * 1000)) * perInch, 2e-3),
    toleranceReason: 'its two constants are rounded by 0.15 % against 30 and 11.5 million psi',
    got: () =>
      endRate({
        diameter: 0.75 * inch,
        middleLength: 36 * inch,
        armLength: 10 * inch,
        youngsModulus: 30 * 6.894757293168361,
        shearModulus: 11.5 * 6.894757293168361,
      }),
  },
  {
    ...base,
    what: 'twist alone: torsion bar of 1 in, 40 in long, on a lever of 12 in',
    source:
      'Torsion bar rate 1,120,000 d⁴/(L l²) lbf/in, as printed in a public discussion of car suspensions (elcovaforums.com, post 153375)',
    evidence: 'read',
    ...relative((1_120_000 / (40 * 12 ** 2)) * perInch, 1e-2),
    toleranceReason: 'its constant stands for a shear modulus of 11.4 million psi, ours for 11.5',
    got: () =>
      1 / barCompliance({ ...steel, diameter: inch, middleLength: 80 * inch, armLength: 12 * inch }).twist,
  },
  {
    ...base,
    unit: '1',
    what: '2.4 mm against 2 mm, same shape',
    source: 'The fourth power of 2.4/2, by hand: 1.2⁴ = 2.0736',
    evidence: 'computed independently',
    expected: 2.0736,
    tolerance: 1e-12,
    toleranceReason: 'a power of two short decimals; only rounding of doubles is left',
    got: () => outputOf(calculator, { diameter: 2, comparisonDiameter: 2.4 }, 'ratio'),
  },
]
