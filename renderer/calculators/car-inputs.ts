export { carKeyOf, endOf, fromCar }

import { endsOf } from '#shared/calculators/ends.ts'
import { carValue } from '#shared/cars/derived-values.ts'
import type { CalculatorDefinition, CalculatorInput } from '#shared/calculators/definition.ts'
import type { CarEnd } from '#shared/cars/car-ends.ts'
import type { CarKey } from '#shared/cars/car-values.ts'
import type { InstrumentProps } from './instrument-props.ts'

/** Which value of a car an input asks for, when the instrument is about this end of it. */
function carKeyOf({ carKey }: Pick<CalculatorInput, 'carKey'>, end: CarEnd | undefined): CarKey | undefined {
  return typeof carKey === 'object' ? (end === undefined ? undefined : carKey[end]) : carKey
}

/**
 * What the reader's car says about an input, if anything. What only follows from other values and is out of the input's range
 * is passed over: nobody typed it, so nobody could put it right here.
 */
function fromCar(
  input: Pick<CalculatorInput, 'carKey' | 'min' | 'max'>,
  { car, end }: Pick<InstrumentProps, 'car' | 'end'>,
): number | undefined {
  const key = carKeyOf(input, end)
  if (key === undefined || car === undefined) return undefined
  const value = carValue(car.values, key)
  const fits = value === undefined || Object.hasOwn(car.values, key) || (value >= input.min && value <= input.max)
  return fits ? value : undefined
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
