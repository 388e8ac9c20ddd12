export { renderIsland }

import { createPinia, type Pinia } from 'pinia'
import type { App } from 'vue'
import { renderToString } from 'vue/server-renderer'
import { loadIsland, type IslandProps } from './registry.ts'

interface PageIslands {
  pinia: Pinia
  count: number
}

// The page's own app lives as long as one request, so what its islands share can hang on it.
const pages = new WeakMap<App, PageIslands>()

/**
 * Renders an island as an app of its own, with a prefix for the ids it makes: two islands inside one app would count their
 * ids through, while in the browser each begins anew, and Vue would report a mismatch. All islands of a page share one Pinia.
 */
async function renderIsland(page: App, name: string, props: IslandProps): Promise<{ html: string; prefix: string }> {
  const shared = pages.get(page) ?? { pinia: createPinia(), count: 0 }
  pages.set(page, shared)
  const prefix = `i${++shared.count}`
  const { createIslandApp } = await loadIsland(name)
  const app = await createIslandApp(props, shared.pinia)
  app.config.idPrefix = prefix
  return { html: await renderToString(app), prefix }
}
