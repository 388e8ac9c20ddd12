export { barCompliance, endRate }
export type { BarValues }

interface BarValues {
  /** mm */
  diameter: number
  /** Straight part between the two bends, mm. */
  middleLength: number
  /** From the middle of the straight part to the link, square to it, mm. */
  armLength: number
  /** GPa */
  shearModulus: number
  /** GPa */
  youngsModulus: number
}

/**
 * How far one end of a U-shaped bar of round wire gives, mm for each N, the ends moving opposite ways: first
 * by the twist of its middle, then by the bending of its arm. Arms square to the middle, bearings at the bends;
 * δ/F = a² b/(2 G J) + a³/(3 E I) with J = π d⁴/32, I = π d⁴/64. Torsion of a shaft and a cantilever added:
 * Gere, Mechanics of Materials, and Roark's Formulas.
 */
function barCompliance({ diameter, middleLength, armLength, shearModulus, youngsModulus }: BarValues) {
  const polar = (Math.PI * diameter ** 4) / 32
  return {
    twist: (armLength ** 2 * middleLength) / (2 * shearModulus * 1000 * polar),
    bending: armLength ** 3 / (3 * youngsModulus * 1000 * (polar / 2)),
  }
}

/** Force at one end per movement of that end, N/mm. */
function endRate(bar: BarValues): number {
  const { twist, bending } = barCompliance(bar)
  return 1 / (twist + bending)
}
