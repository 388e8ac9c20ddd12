export { angleOfToe, toeDistance }

import { arcsine, sine } from '../common/degrees.ts'

/**
 * How much nearer the centre line the front edge of a rim stands than its back edge, in the unit of
 * `diameter`; the angle of that one wheel in degrees, toe-in positive.
 */
function toeDistance(angle: number, diameter: number): number {
  return diameter * sine(angle)
}

/** The way back: the angle in degrees of one wheel. A distance longer than the diameter has none (NaN). */
function angleOfToe(distance: number, diameter: number): number {
  return arcsine(distance / diameter)
}
