export { outputOf, relative, withinTolerance }
export type { Evidence, ReferenceCase }

import { runDefinition } from '#shared/calculators/run-definition.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'

/**
 * How the expected value is known.
 * - read: read in the named source
 * - read in a transcription: read in a public transcription of the named book; the book was not seen
 * - from memory: title and author are reliable, the exact number less so
 * - computed independently: worked out with the named general-purpose tool, not with this project's code
 */
type Evidence = 'read' | 'read in a transcription' | 'from memory' | 'computed independently'

/** One value from outside the project and what the project makes of the same inputs. */
interface ReferenceCase {
  calculator: string
  /** What is compared, with the inputs in words. */
  what: string
  /** Where the expected value comes from, exactly enough to find it again. */
  source: string
  evidence: Evidence
  expected: number
  unit: string
  /** Largest difference allowed, in `unit`. */
  tolerance: number
  /** Why that much and no more. */
  toleranceReason: string
  got: () => number
}

/** One output of a calculator, run through the same checks as in the product. */
function outputOf(calculator: CalculatorDefinition, inputs: Record<string, number>, key: string): number {
  const run = runDefinition(calculator, inputs)
  const value = run.ok ? run.outputs[key] : undefined
  if (value === undefined)
    throw new Error(`${calculator.slug} gives no ${key} for ${JSON.stringify(inputs)}.`)
  return value
}

/** A tolerance as a share of the expected value. */
function relative(expected: number, share: number): Pick<ReferenceCase, 'expected' | 'tolerance'> {
  return { expected, tolerance: Math.abs(expected) * share }
}

function withinTolerance({ expected, tolerance }: ReferenceCase, got: number): boolean {
  return Math.abs(got - expected) <= tolerance
}
