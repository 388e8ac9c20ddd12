export { NoAnswerError, runDefinition }
export type { CalculatorRun }

import { checkInputs } from './check-inputs.ts'
import { say, type Sentence } from './sentence.ts'
import type { CalculatorDefinition, FieldMessage } from './definition.ts'

interface Answered {
  ok: true
  inputs: Record<string, number>
  outputs: Record<string, number>
  warnings: FieldMessage[]
}
type CalculatorRun = Answered | { ok: false; errors: FieldMessage[] }

/**
 * Thrown by `compute` when allowed values have no answer (a linkage that binds); carries the field to change.
 */
class NoAnswerError extends Error {
  override readonly name = 'NoAnswerError'
  readonly field: string
  readonly says: Sentence

  constructor(field: string, says: Sentence) {
    super('These values have no answer.')
    this.field = field
    this.says = says
  }
}

/**
 * Checks the values, computes and looks for warnings. What comes out is finite, or it is an error at a field.
 */
function runDefinition(
  definition: CalculatorDefinition,
  values: Readonly<Record<string, unknown>>,
): CalculatorRun {
  const checked = checkInputs(definition, values)
  if (!checked.ok) return checked
  const { inputs } = checked
  try {
    const outputs = definition.compute(inputs)
    const broken = definition.outputs.find(({ key }) => !Number.isFinite(outputs[key]))
    if (broken !== undefined) {
      const field = definition.inputs[0]?.key ?? ''
      return {
        ok: false,
        errors: [{ field, message: say`These values give no finite answer for “${broken.label}”.` }],
      }
    }
    return { ok: true, inputs, outputs, warnings: definition.warnings(inputs, outputs) }
  } catch (error) {
    if (isNoAnswer(error)) return { ok: false, errors: [{ field: error.field, message: error.says }] }
    throw error
  }
}

// By name: calculators are bundled in chunks of their own, so the class may exist twice.
function isNoAnswer(error: unknown): error is NoAnswerError {
  return error instanceof Error && error.name === 'NoAnswerError'
}
