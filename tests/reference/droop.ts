export { cases }

import { cos, lusolve, multiply, sin } from 'mathjs'
import { calculator } from '#shared/calculators/droop/index.ts'
import { outputOf, type ReferenceCase } from './reference-case.ts'

type Car = Record<'armLength' | 'screwRadius' | 'screwPitch' | 'turns', number>

/**
 * The linkage itself instead of the formula: the screw's tip is a point of the arm, `radius` along it and the
 * screw's travel square to it; the arm is turned by a rotation matrix until that point lies on the plate. Found
 * with Newton's method on mathjs matrices, then the outer pin is turned by the same matrix.
 */
function swingByIteration({ armLength, screwRadius, screwPitch, turns }: Car): {
  angle: number
  drop: number
} {
  const turned = (angle: number, point: number[]) =>
    multiply(
      [
        [cos(angle), sin(angle)],
        [-sin(angle), cos(angle)],
      ],
      point,
    ) as number[]
  const tip = [screwRadius, screwPitch * turns]
  let angle = 0
  for (let round = 0; round < 60; round += 1) {
    const height = turned(angle, tip)[1] ?? NaN
    const slope = -(turned(angle, tip)[0] ?? NaN)
    const [[step = NaN] = []] = lusolve([[slope]], [-height]) as number[][]
    angle += step
  }
  return { angle: (angle * 180) / Math.PI, drop: -(turned(angle, [armLength, 0])[1] ?? NaN) }
}

const kestrel: Car = { armLength: 100, screwRadius: 20, screwPitch: 0.7, turns: 1 }
const truggy: Car = { armLength: 118, screwRadius: 24, screwPitch: 0.5, turns: 2.5 }
const wound: Car = { armLength: 75, screwRadius: 14, screwPitch: 0.5, turns: -1.25 }
const far: Car = { armLength: 100, screwRadius: 20, screwPitch: 0.8, turns: 12 }

const cases: readonly ReferenceCase[] = [kestrel, truggy, wound, far].flatMap((car): ReferenceCase[] => {
  const { angle, drop } = swingByIteration(car)
  const what = `${car.turns} turns of ${car.screwPitch} mm, ${car.screwRadius} mm from the pin of an arm of ${car.armLength} mm`
  const base = {
    calculator: 'droop',
    source:
      'The arm turned by a rotation matrix until the tip of its screw lies on the plate: Newton’s method with mathjs 15, without the arctangent',
    evidence: 'computed independently',
    toleranceReason: 'rounding of double precision over the iteration',
  } as const
  return [
    {
      ...base,
      what: `arm angle, ${what}`,
      unit: 'deg',
      expected: angle,
      tolerance: 1e-10,
      got: () => outputOf(calculator, car, 'armAngle'),
    },
    {
      ...base,
      what: `wheel, ${what}`,
      unit: 'mm',
      expected: drop,
      tolerance: 1e-10,
      got: () => outputOf(calculator, car, 'wheelTravel'),
    },
  ]
})
