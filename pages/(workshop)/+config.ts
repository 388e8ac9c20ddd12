import type { Config } from 'vike/types'
import Layout from '#renderer/layouts/WorkshopLayout.vue'

// Worked in: these pages are hydrated whole.
export default {
  Layout,
} satisfies Config
