import type { Config } from 'vike/types'
import Layout from '#renderer/layouts/ReadingLayout.vue'

// Read, not worked in: page and layout run on the server only; what is alive on them, islands, +Head.vue starts.
export default {
  Layout,
  meta: {
    Page: { env: { server: true, client: false } },
    Layout: { env: { server: true, client: false } },
  },
} satisfies Config
