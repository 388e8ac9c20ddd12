export type { Derivation }

import type { DrawingSpec } from './drawing.ts'
import type { MathNode } from './mathml.ts'

/**
 * Where a calculator's formula comes from, for its own page: `shared/calculators/<slug>/derivation.ts` exports
 * `derivation`. It stands in a file of its own because only the server reads it: no page sends it to the
 * browser as code.
 */
interface Derivation {
  /** From what is known to the formula, each in one or two plain sentences. */
  steps: readonly { text: string; formula?: MathNode }[]
  /** With the letters of the formulas, where geometry matters. */
  drawing?: DrawingSpec
}
