export { axleWith }
export type { Axle, Inserts }

import { arctangent } from '../common/degrees.ts'

/** Lengths in mm, angles in degrees; out is away from the car's centre line, up away from the ground. */
interface Inserts {
  /** Between the middles of the front and the rear block of one axle. */
  blockSpacing: number
  frontOut: number
  frontUp: number
  rearOut: number
  rearUp: number
  /** What hubs and blocks give with every insert in its middle. */
  baseToe: number
  baseAngle: number
}

interface Axle {
  toe: number
  pinAngle: number
  pinHeight: number
  trackChange: number
}

/**
 * What the inserts make of one axle, both sides alike. A pin whose rear end stands further out points its wheel
 * inwards in front (toe-in, positive); a pin whose front end is higher has a positive angle.
 */
function axleWith(inserts: Inserts): Axle {
  const { blockSpacing, frontOut, frontUp, rearOut, rearUp, baseToe, baseAngle } = inserts
  return {
    toe: baseToe + arctangent((rearOut - frontOut) / blockSpacing),
    pinAngle: baseAngle + arctangent((frontUp - rearUp) / blockSpacing),
    pinHeight: (frontUp + rearUp) / 2,
    trackChange: frontOut + rearOut,
  }
}
