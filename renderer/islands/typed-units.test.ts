// @vitest-environment jsdom
import { expect, it, vi } from 'vitest'
import { createSSRApp, h, Suspense } from 'vue'
import { renderToString } from 'vue/server-renderer'
import Island from './Island.vue'
import { mountIsland } from './mount-island.ts'

it('reads what was typed before in the unit that stood beside it then, not in the one this reader chose', { timeout: 30_000 }, async () => {
  localStorage.setItem('camber-clay.units', JSON.stringify({ temperature: '°F' }))
  const island = () => h(Island, { name: 'calculator', props: { slug: 'fluid-temperature', instanceId: 'heat' } })
  document.body.innerHTML = await renderToString(createSSRApp({ render: () => h(Suspense, null, { default: island }) }))
  const field = () => document.querySelector<HTMLInputElement>('input[name="heat.temperature"]')!
  field().value = '50'
  await mountIsland(document.querySelector<HTMLElement>('.island')!)
  await vi.waitFor(() => expect(field().value).toBe('122'))
})
