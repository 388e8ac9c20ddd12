export { renderIsland }

import { createPinia, type Pinia } from 'pinia'
import { renderToString, type SSRContext } from 'vue/server-renderer'
import { createBoundedMemo } from './bounded-memo.ts'
import { loadIsland, type IslandProps } from './registry.ts'

interface PageIslands {
  pinia: Pinia
  count: number
}

// An instrument takes as long to render as the rest of a guide. What it renders depends on its name, props and prefix alone: the
// stores that islands share are empty on the server. Four million characters are about two hundred instruments.
const rendered = createBoundedMemo(4_000_000)

/**
 * Renders an island as an app of its own, with a prefix for the ids it makes: two islands inside one app would count their
 * ids through, while in the browser each begins anew, and Vue would report a mismatch. All islands of a page share one Pinia,
 * kept with what else belongs to this one rendering; +Head.vue sees there that the page needs the islands' script.
 */
async function renderIsland(page: SSRContext, name: string, props: IslandProps): Promise<{ html: string; prefix: string }> {
  const shared = (page.islands ??= { pinia: createPinia(), count: 0 }) as PageIslands
  const prefix = `i${++shared.count}`
  const make = async (): Promise<string> => {
    const { createIslandApp } = await loadIsland(name)
    const app = await createIslandApp(props, shared.pinia)
    app.config.idPrefix = prefix
    return renderToString(app)
  }
  // While it is worked on, a component may render differently from one request to the next.
  const html = import.meta.env.PROD ? await rendered.get(JSON.stringify([name, prefix, props]), make) : await make()
  return { html, prefix }
}
