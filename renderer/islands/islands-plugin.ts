export { islandsPlugin }

import { resolve } from 'node:path'
import { build, type Plugin, type PluginOption, type Rolldown } from 'vite'

/** Asked for by its address (`?url`), because the page itself decides whether it needs the script. */
const SCRIPT = 'renderer/islands/start.ts'

/** What every page with an island fetches at once; all else waits until the reader is near one. */
const STARTING = /\/renderer\/islands\/(start|client)\.ts$/

/** A calculator's own files: who uses one need not carry the others. */
const ONE_CALCULATOR = /\/shared\/calculators\/(?!common\/)[^/]+\//

/** Asked for by `import()` where it is needed: drawings by the calculators that draw, the rest when the reader does something. */
const LATER = /\/renderer\/(calculators\/(DrawingFigure|DrawingHandles|place-drawing|keep-apart|move-handle|working-text)|cars\/(hand-over|account-cars))\b/

/**
 * Builds the islands apart from the pages. In one build with the pages that are worked in, they would share those pages' Vue,
 * with the directives and helpers of every form: 5 kB more for each reader of a calculator, who never sees a form.
 * In development the script is served as it is and needs none of this.
 */
function islandsPlugin(options: { plugins: () => PluginOption[] }): Plugin {
  let script = ''
  let files: Promise<Files> | undefined
  return {
    name: 'islands',
    apply: 'build',
    enforce: 'pre',
    configResolved({ root }) {
      script = resolve(root, SCRIPT)
    },
    async load(id) {
      if (id !== `${script}?url`) return null
      files ??= buildIslands(script, options.plugins())
      return `export default ${JSON.stringify(`/${(await files).find(isEntry)!.fileName}`)}`
    },
    async generateBundle() {
      if (this.environment.name !== 'client') return
      files ??= buildIslands(script, options.plugins())
      for (const file of await files) {
        this.emitFile({ type: 'asset', fileName: file.fileName, source: file.type === 'chunk' ? file.code : file.source })
      }
    },
  }
}

type Files = Rolldown.RolldownOutput['output']

function isEntry(file: Files[number]): boolean {
  return file.type === 'chunk' && file.isEntry
}

async function buildIslands(script: string, plugins: PluginOption[]): Promise<Files> {
  const [built] = (await build({
    configFile: false,
    logLevel: 'warn',
    plugins,
    define: { 'process.env.NODE_ENV': '"production"' },
    build: {
      write: false,
      copyPublicDir: false,
      // As a library, so that no list of what to fetch beforehand is built in: there are two steps, the code and the calculator.
      lib: { entry: script, formats: ['es'] },
      rolldownOptions: {
        output: {
          minify: true,
          comments: false,
          entryFileNames: 'assets/islands/[name].[hash].js',
          chunkFileNames: 'assets/islands/[name].[hash].js',
          codeSplitting: { groups: [{ name: 'instrument', test: (id) => !STARTING.test(id) && !ONE_CALCULATOR.test(id) && !LATER.test(id) }] },
        },
      },
    },
  })) as Rolldown.RolldownOutput[]
  return built!.output
}
