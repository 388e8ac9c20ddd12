export { readNumber, readInputs }

import type { CalculatorVocabulary } from '../types.ts'
import type { HandlerContext } from './handler.ts'

const NUMBER = /^[-+]?(?:\d{1,15}(?:\.\d{1,15})?|\.\d{1,15})(?:[eE][-+]?\d{1,3})?$/

/** A plain decimal number such as `7000`, `-1.5` or `2e-3`; null for anything else. */
function readNumber(text: string): number | null {
  return NUMBER.test(text) ? Number(text) : null
}

/**
 * The values given to a calculator's inputs, in each input's unit. What is no input, no number or out of
 * range is reported and left out, so that the calculator's own starting value stands.
 */
function readInputs(
  given: Iterable<[string, string]>,
  calculator: CalculatorVocabulary,
  context: HandlerContext,
): Record<string, number> {
  const values: [string, number][] = []
  for (const [key, text] of given) {
    const input = calculator.inputs.find((candidate) => candidate.key === key)
    if (input === undefined) {
      const known = calculator.inputs.map((candidate) => candidate.key).join(', ')
      context.report('unknown_input', `${calculator.title} has no “${key}”. It takes: ${known}.`)
      continue
    }
    const value = readNumber(text)
    if (value === null) {
      context.report(
        'not_a_number',
        `${key} must be a number such as ${input.min}, without its unit; it is “${text}”.`,
      )
    } else if (value < input.min || value > input.max) {
      const unit = input.unit === '' ? '' : ` ${input.unit}`
      context.report(
        'out_of_range',
        `${key} must be from ${input.min} to ${input.max}${unit}; it is ${text}.`,
      )
    } else {
      values.push([key, value])
    }
  }
  return Object.fromEntries(values)
}
