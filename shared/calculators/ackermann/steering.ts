export { ackermannShares, idealInnerAngle, idealOuterAngle, largestOuterAngle, turnRadius }
export type { Steering }

import { arctangent, tangent } from '../common/degrees.ts'

/** Lengths in mm; angles in degrees from straight ahead, all at one place of the steering wheel. */
interface Steering {
  wheelbase: number
  /** Between the axes the front wheels are steered about. */
  kingpinSpacing: number
  outerAngle: number
  innerAngle: number
}
type Size = Pick<Steering, 'wheelbase' | 'kingpinSpacing'>

/**
 * Inner angle at which the axles of both front wheels meet on the line of the rear axle: cot(outer) −
 * cot(inner) = spacing/wheelbase, written with tangents so that it holds at 0 too. For outer angles below
 * `largestOuterAngle` only.
 */
function idealInnerAngle({ wheelbase, kingpinSpacing }: Size, outerAngle: number): number {
  const outer = tangent(outerAngle)
  return arctangent(outer / (1 - (outer * kingpinSpacing) / wheelbase))
}

/** The same the other way round: the outer angle that belongs to an inner one between 0 and 90 degrees. */
function idealOuterAngle({ wheelbase, kingpinSpacing }: Size, innerAngle: number): number {
  const inner = tangent(innerAngle)
  return arctangent(inner / (1 + (inner * kingpinSpacing) / wheelbase))
}

/** The outer angle at which the inner wheel would have to stand square to the car. */
function largestOuterAngle({ wheelbase, kingpinSpacing }: Size): number {
  return arctangent(wheelbase / kingpinSpacing)
}

/** From the turn's centre to the middle of the rear axle, in mm, when nothing slips; by the outer wheel. */
function turnRadius({ wheelbase, kingpinSpacing, outerAngle }: Steering): number {
  return wheelbase / tangent(outerAngle) - kingpinSpacing / 2
}

/**
 * Percent Ackermann by three definitions in use. All are 0 for parallel wheels and 100 for the ideal pair, and
 * differ between. `byInner` measures the angles against the ideal inner one, `byOuter` against the ideal outer
 * one, `byCotangent` compares cotangents.
 */
function ackermannShares(steering: Steering): { byInner: number; byOuter: number; byCotangent: number } {
  const { wheelbase, kingpinSpacing, outerAngle, innerAngle } = steering
  const apart = innerAngle - outerAngle
  return {
    byInner: (100 * apart) / (idealInnerAngle(steering, outerAngle) - outerAngle),
    byOuter: (100 * apart) / (innerAngle - idealOuterAngle(steering, innerAngle)),
    byCotangent: (100 * (1 / tangent(outerAngle) - 1 / tangent(innerAngle)) * wheelbase) / kingpinSpacing,
  }
}
