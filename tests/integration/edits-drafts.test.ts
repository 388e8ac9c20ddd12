import { JSDOM } from 'jsdom'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import type { EditView } from '#server/edits/index.ts'
import { guideToFields } from '#shared/editing/form-fields.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let priya: Agent
let odile: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
  odile = await app.signedIn('odile')
})
afterAll(() => app.stop())
beforeEach(() => rows(app, 'delete from rate_limits'))

const read = async (id: string) => (await priya.get(`/api/edits/${id}`).expect(200)).body as EditView
const fieldsOf = (answer: { body: { errors: { field: string }[] } }) => answer.body.errors.map(({ field }) => field)
const document = (html: string) => new JSDOM(html).window.document

/** An effect of which nothing is chosen yet. */
const OPEN_EFFECT: GuideDraft['effects'][number] = {
  adjustable: '', direction: '', phase: '', quality: '', change: '', strength: '', basis: '', note: '',
  surfaces: [], bites: [], carClasses: [], mirrors: false,
}

describe('a draft keeps what was typed, as it was typed', () => {
  const typed: GuideDraft = {
    ...WHOLE_GUIDE,
    title: 'A title that goes on '.repeat(20).trim(),
    inShort: 'Short,\nand on two lines',
    bench: { ...WHOLE_GUIDE.bench, takes: 'x'.repeat(400) },
    effects: [{ ...OPEN_EFFECT, adjustable: 'rear_droop', note: 'n'.repeat(500) }],
    sources: [{ kind: 'book', text: '', url: 'not an address' }],
  }

  it('over the limits and unfinished, also the one line; it stands in the list, and only sending is refused', async () => {
    const saved = await saveEdit(priya, await beginEdit(priya, { chapter: 'A' }), typed, 's'.repeat(300))
    expect(await read(saved.id)).toMatchObject({ content: typed, summary: 's'.repeat(300), title: typed.title })
    expect((await priya.get('/write').expect(200)).text).toContain(typed.title)

    const refused = await priya.post(`/api/edits/${saved.id}/send`).set(...ifMatch(saved)).send({}).expect(422)
    const fields = fieldsOf(refused)
    expect(fields).toEqual([...new Set(fields)])
    expect(fields).toEqual(expect.arrayContaining([
      'content.title', 'content.inShort', 'content.bench.takes', 'content.effects.0.direction', 'content.effects.0.note', 'content.sources.0.text', 'content.sources.0.url', 'summary',
    ]))
    expect(await read(saved.id)).toMatchObject({ state: 'draft', version: saved.version, content: typed })
  })

  it('shows what is wrong at each field, saved or sent, without a script', async () => {
    const { id, version } = await beginEdit(priya, { chapter: 'A' })
    const posted = { ...guideToFields(typed), summary: 'A new guide', version: String(version) }
    await priya.post(`/write/${id}`).type('form').send({ ...posted, do: 'save' }).expect(303)
    const page = document((await priya.get(`/write/${id}`).expect(200)).text)
    expect(page.getElementById('title')!.getAttribute('value')).toBe(typed.title)
    expect(page.getElementById('title-error')!.textContent).toContain('Title: keep it under 91 characters.')
    expect(page.getElementById('inShort-error')!.textContent).toContain('In short: keep it on one line.')
    expect(page.getElementById('errors')).toBeNull()
    expect(page.querySelector('.saved')!.textContent).toContain('Saved')

    const refused = document((await priya.post(`/write/${id}`).type('form').send({ ...posted, version: '2', do: 'send' }).expect(422)).text)
    const list = [...refused.querySelectorAll('#errors li')].map((line) => line.textContent!.trim())
    expect(list).toEqual([...new Set(list)])
    expect(refused.getElementById('errors-title')!.textContent).toContain(`${list.length} things to put right`)
    expect(refused.querySelector('.bf-n')!.textContent).toBe(`${list.length} to mend`)
    expect(refused.getElementById('effects.0.direction-error')!.textContent).toContain('Which way: choose one from the list.')
  })

  it('up to a size, and says so without calling it saved', async () => {
    const { id } = await beginEdit(priya, { chapter: 'A' })
    const fields = { ...guideToFields({ ...WHOLE_GUIDE, title: 't'.repeat(4_001) }), summary: '', version: '1', do: 'save' }
    const refused = document((await priya.post(`/write/${id}`).type('form').send(fields).expect(422)).text)
    expect(refused.getElementById('title-error')!.textContent).toContain('a draft keeps 4,000 characters here')
    expect(refused.querySelector('.saved')!.textContent).toContain('Not saved')
    expect((await read(id)).title).toBe('')
  })

  it('an address that is none never becomes a link in the preview', async () => {
    const source = { kind: 'book' as const, text: 'A book', url: 'javascript:alert(1)' }
    const saved = await saveEdit(priya, await beginEdit(priya, { chapter: 'A' }), { ...WHOLE_GUIDE, sources: [source] })
    const page = document((await priya.get(`/write/${saved.id}`).expect(200)).text)
    expect(page.querySelector('.prev-sources')!.textContent).toContain('A book')
    expect([...page.querySelectorAll('a')].filter((link) => link.href.startsWith('javascript:'))).toEqual([])
  })

  it('an emptied line of an edit that was sent before leaves the last one, and is asked for when it is sent', async () => {
    const saved = await saveEdit(priya, await beginEdit(priya, { chapter: 'A' }), WHOLE_GUIDE, 'The first line')
    const sent = (await priya.post(`/api/edits/${saved.id}/send`).set(...ifMatch(saved)).send({}).expect(200)).body
    const asked = (await odile.post(`/api/edits/${sent.id}/ask`).set(...ifMatch(sent)).send({ reason: 'More words' }).expect(200)).body
    const fields = { ...guideToFields(WHOLE_GUIDE), summary: '', version: String(asked.version) }
    await priya.post(`/write/${sent.id}`).type('form').send({ ...fields, do: 'save' }).expect(303)
    expect(await read(sent.id)).toMatchObject({ summary: 'The first line', state: 'changes_asked' })
    const refused = await priya.post(`/write/${sent.id}`).type('form').send({ ...fields, version: String(asked.version + 1), do: 'send' }).expect(422)
    expect(document(refused.text).getElementById('summary-error')).not.toBeNull()
  })
})

