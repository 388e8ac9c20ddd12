export { shifted }

interface Move {
  /** Whole car, kg. */
  mass: number
  /** Share on the front wheels, %. */
  frontWeight: number
  wheelbase: number
  /** g */
  partMass: number
  moveForward: number
  moveLeft: number
  moveUp: number
}

/**
 * Where the centre of gravity goes, in mm, when one part of the car moves: the car's whole weight times its
 * shift equals the part's weight times its own. The front share follows by moments about the rear axle.
 */
function shifted({ mass, frontWeight, wheelbase, partMass, ...move }: Move) {
  const part = partMass / (1000 * mass)
  const cgForward = part * move.moveForward
  return {
    newFrontWeight: frontWeight + (100 * cgForward) / wheelbase,
    cgForward,
    cgLeft: part * move.moveLeft,
    cgUp: part * move.moveUp,
  }
}
