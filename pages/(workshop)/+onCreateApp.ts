export { onCreateApp }

import { createPinia } from 'pinia'
import type { PageContext } from 'vike/types'

/** Calculators in a preview share the reader's choice of units. */
function onCreateApp(pageContext: PageContext): void {
  pageContext.app?.use(createPinia())
}