describe('an effect that is not finished', () => {
  it('is added empty by the plain form, comes back as it was left, and is finished there', async () => {
    const { id, version } = await beginEdit(priya, { chapter: 'A' })
    const fields = { ...guideToFields({ ...WHOLE_GUIDE, effects: [] }), summary: 'A new guide' }
    await priya.post(`/write/${id}`).type('form').send({ ...fields, version: String(version), do: 'add-effect' }).expect(303)
    expect((await read(id)).content.effects).toEqual([OPEN_EFFECT])
    const page = document((await priya.get(`/write/${id}`).expect(200)).text)
    for (const key of ['adjustable', 'direction', 'phase', 'strength', 'quality', 'change', 'basis']) {
      expect((page.getElementById(`effects.0.${key}`) as HTMLSelectElement).value).toBe('')
    }
    expect(page.querySelector('.prev-page .g-lap')).toBeNull()

    const refused = await priya.post(`/write/${id}`).type('form').send({ ...fields, ...guideToFields((await read(id)).content), version: '2', do: 'send' }).expect(422)
    expect(document(refused.text).getElementById('effects.0.adjustable-error')!.textContent).toContain('What you change: choose one from the list.')
    expect((await read(id)).content.effects).toEqual([OPEN_EFFECT])
    await priya.post(`/write/${id}`).type('form').send({ ...guideToFields(WHOLE_GUIDE), summary: 'A new guide', version: '3', do: 'send' }).expect(303)
    expect((await read(id)).state).toBe('in_review')
  })

  it('never reaches an edition', async () => {
    const saved = await saveEdit(priya, await beginEdit(priya, { chapter: 'A' }), WHOLE_GUIDE, 'A new guide')
    const sent = (await priya.post(`/api/edits/${saved.id}/send`).set(...ifMatch(saved)).send({}).expect(200)).body
    await rows(app, `update edits set content = jsonb_set(content, '{effects,0,direction}', '""'), version = version + 1 where id = $1`, [sent.id])
    const refused = await odile.post(`/api/edits/${sent.id}/approve`).set('If-Match', `"${sent.version + 1}"`).send({}).expect(422)
    expect(fieldsOf(refused)).toEqual(['content.effects.0.direction'])
  })
})
