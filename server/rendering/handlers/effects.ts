export { effectsHandler }

import type { DirectiveHandler } from './handler.ts'

/** `::effects{adjustable=front_diff_fluid}`: the lap line of one adjustable inside the text. */
const effectsHandler: DirectiveHandler = {
  name: 'effects',
  forms: ['leaf'],
  attributes: ['adjustable'],
  label: 'none',
  toMarkup({ attributes }, context) {
    const adjustable = attributes.get('adjustable')
    if (adjustable === undefined) {
      context.report('missing_attribute', 'Say which adjustable: ::effects{adjustable=front_diff_fluid}')
      return null
    }
    if (!context.vocabulary.adjustables.has(adjustable)) {
      context.report('unknown_adjustable', `There is no adjustable “${adjustable}”.`)
      return null
    }
    return context.addPart({ kind: 'effects', adjustable })
  },
}
