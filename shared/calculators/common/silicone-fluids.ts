export { siliconeBottles, bottlesAround, thinnestFluid, thickestFluid, fluidCautions }

import type { CalculatorCaution } from '../definition.ts'

/**
 * Thicknesses that silicone shock and diff fluids are commonly bottled in, cSt at 25 °C (common practice, no
 * standard).
 */
const siliconeBottles: readonly number[] = [
  100, 150, 200, 250, 300, 350, 400, 450, 500, 550, 600, 700, 800, 900, 1000, 1500, 2000, 3000, 4000, 5000,
  6000, 7000, 8000, 9000, 10000, 12500, 15000, 20000, 30000, 40000, 50000, 60000, 80000, 100000, 200000,
  300000, 500000, 1000000,
]

/**
 * Ends of what the fluid calculators accept, cSt at 25 °C. Below, blending numbers stop making sense; above,
 * it is a gum.
 */
const thinnestFluid = 0.5
const thickestFluid = 10_000_000

/** The nearest bottles below and above a thickness; either is undefined beyond the ends of the ladder. */
function bottlesAround(viscosity: number): { below: number | undefined; above: number | undefined } {
  return {
    below: siliconeBottles.findLast((bottle) => bottle < viscosity),
    above: siliconeBottles.find((bottle) => bottle > viscosity),
  }
}

/** For everything that ends with opening a diff or a shock. */
const fluidCautions: readonly CalculatorCaution[] = [
  {
    kind: 'solvent',
    title: 'Cleaner and used fluid',
    order:
      'Clean parts in moving air, with gloves and eye protection, away from the charger and from anything that sparks.',
    reason:
      'Spray cleaner catches fire from a spark. Follow what its can says. Wipe spilt silicone up at once: it makes floors slippery. ' +
      'Take used fluid and soaked paper to a collection point as your local rules say; never pour them down a drain or on the ground.',
  },
]
