export { checkEach, checkInputs, rangeOf }
export type { CheckedInputs }

import { figure, say, type Sentence } from './sentence.ts'
import type { CalculatorDefinition, CalculatorInput, FieldMessage } from './definition.ts'

type CheckedInputs = { ok: true; inputs: Record<string, number> } | { ok: false; errors: FieldMessage[] }

/**
 * The one place where inputs are checked, for the API, for links and for typing in the page.
 *
 * A key that is absent takes its listed default. A key that is there must be a finite number inside its
 * range: null, text, true, NaN and the infinities are refused, and nothing is clamped or rounded. Keys that
 * the calculator does not have are refused too. Only when each value stands does the calculator look at how
 * they go together. Errors come in field order.
 */
function checkInputs(
  definition: CalculatorDefinition,
  values: Readonly<Record<string, unknown>>,
): CheckedInputs {
  const errors = checkEach(definition, values)
  if (errors.length > 0) return { ok: false, errors }
  const inputs = Object.fromEntries(
    definition.inputs.map((input) => [input.key, given(input, values) as number]),
  )
  const related = definition.relations?.(inputs) ?? []
  return related.length === 0 ? { ok: true, inputs } : { ok: false, errors: related }
}

/** Each value for itself, without how they go together. */
function checkEach(
  definition: CalculatorDefinition,
  values: Readonly<Record<string, unknown>>,
): FieldMessage[] {
  const errors: FieldMessage[] = []
  for (const input of definition.inputs) {
    const message = problemWith(input, given(input, values))
    if (message !== undefined) errors.push({ field: input.key, message })
  }
  for (const key of Object.keys(values)) {
    if (definition.inputs.some((input) => input.key === key)) continue
    const known = definition.inputs.map((input) => input.key).join(', ')
    errors.push({
      field: key,
      message: say`“${key}” is not an input of ${definition.slug}. It has: ${known}.`,
    })
  }
  return errors
}

function given(input: CalculatorInput, values: Readonly<Record<string, unknown>>): unknown {
  return Object.hasOwn(values, input.key) ? values[input.key] : input.default
}

function problemWith(input: CalculatorInput, value: unknown): Sentence | undefined {
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    return [`${input.label} must be a number, `, ...rangeOf(input), '.']
  }
  if (value < input.min || value > input.max)
    return [`${input.label} must be `, ...rangeOf(input), `: ${input.reason}.`]
  if (input.whole && !Number.isInteger(value)) return say`${input.label} must be a whole number.`
  return undefined
}

/** “between 0.5 and 1,000 cSt” as a sentence part, in whatever unit it is shown. */
function rangeOf(input: CalculatorInput): Sentence {
  return say`between ${figure(input.min, input.unit, 9)} and ${figure(input.max, input.unit, 9)}`
}
