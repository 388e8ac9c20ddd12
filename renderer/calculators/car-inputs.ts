export { carKeyOf, endOf, endsOf, fromCar }

import { CAR_ENDS, type CarEnd } from '#shared/cars/car-ends.ts'
import { carValue } from '#shared/cars/derived-values.ts'
import type { CalculatorDefinition, CalculatorInput } from '#shared/calculators/definition.ts'
import type { CarKey } from '#shared/cars/car-values.ts'
import type { InstrumentProps } from './instrument-props.ts'

/** Which value of a car an input asks for, when the instrument is about this end of it. */
function carKeyOf({ carKey }: Pick<CalculatorInput, 'carKey'>, end: CarEnd | undefined): CarKey | undefined {
  return typeof carKey === 'object' ? (end === undefined ? undefined : carKey[end]) : carKey
}

/** What the reader's car says about an input, if anything. */
function fromCar(
  input: Pick<CalculatorInput, 'carKey'>,
  { car, end }: Pick<InstrumentProps, 'car' | 'end'>,
): number | undefined {
  const key = carKeyOf(input, end)
  return key === undefined || car === undefined ? undefined : carValue(car.values, key)
}

/** The ends that a calculator can be about; none where it is about the whole car. */
function endsOf(definition: CalculatorDefinition): CarEnd[] {
  return CAR_ENDS.filter((end) =>
    definition.inputs.some(({ carKey }) => typeof carKey === 'object' && carKey[end] !== undefined),
  )
}

/** The end an instrument begins with: the address's, else the guide's, else the first that the inputs name. */
function endOf(
  definition: CalculatorDefinition,
  { end, values }: Pick<InstrumentProps, 'end' | 'values'>,
): CarEnd | undefined {
  const ends = endsOf(definition)
  const asked = [values?.['end'], end].find((name) => ends.some((known) => known === name)) as CarEnd | undefined
  const named = definition.inputs.flatMap(({ carKey }) => (typeof carKey === 'object' ? Object.keys(carKey) : []))
  return asked ?? (named[0] as CarEnd | undefined)
}
