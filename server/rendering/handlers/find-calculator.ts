export { findCalculator }

import type { CalculatorVocabulary } from '../types.ts'
import type { HandlerContext } from './handler.ts'

/**
 * The calculator that a directive names; undefined, with the writer told, when there is none of that name.
 */
function findCalculator(
  slug: string | undefined,
  example: string,
  context: HandlerContext,
): CalculatorVocabulary | undefined {
  if (slug === undefined) {
    context.report('missing_attribute', `Say which calculator: ${example}`)
    return undefined
  }
  const calculator = context.vocabulary.calculators.get(slug)
  if (calculator === undefined) context.report('unknown_calculator', `There is no calculator “${slug}”.`)
  return calculator
}
