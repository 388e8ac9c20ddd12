export { workedHandler }

import type { CalculatorVocabulary } from '../types.ts'
import { findCalculator } from './find-calculator.ts'
import type { DirectiveHandler, HandlerContext } from './handler.ts'
import { readInputs, readNumber } from './numbers.ts'

const EXAMPLE = '::worked{calculator=fluid-blend … expect=highVolume:4.854 tolerance=1%}'
const USUAL_TOLERANCE = '1%'
/** Beyond this a worked example would agree with nearly anything. */
const MAX_TOLERANCE_PERCENT = 20

/**
 * `::worked{calculator=fluid-blend lowViscosity=5000 … expect=highVolume:4.854 tolerance=1%}`: a calculator
 * run with the answer the writer expects, computed again at every review.
 */
const workedHandler: DirectiveHandler = {
  name: 'worked',
  forms: ['leaf'],
  attributes: 'any',
  label: 'none',
  toMarkup({ attributes }, context) {
    const { calculator: slug, expect, tolerance: allowed, ...given } = Object.fromEntries(attributes)
    const calculator = findCalculator(slug, EXAMPLE, context)
    if (calculator === undefined) return null
    const inputs = readInputs(Object.entries(given), calculator, context)
    const expected = readExpected(expect, calculator, context)
    const tolerance = readTolerance(allowed ?? USUAL_TOLERANCE, context)
    if (expected === null || tolerance === null) return null
    return context.addPart({ kind: 'worked', slug: calculator.slug, inputs, expect: expected, tolerance })
  },
}

function readExpected(
  text: string | undefined,
  calculator: CalculatorVocabulary,
  context: HandlerContext,
): { key: string; value: number } | null {
  const [key, valueText, ...more] = (text ?? '').split(':')
  const value = readNumber(valueText ?? '')
  if (value === null || more.length > 0) {
    context.report('missing_attribute', `Say which answer you expect as expect=key:number, as in ${EXAMPLE}`)
    return null
  }
  if (!calculator.outputs.some((output) => output.key === key)) {
    const known = calculator.outputs.map((output) => output.key).join(', ')
    context.report(
      'unknown_output',
      `${calculator.title} does not answer with “${key}”. It answers with: ${known}.`,
    )
    return null
  }
  return { key: key!, value }
}

/** `1%` → 0.01. */
function readTolerance(text: string, context: HandlerContext): number | null {
  const percent = text.endsWith('%') ? readNumber(text.slice(0, -1)) : null
  if (percent !== null && percent > 0 && percent <= MAX_TOLERANCE_PERCENT) return percent / 100
  context.report(
    'bad_tolerance',
    `tolerance must be above 0% and at most ${MAX_TOLERANCE_PERCENT}%, as in tolerance=1%.`,
  )
  return null
}
