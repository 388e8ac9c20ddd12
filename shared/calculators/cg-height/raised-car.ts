export { raisedCar }

import { arcsine, tangent } from '../common/degrees.ts'

interface Weighing {
  /** kg */
  mass: number
  wheelbase: number
  /** Load of the front axle, level and with that axle raised, g. */
  frontLevel: number
  frontRaised: number
  raisedBy: number
  tyreRadius: number
}

/**
 * The centre of gravity from two weighings, one with the front axle raised, by moments about the rear axle;
 * lengths in mm. ISO 10392:2011, section 6, with both axles on tyres of one radius. Needs
 * `raisedBy` < `wheelbase`.
 */
function raisedCar({ mass, wheelbase, frontLevel, frontRaised, raisedBy, tyreRadius }: Weighing) {
  const angle = arcsine(raisedBy / wheelbase)
  const lost = (frontLevel - frontRaised) / 1000
  const aboveAxles = (wheelbase * (lost / mass)) / tangent(angle)
  return {
    /** Degrees. */
    angle,
    /** Minus: below the line through the axles. */
    aboveAxles,
    cgHeight: tyreRadius + aboveAxles,
    /** In front of the rear axle, along the car. */
    beforeRearAxle: (wheelbase * frontLevel) / (1000 * mass),
    /** What one gram of error in a reading does to the height. */
    perGram: wheelbase / (1000 * mass * tangent(angle)),
  }
}
