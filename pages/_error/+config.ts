import type { Config } from 'vike/types'
import Layout from '#renderer/layouts/ReadingLayout.vue'

export default {
  Layout,
  meta: {
    Page: { env: { server: true, client: false } },
    Layout: { env: { server: true, client: false } },
  },
} satisfies Config
