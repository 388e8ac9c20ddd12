export { onRenderClient }

import { createSSRApp, h, shallowReactive, type Component } from 'vue'
import { setData } from 'vike-vue/useData'
import { setPageContext } from 'vike-vue/usePageContext'
import type { PageContextClient } from 'vike/types'

/**
 * Brings a page that is worked in to life where the server printed it. Takes the place of vike-vue's own hook (vite.config.ts),
 * which can also exchange a page for the next one: for that it brings Vike's router, its warning that nobody routes, and Vue's
 * KeepAlive, 11 kB that pages with plain links never use. https://vike.dev/onRenderClient
 */
async function onRenderClient(pageContext: PageContextClient): Promise<void> {
  const { Page, config, data = {} } = pageContext
  // The same nesting as on the server, or Vue would find another page than the one it is given.
  const inLayouts = (config.Layout ?? []).reduce<() => ReturnType<typeof h>>(
    (inner, layout) => () => h(layout as Component, null, inner),
    () => h(Page as Component),
  )
  const app = createSSRApp(inLayouts)
  pageContext.app = app
  for (const createApp of config.onCreateApp ?? []) await createApp(pageContext)
  setPageContext(app, pageContext)
  setData(app, shallowReactive(data as object))
  app.mount('#app')
}
