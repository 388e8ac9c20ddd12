export { endsOf }

import { CAR_ENDS, type CarEnd } from '#shared/cars/car-ends.ts'
import type { CalculatorInput } from './definition.ts'

/** The ends of the car that a calculator can be about; none where it is about the whole car. */
function endsOf({ inputs }: { inputs: readonly Pick<CalculatorInput, 'carKey'>[] }): CarEnd[] {
  return CAR_ENDS.filter((end) => inputs.some(({ carKey }) => typeof carKey === 'object' && carKey[end] !== undefined))
}
