export { createInstrumentApp }

import { createSSRApp, type App } from 'vue'
import CalculatorInstrument from './CalculatorInstrument.vue'
import { calculatorLookup, type InstrumentProps } from './instrument-props.ts'
import type { Pinia } from 'pinia'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'

/**
 * One instrument as an application of its own: `renderToString` it on the server, `mount` it in the browser.
 */
function createInstrumentApp(definition: CalculatorDefinition, props: InstrumentProps, pinia: Pinia): App {
  const app = createSSRApp(CalculatorInstrument, { ...props })
  app.use(pinia)
  app.provide(calculatorLookup, () => definition)
  return app
}
