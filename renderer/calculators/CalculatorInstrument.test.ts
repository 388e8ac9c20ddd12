// @vitest-environment jsdom

import { createPinia, type Pinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { nextTick } from 'vue'
import { renderToString } from 'vue/server-renderer'
import { marks } from '#renderer/icons/marks.ts'
import { createIslandApp } from './calculator.island.ts'
import { createInstrumentApp } from './create-instrument-app.ts'
import { instrumentMarks } from './InstrumentMark.ts'
import { loadCalculator } from './load-calculators.ts'
import { useReaderChoices } from './reader-choices.ts'
import type { InstrumentProps } from './instrument-props.ts'

const heat: InstrumentProps = {
  slug: 'fluid-temperature',
  instanceId: 'heat',
  action: '/guides/front-diff-fluid',
  preset: { viscosityAt25: 7000, temperature: 55 },
}

/** The rendered page with one instrument, before any script. */
async function serve(props: InstrumentProps = heat): Promise<HTMLElement> {
  document.body.innerHTML = `<div id="island">${await renderToString(await createIslandApp(props, createPinia()))}</div>`
  return document.querySelector('#island') as HTMLElement
}
async function bringToLife(
  element: Element,
  props: InstrumentProps = heat,
  pinia: Pinia = createPinia(),
): Promise<Pinia> {
  const app = await createIslandApp(props, pinia)
  app.mount(element)
  return pinia
}
const text = (selector: string) =>
  document.querySelector(selector)?.textContent?.replaceAll('\u00A0', ' ').trim()
const field = (key: string) => document.querySelector(`[name="heat.${key}"]`) as HTMLInputElement
async function typeInto(key: string, value: string) {
  field(key).value = value
  field(key).dispatchEvent(new Event('input', { bubbles: true }))
  await nextTick()
}

let warned: ReturnType<typeof vi.spyOn>
let failed: ReturnType<typeof vi.spyOn>
beforeEach(() => {
  localStorage.clear()
  warned = vi.spyOn(console, 'warn')
  failed = vi.spyOn(console, 'error')
})
afterEach(() => {
  expect(warned).not.toHaveBeenCalled()
  expect(failed).not.toHaveBeenCalled()
  vi.restoreAllMocks()
})

describe('an instrument without a script', () => {
  it('answers with the guide’s values', async () => {
    await serve()
    expect(text('.says')).toBe('Your 7,000 cSt fluid acts like about 4,080 cSt at 55 °C.')
    expect(text('.says b')).toBe('4,080 cSt')
    expect(field('viscosityAt25').value).toBe('7,000')
    expect(field('referenceTemperature').value).toBe('25')
    expect(document.querySelector('form')?.getAttribute('action')).toBe('/guides/front-diff-fluid#heat')
    expect(document.querySelectorAll('math').length).toBeGreaterThan(8)
    expect(document.querySelector('svg.plot')?.getAttribute('aria-label')).toContain('falling all the way')
    expect(text('.caution')).toContain('never pour them down a drain')
  })

  it('answers with the numbers of a link', async () => {
    await serve({ ...heat, values: { viscosityAt25: '10000', temperature: '60' } })
    expect(text('.says')).toContain('Your 10,000 cSt fluid')
    expect((document.querySelector('#heat-link') as HTMLInputElement).value).toBe(
      '/guides/front-diff-fluid?heat.viscosityAt25=10000&heat.referenceTemperature=25&heat.temperature=60&heat.end=front#heat',
    )
  })

  it('says at the field what is wrong and keeps what was typed', async () => {
    await serve({ ...heat, values: { viscosityAt25: 'thick <b>', temperature: '155' } })
    expect(field('viscosityAt25').value).toBe('thick <b>')
    expect(field('viscosityAt25').getAttribute('aria-invalid')).toBe('true')
    expect(text('#heat-viscosityAt25-error')).toBe(
      'Type fluid on the bottle as a number, between 0.5 cSt and 10,000,000 cSt.',
    )
    expect(text('#heat-temperature-error')).toContain('Temperature now must be between −25 °C and 100 °C')
    expect(field('temperature').getAttribute('aria-describedby')).toBe(
      'heat-temperature-help heat-temperature-error',
    )
    expect(text('.says')).toContain('No answer.')
    expect(document.querySelectorAll('.plot .dot')).toHaveLength(0)
    expect(document.querySelectorAll('.plot .cv')).toHaveLength(1)
  })

  it('warns where the formula holds less well', async () => {
    await serve({ ...heat, values: { temperature: '80' } })
    expect(text('#heat-temperature-warning')).toContain('outside 0 °C to 60 °C')
  })

  it('steps through the bottles by its plus and minus', async () => {
    await serve({ ...heat, values: { viscosityAt25: '7,000', temperature: '55', step: 'viscosityAt25:up' } })
    expect(field('viscosityAt25').value).toBe('8,000')
    expect(field('temperature').value).toBe('55')
  })

  it('reads numbers in the unit they were typed in and shows the one chosen', async () => {
    await serve({ ...heat, values: { temperature: '55', 'in.temperature': '°C', 'unit.temperature': '°F' } })
    expect(field('temperature').value).toBe('131')
    expect(text('.says')).toContain('at 131 °F')
    await serve({ ...heat, values: { temperature: '131', 'in.temperature': '°F', 'unit.temperature': '°F' } })
    expect(text('.says')).toContain('about 4,080 cSt at 131 °F')
  })

  it('fills in the reader’s car and says so', async () => {
    const definition = await loadCalculator('fluid-temperature')
    const car = { id: 'kestrel', name: 'Kestrel 8e', values: { frontDiffFluid: 10000 } }
    document.body.innerHTML = await renderToString(
      await createInstrumentApp(definition, { ...heat, car }, createPinia()),
    )
    expect(text('.ct-on b')).toBe('Kestrel 8e')
    expect(field('viscosityAt25').value).toBe('10,000')
    expect((document.querySelector('[name="heat.end"]') as HTMLInputElement).value).toBe('front')
  })

  it('has no style attribute, no script and one element for every id it names', async () => {
    const element = await serve({ ...heat, values: { temperature: '155' } })
    expect(element.innerHTML).not.toMatch(/\sstyle=/)
    expect(element.innerHTML).not.toContain('<script')
    const ids = [...element.querySelectorAll('[id]')].map(({ id }) => id)
    expect(new Set(ids).size).toBe(ids.length)
    const named = [...element.querySelectorAll('[aria-describedby],[aria-labelledby],label[for]')].flatMap(
      (node) =>
        ['aria-describedby', 'aria-labelledby', 'for'].flatMap(
          (name) => node.getAttribute(name)?.split(' ') ?? [],
        ),
    )
    expect(named.filter((id) => !ids.includes(id))).toEqual([])
  })
})

it('draws the marks of the identity', () => {
  expect(marks).toMatchObject(instrumentMarks)
})

describe('an instrument come to life', () => {
  it('copies the whole working as text', async () => {
    const copied: string[] = []
    vi.stubGlobal('navigator', { clipboard: { writeText: async (what: string) => void copied.push(what) } })
    await bringToLife(await serve())
    ;(document.querySelector('.work-do button') as HTMLButtonElement).click()
    await vi.waitFor(() => expect(text('.work-do [role=status]')).toBe('The working is copied.'))
    vi.unstubAllGlobals()
    const lines = copied.join().replaceAll('\u00A0', ' ').split('\n')
    expect(lines.slice(0, 2)).toEqual([
      'What your fluid acts like when it is hot',
      'Your 7,000 cSt fluid acts like about 4,080 cSt at 55 °C.',
    ])
    expect(lines).toContain('Temperature now: 55 °C')
    expect(lines).toContain('   = 4,082 cSt')
    expect(lines).toContain('Acts like, now: 4,080 cSt')
    expect(lines.some((line) => line.startsWith('Good between: 0 and 60'))).toBe(true)
    expect(lines.some((line) => line.startsWith('Source: '))).toBe(true)
    expect(lines.at(-2)).toContain('heat.temperature=55')
  })

  it.each<Record<string, string>>([
    {},
    { temperature: '155' },
    { 'unit.temperature': '°F', 'in.temperature': '°F', temperature: '131' },
  ])('hydrates to the HTML it was served as: %j', async (values) => {
    const props = { ...heat, values }
    const element = await serve(props)
    // Comments are Vue's own marks; the link becomes absolute and its button visible once a script runs, in
    // the same space.
    const plain = () =>
      element.innerHTML
        .replace(/<!--.*?-->/g, '')
        .replace(/http:\/\/localhost:\d+/g, '')
        .replace(/ needs-script/g, '')
        .replace(/ selected=""/g, '')
    const before = plain()
    await bringToLife(element, props)
    expect(plain()).toBe(before)
  })

  it('answers while one types', async () => {
    await bringToLife(await serve())
    await typeInto('viscosityAt25', '1e4')
    expect(text('.says')).toContain('Your 10,000 cSt fluid')
    await typeInto('viscosityAt25', '')
    expect(text('.says')).toBe('No answer. Fill in fluid on the bottle, between 0.5 cSt and 10,000,000 cSt.')
    expect(text('.outs dd')).toBe('–')
    await typeInto('viscosityAt25', '5,000')
    expect(document.querySelector('.err')).toBeNull()
  })

  it('steps, goes back to the guide’s values, and carries its numbers in the link', async () => {
    await bringToLife(await serve())
    ;(document.querySelector('[value="viscosityAt25:up"]') as HTMLButtonElement).click()
    await nextTick()
    expect(field('viscosityAt25').value).toBe('8,000')
    expect((document.querySelector('#heat-link') as HTMLInputElement).value).toContain(
      'heat.viscosityAt25=8000',
    )
    ;(document.querySelector('.btns a') as HTMLAnchorElement).click()
    await nextTick()
    expect(field('viscosityAt25').value).toBe('7,000')
  })

  it('shares the chosen units with the other instruments of the page and keeps them in the browser', async () => {
    const element = await serve({ ...heat, values: { temperature: '55.5' } })
    const pinia = await bringToLife(element, { ...heat, values: { temperature: '55.5' } })
    useReaderChoices(pinia).chooseUnit('temperature', '°F')
    await nextTick()
    expect(field('temperature').value).toBe('131.9')
    expect(text('.says')).toContain('°F')
    expect(JSON.parse(localStorage.getItem('camber-clay.units') ?? '')).toEqual({ temperature: '°F' })
    useReaderChoices(pinia).chooseUnit('temperature', '°C')
    await nextTick()
    expect(field('temperature').value).toBe('55.5')
  })

  it('takes up kept units after hydrating, and ignores what is no unit', async () => {
    localStorage.setItem('camber-clay.units', '{"temperature":"°F","length":"parsec"}')
    await bringToLife(await serve())
    await nextTick()
    expect(field('temperature').value).toBe('131')
  })
})
