export { carriedByArms, fullAngle, loadTransfer }

import { arctangent, tangent } from '../common/degrees.ts'
import { standardGravity } from '../common/standard-gravity.ts'

/**
 * Anti-squat in per cent: share of the moved load that the rear arms carry, for independent suspension with
 * the differential on the chassis and both hinge pins parallel. `pinAngle` in degrees, front end of the pin
 * higher counts plus; `rearDriveShare` in per cent; lengths in mm.
 * Gillespie, Fundamentals of Vehicle Dynamics, chapter 7, with the line from the wheel centre.
 */
function carriedByArms(car: {
  pinAngle: number
  rearDriveShare: number
  wheelbase: number
  cgHeight: number
}): number {
  return (car.rearDriveShare * tangent(car.pinAngle) * car.wheelbase) / car.cgHeight
}

/** The load in N that an acceleration (in g) moves from the front axle to the rear; kg and mm. */
function loadTransfer(car: {
  mass: number
  acceleration: number
  cgHeight: number
  wheelbase: number
}): number {
  return (car.mass * car.acceleration * standardGravity * car.cgHeight) / car.wheelbase
}

/** The pin angle in degrees at which the arms carry everything; the share must be more than zero. */
function fullAngle(car: { rearDriveShare: number; wheelbase: number; cgHeight: number }): number {
  return arctangent((100 * car.cgHeight) / (car.rearDriveShare * car.wheelbase))
}
