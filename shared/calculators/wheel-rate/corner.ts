export { atTheWheel, overshoot, released }
export type { CornerValues }

import { standardGravity } from '../common/standard-gravity.ts'

interface CornerValues {
  /** N/mm, at the shock. */
  springRate: number
  /** Shock travel over wheel travel. */
  motionRatio: number
  /** What the spring of one wheel carries, kg. */
  sprungMass: number
  /** N·s/m, at the shock. */
  damping: number
}

/**
 * Spring and damping of one corner as they are felt at the wheel, in N/mm, Hz, N·s/m and mm: k_w = k MR²,
 * f = √(k_w/m)/2π, c_crit = 2√(k_w m), ζ = c MR²/c_crit, δ = m g/k_w. Barton and Fieldhouse, Automotive
 * Chassis Engineering, equations (3.29) to (3.33); Meriam and Kraige, Dynamics, chapter 8. The tyre is left
 * out.
 */
function atTheWheel({ springRate, motionRatio, sprungMass, damping }: CornerValues) {
  const wheelRate = springRate * motionRatio ** 2
  const perMetre = wheelRate * 1000
  const criticalDamping = 2 * Math.sqrt(perMetre * sprungMass)
  return {
    wheelRate,
    rideFrequency: Math.sqrt(perMetre / sprungMass) / (2 * Math.PI),
    criticalDamping,
    dampingRatio: (damping * motionRatio ** 2) / criticalDamping,
    staticDeflection: (sprungMass * standardGravity) / wheelRate,
  }
}

/** How far it swings past rest after a bump, as a share of the bump; 0 from critical damping on. */
function overshoot(dampingRatio: number): number {
  if (dampingRatio >= 1) return 0
  return Math.exp((-Math.PI * dampingRatio) / Math.sqrt(1 - dampingRatio ** 2))
}

/**
 * Where the wheel is after so many undamped swings when it was let go at 1 from rest: the solution of
 * x″ + 2ζω x′ + ω² x = 0.
 */
function released(dampingRatio: number, swings: number): number {
  const angle = 2 * Math.PI * swings
  // The two other forms lose their last digits near critical damping, where they meet this one.
  if (Math.abs(dampingRatio - 1) < 1e-4) return Math.exp(-angle) * (1 + angle)
  const root = Math.sqrt(Math.abs(dampingRatio ** 2 - 1))
  if (dampingRatio < 1) {
    const fading = Math.exp(-dampingRatio * angle)
    return fading * (Math.cos(root * angle) + (dampingRatio / root) * Math.sin(root * angle))
  }
  const [slow, fast] = [1 / (dampingRatio + root), dampingRatio + root]
  return (fast * Math.exp(-slow * angle) - slow * Math.exp(-fast * angle)) / (fast - slow)
}
