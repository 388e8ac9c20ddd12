import { JSDOM } from 'jsdom'
import { createSSRApp } from 'vue'
import { renderToString } from 'vue/server-renderer'
import { describe, expect, it } from 'vitest'
import { buildLapRows, type LapEffect } from '#shared/effects/lap-rows.ts'
import EffectsTable from './EffectsTable.vue'

const fluid = { key: 'front_diff_fluid', name: 'Front diff fluid', unit: 'cSt', up: 'thicker', down: 'thinner', smallStep: 2000 }
const base: LapEffect = {
  adjustable: 'front_diff_fluid', direction: 'up', phase: 'entry', quality: 'steering', change: 'less', strength: 2,
  surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '',
}

async function render(effects: LapEffect[]): Promise<{ html: string; document: Document }> {
  const html = await renderToString(createSSRApp(EffectsTable, { rows: buildLapRows(effects, [fluid]), caption: 'What it does' }))
  return { html, document: new JSDOM(html).window.document }
}

describe('EffectsTable', () => {
  it('is a table whose heads name each part of the lap and each change', async () => {
    const { document } = await render([base])
    const heads = [...document.querySelectorAll('thead th[scope=col]')].map((head) => head.textContent?.trim())
    expect(heads).toEqual(['Front diff fluid: if you go', '1Corner entry', '2Mid-corner', '3Corner exit', '4Straight', '5Bumps', '6Jumps'])
    const rows = [...document.querySelectorAll('tbody tr')]
    expect(rows.map((row) => row.querySelector('th[scope=row] .ch-n')?.textContent)).toEqual(['Thicker', 'Thinner'])
    for (const row of rows) expect(row.querySelectorAll('td[role=cell]')).toHaveLength(6)
    expect(document.querySelector('caption')?.textContent).toBe('What it does')
  })

  it('names the part that a way belongs to, also in a table about one part', async () => {
    const { document } = await render([base])
    const names = [...document.querySelectorAll('tbody th[scope=row]')].map((head) => head.textContent!.replace(/\s+/g, ' ').trim())
    expect(names[0]).toMatch(/^Front diff fluid: Thicker/)
    expect(names[1]).toMatch(/^Front diff fluid: Thinner/)
    expect(document.querySelector('.pick legend')?.textContent).toBe('Choose a change: Front diff fluid')
    const two = await render([base, { ...base, adjustable: 'rear_toe' }])
    expect([...two.document.querySelectorAll('thead th')][0]!.textContent).toBe('If you go')
    expect(two.document.querySelector('tbody th .vh')).toBeNull()
  })

  it('says every effect in words, hides the drawings from screen readers and names empty cells', async () => {
    const { document } = await render([base])
    const cells = document.querySelectorAll('tbody tr:first-child td')
    expect(cells[0]?.textContent).toContain('Clearly less steering')
    expect(cells[1]?.textContent).toContain('No clear change')
    for (const drawing of document.querySelectorAll('svg')) expect(drawing.getAttribute('aria-hidden')).toBe('true')
  })

  it('has one radio for each row, in the same order, the first one picked', async () => {
    const { document } = await render([base])
    const radios = [...document.querySelectorAll<HTMLInputElement>('.pick input')]
    expect(radios.map((radio) => radio.value)).toEqual(['front_diff_fluid-up', 'front_diff_fluid-down'])
    expect(radios.map((radio) => radio.checked)).toEqual([true, false])
  })

  it('carries no style attribute, which the content security policy would refuse', async () => {
    const { html } = await render([base, { ...base, surfaces: ['loose'], strength: 3 }])
    expect(html).not.toMatch(/\sstyle=/)
  })

  it('says that nothing is written down instead of showing an empty table', async () => {
    const { document } = await render([])
    expect(document.querySelector('table')).toBeNull()
    expect(document.body.textContent).toContain('No effects written down yet')
  })
})
