export { mountIsland }

import { createPinia, type Pinia } from 'pinia'
import { loadIsland, type IslandProps } from './registry.ts'
import { typeAgainKey, typedBefore } from './typed-before.ts'

let pinia: Pinia | undefined

/** Brings one island to life in place. What the reader typed into it meanwhile is kept. */
async function mountIsland(element: HTMLElement): Promise<void> {
  const { island = '', props = '{}', prefix = '' } = element.dataset
  const { createIslandApp } = await loadIsland(island)
  pinia ??= createPinia()
  const app = await createIslandApp(JSON.parse(props) as IslandProps, pinia)
  app.config.idPrefix = prefix
  const typeAgain = typedBefore(element)
  app.provide(typeAgainKey, typeAgain)
  app.mount(element)
  typeAgain()
}
