// @vitest-environment jsdom
import { createPinia } from 'pinia'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { createSSRApp, h, Suspense } from 'vue'
import { renderToString } from 'vue/server-renderer'
import Island from './Island.vue'
import { startIslands } from './client.ts'
import { loadIsland } from './registry.ts'
import { typedBefore } from './typed-before.ts'

const props = (instanceId: string) => ({ slug: 'fluid-temperature', instanceId })

async function pageWithTwo(): Promise<string> {
  const islands = () => [h(Island, { name: 'calculator', props: props('one') }), h(Island, { name: 'calculator', props: props('two') })]
  return renderToString(createSSRApp({ render: () => h(Suspense, null, { default: () => h('div', islands()) }) }))
}

afterEach(() => {
  vi.unstubAllGlobals()
  document.body.innerHTML = ''
})

/** jsdom has no IntersectionObserver; this one never sees anything, so that only touching wakes an island. */
class Blind {
  observe() {}
  disconnect() {}
}

// The first island of a run brings every module of the instrument with it.
const FIRST_LOAD = 30_000

describe('an island', { timeout: FIRST_LOAD }, () => {
  it('is served as whole HTML that names itself and carries its props', async () => {
    document.body.innerHTML = await pageWithTwo()
    const [first, second] = document.querySelectorAll<HTMLElement>('.island')
    expect(first?.dataset).toMatchObject({ island: 'calculator', prefix: 'i1' })
    expect(second?.dataset.prefix).toBe('i2')
    expect(JSON.parse(first!.dataset.props!)).toEqual(props('one'))
    expect(first?.querySelector('form')).not.toBeNull()
    expect(document.body.innerHTML).not.toMatch(/\sstyle=/)
  })

  it('rejects a name that no file declares', async () => {
    await expect(loadIsland('no-such-thing')).rejects.toThrow('no-such-thing')
  })

  it('comes alive when touched, keeps what was typed before, and Vue finds nothing amiss', async () => {
    vi.stubGlobal('IntersectionObserver', Blind)
    const complaints = vi.spyOn(console, 'warn').mockImplementation(() => {})
    document.body.innerHTML = await pageWithTwo()
    const island = document.querySelector<HTMLElement>('.island')!
    const field = island.querySelector<HTMLInputElement>('input[type=text]')!
    field.value = '61'
    startIslands()
    expect(island.dataset.alive).toBeUndefined()
    field.dispatchEvent(new Event('focusin', { bubbles: true }))
    await vi.waitFor(() => expect(island.dataset.alive).toBe(''), FIRST_LOAD)
    expect(island.querySelector<HTMLInputElement>('input[type=text]')!.value).toBe('61')
    expect(complaints).not.toHaveBeenCalled()
    expect(document.querySelectorAll<HTMLElement>('.island')[1]!.dataset.alive).toBeUndefined()
    complaints.mockRestore()
  })
})

describe('typedBefore', () => {
  it('types again only what was changed', () => {
    document.body.innerHTML = '<p><input name="a" value="1"><input name="b" value="2"></p>'
    const [a, b] = document.querySelectorAll('input')
    a!.value = '9'
    const again = typedBefore(document.body)
    const heard: string[] = []
    document.body.addEventListener('input', (event) => heard.push((event.target as HTMLInputElement).name))
    a!.value = '1'
    again()
    expect([a!.value, b!.value, heard]).toEqual(['9', '2', ['a']])
  })
})

it('leaves Pinia to the page: two islands of a page share one', { timeout: FIRST_LOAD }, async () => {
  const { createIslandApp } = await loadIsland('calculator')
  const pinia = createPinia()
  const apps = await Promise.all([createIslandApp(props('one'), pinia), createIslandApp(props('two'), pinia)])
  expect(apps.every((app) => app.config.globalProperties.$pinia === pinia)).toBe(true)
})
