export { coilSpring }
export type { CoilSpringValues }

interface CoilSpringValues {
  /** mm */
  wireDiameter: number
  /** Across the outside of the coils, mm. */
  outsideDiameter: number
  activeCoils: number
  /** GPa */
  shearModulus: number
}

/**
 * Rate (N/mm) and index of a coil spring of round wire, from the mean diameter of its coils (mm):
 * k = G d⁴/(8 D³ n). Shigley's Mechanical Engineering Design, chapter 10; the small term for direct shear is
 * left out, as handbooks do. The outside diameter must be more than twice the wire.
 */
function coilSpring({ wireDiameter: d, outsideDiameter, activeCoils, shearModulus }: CoilSpringValues) {
  const meanDiameter = outsideDiameter - d
  return {
    meanDiameter,
    rate: (shearModulus * 1000 * d ** 4) / (8 * meanDiameter ** 3 * activeCoils),
    springIndex: meanDiameter / d,
  }
}
