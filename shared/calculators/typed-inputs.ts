export { readTypedInputs, typedValue }
export type { TypedInputs }

import { parseQuantity } from '#shared/units/parse-number.ts'
import { unitFor, type UnitChoices } from '#shared/units/unit-choices.ts'
import { unitById, type UnitId } from '#shared/units/units.ts'
import { rangeOf } from './check-inputs.ts'
import { say, type Sentence } from './sentence.ts'
import type { CalculatorDefinition, CalculatorInput, FieldMessage } from './definition.ts'

interface TypedInputs {
  /** What could be read, in the calculator's units. */
  values: Record<string, number>
  errors: FieldMessage[]
}

/**
 * Reads one field; `shown` is the unit that stands beside it. Only the text is judged here, not the range.
 */
function typedValue(
  input: CalculatorInput,
  text: string,
  shown: UnitId,
): { value: number } | { error: Sentence } {
  const parsed = parseQuantity(text, input.unit, shown)
  if (parsed.ok) return { value: parsed.value }
  switch (parsed.reason) {
    case 'empty':
      return { error: [`Fill in ${lowerFirst(input.label)}, `, ...rangeOf(input), '.'] }
    case 'other_unit':
      if (unitById(shown).symbol === '') return { error: say`${input.label} is a plain number: leave the unit out.` }
      return { error: say`${input.label} is measured in ${unitById(shown).symbol}; give it in that unit.` }
    case 'not_a_number':
      return { error: [`Type ${lowerFirst(input.label)} as a number, `, ...rangeOf(input), '.'] }
  }
}

/**
 * Reads the fields of a form or a link, by key. Keys without text are left out, so they take their defaults.
 */
function readTypedInputs(
  definition: CalculatorDefinition,
  texts: Readonly<Record<string, string>>,
  choices: UnitChoices,
): TypedInputs {
  const read: TypedInputs = { values: {}, errors: [] }
  for (const input of definition.inputs) {
    const text = Object.hasOwn(texts, input.key) ? texts[input.key] : undefined
    if (text === undefined) continue
    const typed = typedValue(input, text, unitFor(input.unit, choices))
    if ('value' in typed) read.values[input.key] = typed.value
    else read.errors.push({ field: input.key, message: typed.error })
  }
  return read
}

function lowerFirst(label: string): string {
  return label.charAt(0).toLowerCase() + label.slice(1)
}
