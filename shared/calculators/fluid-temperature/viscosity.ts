export { viscosityAt, viscosityRatio }

/**
 * How many times as thick a dimethyl silicone fluid is at a temperature (°C) as at 25 °C.
 *
 * The silicone maker's law log₁₀ ν = 763.1/(273 + T) − 2.559 + log₁₀ ν₂₅, normalised so that it gives ν₂₅
 * itself at 25 °C (as printed it gives 1.004 times that). Above −273 °C only; the same for fluids of every
 * thickness.
 */
function viscosityRatio(temperature: number): number {
  return 10 ** (763.1 * (1 / (273 + temperature) - 1 / 298))
}

/** Viscosity in cSt at a temperature in °C of the fluid that has `viscosityAt25` cSt at 25 °C. */
function viscosityAt(viscosityAt25: number, temperature: number): number {
  return viscosityAt25 * viscosityRatio(temperature)
}
