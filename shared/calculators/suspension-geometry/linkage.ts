export { arms, farAway, instantCentre, linkageFrom, motionOf, velocityOf }
export type { Linkage, LinkageInputs, Motion, Point }

/** Seen from the front: y out from the car's centre line, z up from the ground at ride height, in mm. */
type Point = readonly [y: number, z: number]

type JointKey = 'lowerInner' | 'lowerOuter' | 'upperInner' | 'upperOuter' | 'tieRodInner' | 'tieRodOuter'
type LinkageInputs = Record<
  `${JointKey}${'Y' | 'Z'}` | 'contactY' | 'steeringArm' | 'travelUp' | 'travelDown',
  number
>

/** One side of an axle. `contact` is the middle of the tyre on the ground, a point fixed in the upright. */
interface Linkage extends Record<JointKey, Point> {
  contact: Point
  /** From the steering axis to the tie rod's outer end, forward positive. */
  steeringArm: number
}

/**
 * How the upright moves at one place of its travel: it turns about the instant centre (X/W, Y/W), where the
 * lines of the two arms meet. Kept as X, Y and W, because parallel arms have W = 0 and still move well. `lever`
 * is W times the distance across from instant centre to contact; 0 when the wheel cannot rise.
 */
interface Motion {
  X: number
  Y: number
  W: number
  lever: number
}

/** Where the instant centre of parallel arms is put, in mm: a thousand kilometres off, for want of infinity. */
const farAway = 1e9
/** Sine of the angle between two arms below which they count as parallel. */
const parallel = 1e-9

function linkageFrom(inputs: LinkageInputs): Linkage {
  const joint = (key: JointKey): Point => [inputs[`${key}Y`], inputs[`${key}Z`]]
  return {
    lowerInner: joint('lowerInner'),
    lowerOuter: joint('lowerOuter'),
    upperInner: joint('upperInner'),
    upperOuter: joint('upperOuter'),
    tieRodInner: joint('tieRodInner'),
    tieRodOuter: joint('tieRodOuter'),
    contact: [inputs.contactY, 0],
    steeringArm: inputs.steeringArm,
  }
}

/** Directions of the lower and the upper arm, inner to outer end, as vectors of length 1. */
function arms({ lowerInner, lowerOuter, upperInner, upperOuter }: Linkage): { lower: Point; upper: Point } {
  return { lower: direction(lowerInner, lowerOuter), upper: direction(upperInner, upperOuter) }
}

/** The lines of both arms cut by Cramer's rule, without dividing by the determinant W. */
function motionOf(linkage: Linkage): Motion {
  const { lower, upper } = arms(linkage)
  const cLower = lower[0] * linkage.lowerInner[1] - lower[1] * linkage.lowerInner[0]
  const cUpper = upper[0] * linkage.upperInner[1] - upper[1] * linkage.upperInner[0]
  const W = lower[0] * upper[1] - lower[1] * upper[0]
  const X = cLower * upper[0] - cUpper * lower[0]
  const Y = cLower * upper[1] - cUpper * lower[1]
  return { X, Y, W, lever: linkage.contact[0] * W - X }
}

/** How far a point of the upright moves for each mm that the contact point rises. */
function velocityOf({ X, Y, W, lever }: Motion, [y, z]: Point): Point {
  return [(Y - z * W) / lever, (y * W - X) / lever]
}

/** The instant centre; of parallel arms a point `farAway` on their line, on the inner side. */
function instantCentre(linkage: Linkage, { X, Y, W }: Motion): { at: Point; parallel: boolean } {
  if (Math.abs(W) >= parallel) return { at: [X / W, Y / W], parallel: false }
  const { lower } = arms(linkage)
  const inward = lower[0] > 0 ? -farAway : farAway
  const { lowerInner } = linkage
  return { at: [lowerInner[0] + inward * lower[0], lowerInner[1] + inward * lower[1]], parallel: true }
}

function direction(from: Point, to: Point): Point {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1])
  return [(to[0] - from[0]) / length, (to[1] - from[1]) / length]
}
