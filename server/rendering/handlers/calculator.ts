export { calculatorHandler }

import { findCalculator } from './find-calculator.ts'
import type { DirectiveHandler } from './handler.ts'
import { readInputs } from './numbers.ts'

/**
 * `::calculator{slug=fluid-temperature viscosityAt25=7000 end=front}`: a calculator with the writer's starting values and, where
 * it is about one end of the car, which.
 */
const calculatorHandler: DirectiveHandler = {
  name: 'calculator',
  forms: ['leaf'],
  attributes: 'any',
  label: 'none',
  toMarkup({ attributes }, context) {
    const { slug, end, ...given } = Object.fromEntries(attributes)
    const calculator = findCalculator(slug, '::calculator{slug=fluid-temperature}', context)
    if (calculator === undefined) return null
    const preset = readInputs(Object.entries(given), calculator, context)
    const known = calculator.ends.find((each) => each === end)
    if (end !== undefined && known === undefined) {
      const ends = calculator.ends.length === 0 ? 'It is about the whole car: leave “end” out.' : `It takes: ${calculator.ends.join(', ')}.`
      context.report('unknown_end', `${calculator.title} has no end “${end}”. ${ends}`)
    }
    return context.addPart({ kind: 'calculator', slug: calculator.slug, preset, ...(known && { end: known }) })
  },
}
