export { cases }

import { acos, divide, dot, norm, subtract } from 'mathjs'
import { calculator } from '#shared/calculators/hinge-pin-inserts/index.ts'
import { outputOf, type ReferenceCase } from './reference-case.ts'

type Vector = [forward: number, out: number, up: number]
type Inserts = Record<'blockSpacing' | 'frontOut' | 'frontUp' | 'rearOut' | 'rearUp', number>

/**
 * The pin as a vector in space from its rear to its front hole; the angle of its shadow on a plane against the
 * car's long axis by the scalar product.
 */
function pinInSpace({ blockSpacing, frontOut, frontUp, rearOut, rearUp }: Inserts) {
  const front: Vector = [blockSpacing, frontOut, frontUp]
  const rear: Vector = [0, rearOut, rearUp]
  const [forward, out, up] = subtract(front, rear)
  const against = (shadow: Vector) =>
    (acos(divide(dot(shadow, [1, 0, 0]), norm(shadow) as number) as number) as number) * (180 / Math.PI)
  return {
    // In front further in is toe-in; in front further up is a positive pin angle.
    toe: -Math.sign(out) * against([forward, out, 0]),
    pinAngle: Math.sign(up) * against([forward, 0, up]),
  }
}

const sets: readonly Inserts[] = [
  { blockSpacing: 60, frontOut: 0, frontUp: 0.5, rearOut: 0.5, rearUp: 0 },
  { blockSpacing: 60, frontOut: 1, frontUp: -1, rearOut: -0.5, rearUp: 1 },
  { blockSpacing: 44, frontOut: -0.75, frontUp: 1.5, rearOut: 1.25, rearUp: -1 },
]

const cases: readonly ReferenceCase[] = sets.flatMap((inserts) =>
  (['toe', 'pinAngle'] as const).map((key): ReferenceCase => ({
    calculator: 'hinge-pin-inserts',
    what: `${key === 'toe' ? 'toe' : 'pin angle'}, blocks ${inserts.blockSpacing} mm apart, front ${inserts.frontOut} out ${inserts.frontUp} up, rear ${inserts.rearOut} out ${inserts.rearUp} up`,
    source:
      'The pin as a vector in space, its shadow’s angle to the car’s long axis by the scalar product with mathjs 15, without a tangent',
    evidence: 'computed independently',
    unit: 'deg',
    expected: pinInSpace(inserts)[key],
    tolerance: 1e-10,
    toleranceReason: 'an arccosine near 1 loses half of the digits of double precision at small angles',
    got: () => outputOf(calculator, inserts, key),
  })),
)
