export { fieldText, startField, startValues }
export type { FieldState }

import { nextStep } from '#shared/calculators/steps.ts'
import { typedValue } from '#shared/calculators/typed-inputs.ts'
import { formatNumber } from '#shared/units/format-number.ts'
import { unitFor, type UnitChoices } from '#shared/units/unit-choices.ts'
import { convert } from '#shared/units/units.ts'
import { endOf, fromCar } from './car-inputs.ts'
import type { CalculatorDefinition, CalculatorInput } from '#shared/calculators/definition.ts'
import type { Sentence } from '#shared/calculators/sentence.ts'
import type { InstrumentProps } from './instrument-props.ts'

interface FieldState {
  /** What stands in the field. */
  text: string
  /** What it means, exactly, in the input's unit; missing while the text cannot be read. */
  value?: number
  error?: Sentence
  /** The reader's own: typed, moved, or in the link they followed. A car that arrives later leaves it alone. */
  own?: true
}

/** A value as it stands in its field: enough digits to type, not the sixteen of a double. */
function fieldText(value: number, input: CalculatorInput, units: UnitChoices): string {
  return formatNumber(convert(value, input.unit, unitFor(input.unit, units)), 7)
}

/**
 * Where an instrument begins without anything in the address: the car's values, else the guide's, else the
 * defaults.
 */
function startValues(
  definition: CalculatorDefinition,
  props: Pick<InstrumentProps, 'car' | 'end' | 'preset' | 'values'>,
): Record<string, number> {
  const at = { ...props, end: endOf(definition, props) }
  return Object.fromEntries(definition.inputs.map((input) => [input.key, startValue(input, at)]))
}

function startValue(input: CalculatorInput, { car, end, preset = {} }: Pick<InstrumentProps, 'car' | 'end' | 'preset'>): number {
  return (
    fromCar(input, { car, end }) ??
    (Object.hasOwn(preset, input.key) ? preset[input.key] : undefined) ??
    input.default
  )
}

/**
 * The first state of a field. A value in the address is read in the unit its form was printed in (`typedIn`;
 * a link says none and means the calculator's own). Text that cannot be read is kept as it was typed. `step`
 * is the plus or minus button that was pressed without JavaScript. `props.end` is the end the instrument is about.
 */
function startField(
  input: CalculatorInput,
  props: InstrumentProps,
  typedIn: UnitChoices,
  shown: UnitChoices,
): FieldState {
  const { values = {} } = props
  const text = Object.hasOwn(values, input.key) ? values[input.key] : undefined
  const from = unitFor(input.unit, typedIn)
  const typed = text === undefined ? { value: startValue(input, props) } : typedValue(input, text, from)
  if ('error' in typed) return { text: text ?? '', error: typed.error, own: true }
  const stepped =
    values['step'] === `${input.key}:up` || values['step'] === `${input.key}:down`
      ? nextStep(input, typed.value, values['step'].endsWith(':up') ? 'up' : 'down', from)
      : undefined
  const value = stepped ?? typed.value
  return { text: fieldText(value, input, shown), value, ...(text === undefined ? {} : { own: true as const }) }
}
