export { workingText }

import { mathText } from '#shared/calculators/mathml.ts'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { formatChosen } from '#shared/units/unit-choices.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import type { CalculatorRun } from '#shared/calculators/run-definition.ts'

/**
 * The whole calculation as plain text, in the formula's own units: for a notebook, a message or the forum of
 * one's club. `address` leads back to the same numbers.
 */
function workingText(
  definition: CalculatorDefinition,
  run: Extract<CalculatorRun, { ok: true }>,
  address: string,
): string {
  const { inputs, outputs } = run
  const { steps, symbols } = definition.working(inputs, outputs)
  const value = (amount: number | undefined, unit: Parameters<typeof formatChosen>[1], digits: number) =>
    amount === undefined ? '–' : formatChosen(amount, unit, digits, {})
  return [
    definition.title,
    plainSentence(definition.answer(inputs, outputs).says),
    '',
    ...definition.inputs.map(({ key, label, unit }) => `${label}: ${value(inputs[key], unit, 9)}`),
    '',
    ...steps.flatMap(({ title, formula, numbers, result }, index) => [
      `${index + 1}. ${title}`,
      ...[formula, numbers].flatMap((line) => (line === undefined ? [] : `   ${mathText(line)}`)),
      ...(result === undefined ? [] : [`   = ${plainSentence([result])}`]),
    ]),
    '',
    ...symbols.map(({ symbol, means }) => `${mathText(symbol)}: ${plainSentence(means)}`),
    '',
    ...definition.outputs.map(({ key, label, unit, digits }) => `${label}: ${value(outputs[key], unit, digits)}`),
    '',
    `Good between: ${definition.limits.goodBetween}`,
    `How close: ${definition.limits.howClose}`,
    ...definition.sources.map(({ text, url, known }) => `Source: ${text}${url ? ` ${url}` : ''} (${known})`),
    address,
    '',
  ].join('\n')
}
