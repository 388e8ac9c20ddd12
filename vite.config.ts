import tailwindcss from '@tailwindcss/vite'
import vue from '@vitejs/plugin-vue'
import vike from 'vike/plugin'
import { defineConfig } from 'vite'

export default defineConfig({
  publicDir: 'renderer/public',
  plugins: [
    // Every component of ours uses the composition API; without the other one Vue is 1.5 kB smaller in the browser.
    vue({ features: { optionsAPI: false } }),
    vike(),
    tailwindcss(),
  ],
  build: {
    // Small fonts and pictures stay files of their own: the policy allows no data: addresses.
    assetsInlineLimit: 0,
    sourcemap: false,
  },
})
