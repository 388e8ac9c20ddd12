export { createIslandApp }

import { createInstrumentApp } from './create-instrument-app.ts'
import { loadCalculator } from './load-calculators.ts'
import type { Pinia } from 'pinia'
import type { App } from 'vue'
import type { InstrumentProps } from './instrument-props.ts'

/**
 * The island “calculator”: loads the one calculator it shows, then makes the app, alike on the server and in
 * the browser.
 */
async function createIslandApp(props: InstrumentProps, pinia: Pinia): Promise<App> {
  return createInstrumentApp(await loadCalculator(props.slug), props, pinia)
}
