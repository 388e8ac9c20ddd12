export { dischargeCoefficient, laminarPressure, matchingViscosity, orificePressure, shockPack, withEnds }
export type { Holes, PackValues }

/** Straight holes through a piston. */
interface Holes {
  count: number
  /** mm */
  diameter: number
  /** Thickness of the piston, mm. */
  length: number
}

interface PackValues {
  holes: number
  /** mm */
  holeDiameter: number
  /** mm */
  pistonThickness: number
  /** mm */
  boreDiameter: number
  /** mm */
  rodDiameter: number
  /** cSt */
  viscosity: number
  /** kg/m³ */
  density: number
  /** mm/s */
  shaftSpeed: number
}

/** Of a sharp-edged hole at high Reynolds numbers; for holes as small as these it is only a stand-in. */
const dischargeCoefficient = 0.61

/**
 * Pressure in Pa that drives `flow` (m³/s) through the holes against viscosity alone (Pa·s): Hagen–Poiseuille,
 * Δp = 128 μ L Q/(n π d⁴). F. M. White, Fluid Mechanics, chapter 6.
 */
function laminarPressure({ count, diameter, length }: Holes, dynamicViscosity: number, flow: number): number {
  const [d, l] = [diameter / 1000, length / 1000]
  return (128 * dynamicViscosity * l * flow) / (count * Math.PI * d ** 4)
}

/** Pressure in Pa that speeds the fluid (kg/m³) up through the holes: Δp = ρ/2 (Q/(C n π d²/4))². */
function orificePressure(
  { count, diameter }: Holes,
  density: number,
  flow: number,
  coefficient = dischargeCoefficient,
): number {
  const area = (count * Math.PI * (diameter / 1000) ** 2) / 4
  return (density / 2) * (flow / (coefficient * area)) ** 2
}

/**
 * A shock whose piston of area A = π/4 (bore² − rod²) pushes its fluid through the holes: damping against
 * viscosity alone in N·s/m, force at `shaftSpeed` with the orifice part in N, Reynolds number in a hole.
 */
function shockPack(values: PackValues) {
  const { viscosity, density, boreDiameter, rodDiameter, shaftSpeed } = values
  const holes = { count: values.holes, diameter: values.holeDiameter, length: values.pistonThickness }
  const area = (Math.PI / 4) * (boreDiameter ** 2 - rodDiameter ** 2) * 1e-6
  const speed = shaftSpeed / 1000
  const flow = area * speed
  const laminar = laminarPressure(holes, viscosity * 1e-6 * density, flow)
  const orifice = orificePressure(holes, density, flow)
  const holeArea = (holes.count * Math.PI * (holes.diameter / 1000) ** 2) / 4
  return {
    area,
    damping: (area * laminar) / speed,
    force: area * (laminar + orifice),
    orificeForce: area * orifice,
    reynolds: ((flow / holeArea) * (holes.diameter / 1000)) / (viscosity * 1e-6),
  }
}

/** The fluid with which `other` damps like `own` does with `viscosity`, by viscosity alone. */
function matchingViscosity(viscosity: number, own: Holes, other: Holes): number {
  return viscosity * (laminarPressure(own, 1, 1) / laminarPressure(other, 1, 1))
}

/**
 * The holes as long as they act: the fluid has to bend into them and out again, worth 3π/16 of a diameter.
 * Z. Dagan, S. Weinbaum and R. Pfeffer, J. Fluid Mech. 115 (1982) 505; exact for a hole of no length.
 */
function withEnds(holes: Holes): Holes {
  return { ...holes, length: holes.length + (3 * Math.PI * holes.diameter) / 16 }
}
