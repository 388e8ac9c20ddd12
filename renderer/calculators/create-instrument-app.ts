export { createInstrumentApp }

import { createSSRApp, type App } from 'vue'
import CalculatorInstrument from './CalculatorInstrument.vue'
import { drawingPart } from './drawing-part.ts'
import { calculatorLookup, type InstrumentProps } from './instrument-props.ts'
import type { Pinia } from 'pinia'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'

/**
 * One instrument as an application of its own: `renderToString` it on the server, `mount` it in the browser. What draws
 * is loaded only for a calculator that has drawings.
 */
async function createInstrumentApp(
  definition: CalculatorDefinition,
  props: InstrumentProps,
  pinia: Pinia,
): Promise<App> {
  const drawing = definition.drawings && (await import('./DrawingFigure.vue')).default
  const app = createSSRApp(CalculatorInstrument, { ...props })
  app.use(pinia)
  app.provide(calculatorLookup, () => definition)
  if (drawing) app.provide(drawingPart, drawing)
  return app
}
