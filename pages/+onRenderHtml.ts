export { onRenderHtml }

import type { OnRenderHtmlAsync } from 'vike/types'
import { onRenderHtml as renderWithVue } from 'vike-vue/__internal/integration/onRenderHtml'
import { choosePreloads } from '#renderer/fonts/choose-preloads.ts'

// https://vike.dev/injectFilter: a page preloads only the fonts that it shows at once.
const onRenderHtml: OnRenderHtmlAsync = async (pageContext) => ({
  ...(await renderWithVue(pageContext)),
  injectFilter: choosePreloads,
})
