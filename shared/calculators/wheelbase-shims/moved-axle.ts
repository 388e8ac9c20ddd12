export { movedAxle }

interface Axles {
  wheelbase: number
  /** Share on the front wheels, %. */
  frontWeight: number
  /** mm; minus moves the rear axle forward. */
  rearAxleBack: number
}

/**
 * Wheelbase (mm) and front share (%) when the rear axle moves and the centre of gravity stays where it is on
 * the chassis: the front share is the distance from centre of gravity to rear axle over the wheelbase.
 */
function movedAxle({ wheelbase, frontWeight, rearAxleBack }: Axles) {
  const toRearAxle = (wheelbase * frontWeight) / 100
  const newWheelbase = wheelbase + rearAxleBack
  // Written so that no shim changes nothing, to the last digit.
  const change = (rearAxleBack * (100 - frontWeight)) / newWheelbase
  return { toRearAxle, newWheelbase, newFrontWeight: frontWeight + change, rearLoadChange: -change }
}
