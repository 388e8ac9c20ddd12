export { loadIsland }
export type { IslandModule, IslandProps }

import type { Pinia } from 'pinia'
import type { App } from 'vue'

/** What crosses from the page to the browser: plain JSON, no dates, no undefined. */
type IslandProps = object

/** A part of a read page that comes alive in the browser. */
interface IslandModule {
  /** Makes the app, on the server to render it and in the browser to hydrate it; loads what it needs first. */
  createIslandApp(props: IslandProps, pinia: Pinia): Promise<App>
}

// An island is a file `<name>.island.ts` beside its component; there is no list to keep.
const files = import.meta.glob<IslandModule>('../*/*.island.ts')

/** Loads the code of an island. Rejects when no file declares it. */
async function loadIsland(name: string): Promise<IslandModule> {
  const path = Object.keys(files).find((file) => file.endsWith(`/${name}.island.ts`))
  const load = path === undefined ? undefined : files[path]
  if (load === undefined) throw new Error(`There is no island “${name}”: no renderer/*/${name}.island.ts declares it.`)
  return load()
}
