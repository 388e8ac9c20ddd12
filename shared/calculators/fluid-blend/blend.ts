export { blendLogLinear, blendRefutas, blendingNumber, shareLogLinear, shareRefutas }

/**
 * One fluid of a blend: its share by mass, 0 to 1, and its viscosity in cSt, all fluids at the same
 * temperature.
 */
interface Component {
  share: number
  viscosity: number
}

/**
 * Log-linear rule (S. Arrhenius, Z. Phys. Chem. 1 (1887) 285): ln ν = Σ x ln ν. cSt in, cSt out; shares add
 * up to 1.
 */
function blendLogLinear(components: readonly Component[]): number {
  return Math.exp(sum(components, (viscosity) => Math.log(viscosity)))
}

/**
 * Refutas rule: blending numbers, weighted by mass, add up; then back to cSt. R. E. Maples, Petroleum
 * Refinery Process Economics, 2nd ed., PennWell 2000, as quoted in public. Made for petroleum oils, so for
 * silicone it is only a second opinion.
 */
function blendRefutas(components: readonly Component[]): number {
  return Math.exp(Math.exp((sum(components, blendingNumber) - 10.975) / 14.534)) - 0.8
}

/** VBN = 14.534 ln(ln(ν + 0.8)) + 10.975, ν in cSt and above 0.2. */
function blendingNumber(viscosity: number): number {
  return 14.534 * Math.log(Math.log(viscosity + 0.8)) + 10.975
}

/** Share of the second fluid that blends to `target` by the log-linear rule; the two fluids must differ. */
function shareLogLinear(first: number, second: number, target: number): number {
  return Math.log(target / first) / Math.log(second / first)
}

/** The same by the Refutas rule. */
function shareRefutas(first: number, second: number, target: number): number {
  return (blendingNumber(target) - blendingNumber(first)) / (blendingNumber(second) - blendingNumber(first))
}

function sum(components: readonly Component[], of: (viscosity: number) => number): number {
  return components.reduce((total, { share, viscosity }) => total + share * of(viscosity), 0)
}
