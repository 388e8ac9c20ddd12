export { armSwing, wheelDrop }

import { arctangent, sine } from '../common/degrees.ts'

/**
 * How far an arm swings, in degrees, when its screw goes `screwTravel` further through it, `screwRadius` from
 * the inner pin. The screw stands on a plate level with the pin, at right angles to the arm. Same unit of
 * length for both.
 */
function armSwing(screwTravel: number, screwRadius: number): number {
  return arctangent(screwTravel / screwRadius)
}

/** How far the outer end of a level arm drops when it swings by `angle` degrees, in the unit of `armLength`. */
function wheelDrop(armLength: number, angle: number): number {
  return armLength * sine(angle)
}
