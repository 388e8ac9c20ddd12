export { handlers, hasRawLabel }

import { basisHandler } from './basis.ts'
import { calculatorHandler } from './calculator.ts'
import { cautionHandler } from './caution.ts'
import { effectsHandler } from './effects.ts'
import { formulaHandler } from './formula.ts'
import type { DirectiveHandler } from './handler.ts'
import { pictureHandler } from './picture.ts'
import { termHandler } from './term.ts'
import { workedHandler } from './worked.ts'

/** Every directive of the guide language, by name. */
const handlers: ReadonlyMap<string, DirectiveHandler> = new Map(
  [
    calculatorHandler, workedHandler, effectsHandler, cautionHandler, pictureHandler, termHandler, basisHandler,
    formulaHandler,
  ].map((handler) => [handler.name, handler]),
)

function hasRawLabel(name: string): boolean {
  return handlers.get(name)?.label === 'raw'
}
