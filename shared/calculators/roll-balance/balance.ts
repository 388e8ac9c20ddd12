export { rollBalance }
export type { BalanceValues }

import { standardGravity } from '../common/standard-gravity.ts'

/** Lengths in mm, rates at the wheel in N/mm, weight in kg, front weight in %, acceleration in g. */
type BalanceValues = Record<
  | 'mass'
  | 'frontWeight'
  | 'wheelbase'
  | 'cgHeight'
  | 'trackFront'
  | 'trackRear'
  | 'rollCentreFront'
  | 'rollCentreRear'
  | 'wheelRateFront'
  | 'wheelRateRear'
  | 'barRateFront'
  | 'barRateRear'
  | 'lateralAcceleration',
  number
>

const degree = Math.PI / 180

/**
 * A car in a steady corner, as one body on two axles that leans about the line between its roll centres:
 * K = (k_wheel + k_bar) t²/2 for each axle, φ = m a h′/(K_f + K_r − m g h′), and each axle moves
 * (K φ + m_axle a h_rc)/t newtons from its inside to its outside wheel. T. D. Gillespie, Fundamentals of Vehicle Dynamics,
 * chapter 6; W. F. and D. L. Milliken, Race Car Vehicle Dynamics, chapters 16 and 18.
 *
 * `reserve` is what is left of K_f + K_r when the weight has had its part, in N·m/rad: at nothing or below, the
 * car falls over at rest and the other values mean nothing.
 */
function rollBalance(values: BalanceValues) {
  const { mass, cgHeight, rollCentreFront, rollCentreRear, lateralAcceleration } = values
  const front = values.frontWeight / 100
  const sideways = lateralAcceleration * standardGravity
  const axisHeight = rollCentreFront * front + rollCentreRear * (1 - front)
  const lever = cgHeight - axisHeight
  const stiffness = (rate: number, track: number) => (rate * 1000 * (track / 1000) ** 2) / 2
  const stiffnessFront = stiffness(values.wheelRateFront + values.barRateFront, values.trackFront)
  const stiffnessRear = stiffness(values.wheelRateRear + values.barRateRear, values.trackRear)
  const reserve = stiffnessFront + stiffnessRear - mass * standardGravity * (lever / 1000)
  const angle = (mass * sideways * (lever / 1000)) / reserve
  const axle = (share: number, stiff: number, rollCentre: number, track: number) => {
    const elastic = (stiff * angle) / (track / 1000)
    const geometric = (mass * share * sideways * rollCentre) / track
    const moved = elastic + geometric
    const still = (mass * share * standardGravity) / 2
    return {
      elastic,
      geometric,
      moved,
      still,
      inside: still - moved,
      /** Side acceleration in g at which the inside wheel carries nothing; everything here grows in step with it. */
      liftsAt: moved > 0 ? (lateralAcceleration * still) / moved : Infinity,
    }
  }
  const axles = {
    front: axle(front, stiffnessFront, rollCentreFront, values.trackFront),
    rear: axle(1 - front, stiffnessRear, rollCentreRear, values.trackRear),
  }
  // What holds the car down against what turns it over, both axles together.
  const holding = axles.front.still * values.trackFront + axles.rear.still * values.trackRear
  const turning = axles.front.moved * values.trackFront + axles.rear.moved * values.trackRear
  return {
    axisHeight,
    lever,
    reserve,
    stiffnessFront: stiffnessFront * degree,
    stiffnessRear: stiffnessRear * degree,
    rollAngle: angle / degree,
    ...axles,
    /**
     * Side acceleration in g at which the car goes over. One axle may lift long before: the other then holds the
     * car alone, so this comes from the moments of both together.
     */
    rollsAt: turning > 0 ? (lateralAcceleration * holding) / turning : Infinity,
  }
}
