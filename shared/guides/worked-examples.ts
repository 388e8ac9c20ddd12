export { missedExamples, runWorkedExamples }
export type { WorkedExample }

import type { CalculatorDefinition } from '../calculators/definition.ts'
import { runDefinition } from '../calculators/run-definition.ts'
import type { RenderedPart } from '../rendering/parts.ts'
import { unitById } from '../units/units.ts'

/** A worked example of a guide, run again. */
interface WorkedExample {
  /** Number of its part in the body. */
  n: number
  slug: string
  calculator: string
  inputs: Record<string, number>
  output: string
  unit: string
  /** What the page says, and what the formula gives; null when it gives nothing for these inputs. */
  says: number
  gives: number | null
  /** Both as fractions: 0.01 is 1 %. */
  allowed: number
  offBy: number | null
  matches: boolean
}

/** Runs every worked example in a rendered body. */
function runWorkedExamples({ calculators }: { calculators: ReadonlyMap<string, CalculatorDefinition> }, parts: readonly RenderedPart[]): WorkedExample[] {
  return parts.flatMap((part) => {
    if (part.kind !== 'worked') return []
    const definition = calculators.get(part.slug)
    const run = definition === undefined ? null : runDefinition(definition, part.inputs)
    const output = definition?.outputs.find(({ key }) => key === part.expect.key)
    const gives = run?.ok === true ? (run.outputs[part.expect.key] ?? null) : null
    const offBy = gives === null ? null : distance(part.expect.value, gives)
    return [
      {
        n: part.n,
        slug: part.slug,
        calculator: definition?.title ?? part.slug,
        inputs: part.inputs,
        output: output?.label ?? part.expect.key,
        unit: output === undefined ? '' : unitById(output.unit).written,
        says: part.expect.value,
        gives,
        allowed: part.tolerance,
        offBy,
        matches: offBy !== null && offBy <= part.tolerance,
      },
    ]
  })
}

/** In words, what the writer has to mend. */
function missedExamples(examples: readonly WorkedExample[]): string[] {
  return examples
    .filter((example) => !example.matches)
    .map((example) =>
      example.gives === null
        ? `The worked example of “${example.calculator}” has no answer with these numbers.`
        : `A worked example of “${example.calculator}” says ${example.says}; the formula gives ${Number(example.gives.toPrecision(5))}.`,
    )
}

// Relative to what the formula gives; where that is zero there is nothing to be relative to.
function distance(says: number, gives: number): number {
  return gives === 0 ? Math.abs(says) : Math.abs(says - gives) / Math.abs(gives)
}
