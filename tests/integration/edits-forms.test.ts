import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { EditView } from '#server/edits/index.ts'
import { guideToFields } from '#shared/editing/form-fields.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { ifMatch, saveEdit, sentEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let priya: Agent
let odile: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
  odile = await app.signedIn('odile')
})
afterAll(() => app.stop())

const idIn = (location: string) => /^\/write\/([0-9a-f-]{36})/.exec(location)![1]!
const edit = async (id: string) => (await priya.get(`/api/edits/${id}`).expect(200)).body as EditView
const post = (agent: Agent, path: string, fields: Record<string, string>) => agent.post(path).type('form').send(fields)

describe('writing by plain forms', () => {
  it('begins, adds and takes out rows, saves, previews and sends without a script', async () => {
    const begun = await post(priya, '/write', { chapter: 'A' }).expect(303)
    const id = idIn(begun.headers['location']!)
    const fields = { ...guideToFields({ ...WHOLE_GUIDE, body: 'One.\r\n\r\nTwo.\r\n' }), summary: 'A new guide' }

    const added = await post(priya, `/write/${id}`, { ...fields, version: '1', do: 'add-effect' }).expect(303)
    expect(added.headers['location']).toBe(`/write/${id}#effects`)
    expect((await edit(id)).content).toMatchObject({ body: 'One.\n\nTwo.\n', effects: [WHOLE_GUIDE.effects[0], { adjustable: '', direction: '', strength: '' }] })

    await post(priya, `/write/${id}`, { ...guideToFields((await edit(id)).content), version: '2', do: 'remove-effect:1' }).expect(303)
    expect((await edit(id)).content.effects).toEqual(WHOLE_GUIDE.effects)
    await post(priya, `/write/${id}`, { ...fields, version: '3', do: 'add-source' }).expect(303)
    expect((await edit(id)).content.sources).toHaveLength(2)

    const shown = await post(priya, `/write/${id}`, { ...guideToFields((await edit(id)).content), summary: 'A new guide', version: '4', do: 'preview' }).expect(303)
    expect(shown.headers['location']).toBe(`/write/${id}?show=preview#preview`)
    expect((await edit(id)).content.sources).toHaveLength(1)

    const sent = await post(priya, `/write/${id}`, { ...fields, version: '5', do: 'send' }).expect(303)
    expect(sent.headers['location']).toBe(`/write/${id}?said=sent`)
    expect(await edit(id)).toMatchObject({ state: 'in_review', summary: 'A new guide' })
  })

  it('finds the open edit instead of a second one', async () => {
    const first = await post(priya, '/write', { guideSlug: 'sway-bars' }).expect(303)
    const again = await post(priya, '/write', { guideSlug: 'sway-bars', restoreEdition: '1' }).expect(303)
    expect(again.headers['location']).toBe(`${first.headers['location']}?said=found`)
  })

  it('shows the page again with what was typed when something is wrong, and saves what could be saved', async () => {
    const id = idIn((await post(priya, '/write', { chapter: 'D' }).expect(303)).headers['location']!)
    const typed = { title: 'A title typed with care', inShort: 'Too short', body: 'Some text.', summary: 'A new guide', version: '1', do: 'send' }
    const answer = await post(priya, `/write/${id}`, typed).expect(422)
    expect(answer.text).toContain('A title typed with care')
    expect(answer.text).toContain('In short: write at least 20 characters.')
    expect(await edit(id)).toMatchObject({ state: 'draft', version: 2, content: { title: 'A title typed with care' } })
  })

  it('does not overwrite what was saved elsewhere, and keeps what was typed', async () => {
    const id = idIn((await post(priya, '/write', { chapter: 'D' }).expect(303)).headers['location']!)
    await saveEdit(priya, await edit(id), { title: 'Saved on the phone' })
    const answer = await post(priya, `/write/${id}`, { title: 'Typed on the desk', version: '1', do: 'save' }).expect(412)
    expect(answer.text).toContain('Typed on the desk')
    expect((await edit(id)).content.title).toBe('Saved on the phone')
    await post(priya, `/write/${id}`, { title: 'Typed on the desk', version: '2', do: 'save' }).expect(303)
  })

  it('withdraws', async () => {
    const id = idIn((await post(priya, '/write', { guideSlug: 'rear-toe' }).expect(303)).headers['location']!)
    const answer = await post(priya, `/write/${id}/withdraw`, { version: '1' }).expect(303)
    expect(answer.headers['location']).toBe('/write?said=withdrawn')
    expect((await edit(id)).state).toBe('withdrawn')
  })

  it('refuses a form that another site posts', async () => {
    await priya.post('/write').set('Sec-Fetch-Site', 'cross-site').type('form').send({ chapter: 'A' }).expect(403)
    await priya.post('/write').set('Origin', 'https://elsewhere.example').type('form').send({ chapter: 'A' }).expect(403)
  })

  it.each(['/write/x', '/write/00000000-0000-0000-0000-000000000000', '/review/x/approve', '/write/x/withdraw'])('%s: 404', async (path) => {
    await post(priya, path, { version: '1' }).expect(404)
  })
})

describe('deciding by plain forms', () => {
  it('notes, asks, declines and approves', async () => {
    const first = await sentEdit(priya, { guideSlug: 'droop' }, { title: 'Droop, in short' })
    expect((await post(odile, `/review/${first.id}/note`, { text: 'Looks right' }).expect(303)).headers['location']).toBe(`/review/${first.id}?said=noted#notes`)
    expect((await post(odile, `/review/${first.id}/ask`, { version: String(first.version), reason: 'One more word' }).expect(303)).headers['location']).toBe('/review?said=asked')
    const again = (await priya.post(`/api/edits/${first.id}/send`).set(...ifMatch(await edit(first.id))).send({}).expect(200)).body
    const approved = await post(odile, `/review/${first.id}/approve`, { version: String(again.version) }).expect(303)
    expect(approved.headers['location']).toBe('/guides/droop?said=published')
    const second = await sentEdit(priya, { guideSlug: 'droop' }, { title: 'Droop' })
    expect((await post(odile, `/review/${second.id}/decline`, { version: String(second.version), reason: 'As it was' }).expect(303)).headers['location']).toBe('/review?said=declined')
  })

  it('shows the review page again when the reason is missing', async () => {
    const sent = await sentEdit(priya, { guideSlug: 'anti-squat' }, { title: 'Anti-squat, measured' })
    const answer = await post(odile, `/review/${sent.id}/decline`, { version: String(sent.version), reason: '' }).expect(422)
    expect(answer.text).toContain('What should change, or why not? Write at least 3 characters.')
    expect(await edit(sent.id)).toMatchObject({ state: 'in_review' })
  })
})
