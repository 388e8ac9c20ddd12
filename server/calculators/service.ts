export { getCalculator, listCalculators, runCalculator }
export type { CalculatorResult, CalculatorSummary }

import type { z } from 'zod'
import { NotFoundError, ValidationError } from '#server/errors.ts'
import { mathmlString, mathText } from '#shared/calculators/mathml.ts'
import { runDefinition } from '#shared/calculators/run-definition.ts'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { unitById } from '#shared/units/units.ts'
import type { CalculatorDefinition, FieldMessage, WorkingStep } from '#shared/calculators/definition.ts'
import type { CalculatorAnswer, RunAnswer } from './answers.ts'
import type { CalculatorRegistry } from './load-registry.ts'

type CalculatorSummary = z.infer<typeof CalculatorAnswer>
type CalculatorResult = z.infer<typeof RunAnswer>

/** All calculators with their inputs and outputs, without the words. */
function listCalculators(registry: CalculatorRegistry): CalculatorSummary[] {
  return [...registry.values()].map(({ slug, title, inputs, outputs }) => ({
    slug,
    title,
    inputs: inputs.map(({ key, unit, default: standard, min, max }) => ({
      key,
      unit: unitById(unit).written,
      default: standard,
      min,
      max,
    })),
    outputs: outputs.map(({ key, unit }) => ({ key, unit: unitById(unit).written })),
  }))
}

/** The calculator with this slug. Throws NotFoundError. */
function getCalculator(registry: CalculatorRegistry, slug: string): CalculatorDefinition {
  const calculator = registry.get(slug)
  if (calculator === undefined) throw new NotFoundError('calculator', slug)
  return calculator
}

/**
 * Runs a calculator. Keys that are absent take their listed defaults, so that a program may send only what it
 * changes; a key that is there must be a number in range. Throws NotFoundError for an unknown slug and
 * ValidationError with one entry a field.
 */
function runCalculator(
  registry: CalculatorRegistry,
  slug: string,
  values: Readonly<Record<string, unknown>>,
): CalculatorResult {
  const calculator = getCalculator(registry, slug)
  const run = runDefinition(calculator, values)
  if (!run.ok)
    throw new ValidationError('This calculator cannot work with these values.', run.errors.map(plainMessage))
  return {
    inputs: run.inputs,
    outputs: run.outputs,
    answer: plainSentence(calculator.answer(run.inputs, run.outputs).says),
    warnings: run.warnings.map(plainMessage),
    working: calculator.working(run.inputs, run.outputs).steps.map(plainStep),
  }
}

function plainMessage({ field, message }: FieldMessage): { field: string; message: string } {
  return { field, message: plainSentence(message) }
}

function plainStep({ title, formula, numbers, result }: WorkingStep): CalculatorResult['working'][number] {
  return {
    title,
    ...(formula && { formula: mathText(formula), mathml: mathmlString(formula) }),
    ...(numbers && { numbers: mathText(numbers) }),
    ...(result && { value: result.value, unit: unitById(result.unit).written }),
  }
}
