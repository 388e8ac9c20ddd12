import { fileURLToPath } from 'node:url'
import tailwindcss from '@tailwindcss/vite'
import vue from '@vitejs/plugin-vue'
import vike from 'vike/plugin'
import { defineConfig, type Plugin } from 'vite'
import { islandsPlugin } from './renderer/islands/islands-plugin.ts'

/** What both builds, of the pages and of the islands, do with components and stores. */
const vuePlugins = (): Plugin[] => [
  // Every component of ours uses the composition API; without the other one Vue is 1.5 kB smaller in the browser.
  vue({ features: { optionsAPI: false } }),
  // How devtools save a store to a file: nothing else calls it, but it looks too busy for a bundler to drop.
  {
    name: 'pinia-without-saving',
    transform: {
      filter: { id: /\/pinia\.mjs$/ },
      handler: (code) => ({ code: code.replace('const saveAs = !IS_CLIENT', 'const saveAs = true'), map: null }),
    },
  },
]

export default defineConfig({
  publicDir: 'renderer/public',
  plugins: [vuePlugins(), vike(), tailwindcss(), islandsPlugin({ plugins: vuePlugins })],
  resolve: {
    alias: { 'vike-vue/__internal/integration/onRenderClient': fileURLToPath(new URL('renderer/islands/hydrate-page.ts', import.meta.url)) },
  },
  environments: {
    client: {
      build: {
        rolldownOptions: {
          output: {
            // What every page that is worked in needs, in one file: it would come as six, and change with each page.
            codeSplitting: { groups: [{ name: 'framework', test: /\/node_modules\/(@vue|vue|pinia|vike|vike-vue|@brillout)\// }] },
          },
        },
      },
    },
  },
  build: {
    // Small fonts and pictures stay files of their own: the policy allows no data: addresses.
    assetsInlineLimit: 0,
    sourcemap: false,
  },
})
