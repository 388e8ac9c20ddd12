import vikeVue from 'vike-vue/config'
import type { Config } from 'vike/types'

// https://vike.dev/config
export default {
  extends: [vikeVue],
  // Every link is a plain page load: a reading page carries no router.
  clientRouting: false,
  lang: 'en-GB',
  viewport: 'responsive',
  title: 'Camber & Clay',
  favicon: '/favicon.svg',
  passToClient: ['reader', 'form', 'club', 'requestId', 'sheet', 'query', 'urlPathname'],
} satisfies Config
