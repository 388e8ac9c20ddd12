export { calculatorHandler }

import { findCalculator } from './find-calculator.ts'
import type { DirectiveHandler } from './handler.ts'
import { readInputs } from './numbers.ts'

/**
 * `::calculator{slug=fluid-temperature viscosityAt25=7000}`: a calculator with the writer's starting values.
 */
const calculatorHandler: DirectiveHandler = {
  name: 'calculator',
  forms: ['leaf'],
  attributes: 'any',
  label: 'none',
  toMarkup({ attributes }, context) {
    const { slug, ...given } = Object.fromEntries(attributes)
    const calculator = findCalculator(slug, '::calculator{slug=fluid-temperature}', context)
    if (calculator === undefined) return null
    const preset = readInputs(Object.entries(given), calculator, context)
    return context.addPart({ kind: 'calculator', slug: calculator.slug, preset })
  },
}
