import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, sentEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let priya: Agent
let odile: Agent
let imre: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
  odile = await app.signedIn('odile')
  imre = await app.signedIn('imre')
})
afterAll(() => app.stop())

describe('the life of an edit', () => {
  it('goes from a draft over asked changes to an edition that visitors read', async () => {
    const before = (await app.agent().get('/api/guides/rear-toe').expect(200)).body
    const draft = await beginEdit(priya, { guideSlug: 'rear-toe' })
    expect(draft).toMatchObject({ state: 'draft', baseEdition: 1, guide: { slug: 'rear-toe' }, title: before.title })

    const again = await priya.post('/api/edits').send({ guideSlug: 'rear-toe' }).expect(200)
    expect(again.body.id).toBe(draft.id)

    const body = `${draft.content.body}\nCheck both sides with a gauge.\n`
    const saved = await saveEdit(priya, draft, { body }, 'Adds checking with a gauge')
    expect(saved.version).toBe(draft.version + 1)
    expect((await priya.get(`/api/edits/${draft.id}`).expect(200)).headers['etag']).toBe(`"${saved.version}"`)

    const sent = (await priya.post(`/api/edits/${draft.id}/send`).set(...ifMatch(saved)).send({}).expect(200)).body
    expect(sent).toMatchObject({ state: 'in_review', merged: false, may: { save: false, withdraw: true } })
    const queue = (await odile.get('/api/edits?state=in_review').expect(200)).body
    expect(queue.map((edit: { id: string }) => edit.id)).toContain(draft.id)

    const asked = (await odile.post(`/api/edits/${draft.id}/ask`).set(...ifMatch(sent)).send({ reason: 'Which gauge?' }).expect(200)).body
    expect(asked.state).toBe('changes_asked')
    await priya.post(`/api/edits/${draft.id}/notes`).send({ text: 'A plain toe gauge.\nTwo of us have one.' }).expect(201)

    const mended = await saveEdit(priya, { ...asked, content: sent.content }, { body: body.replace('a gauge', 'a toe gauge') })
    const resent = (await priya.post(`/api/edits/${draft.id}/send`).set(...ifMatch(mended)).send({}).expect(200)).body
    const approved = (await odile.post(`/api/edits/${draft.id}/approve`).set(...ifMatch(resent)).send({ note: 'Good.' }).expect(200)).body
    expect(approved).toMatchObject({ slug: 'rear-toe', edition: 2, edit: { state: 'approved', published: { slug: 'rear-toe', edition: 2 } } })

    const after = (await app.agent().get('/api/guides/rear-toe').expect(200)).body
    expect(after).toMatchObject({ edition: 2, editions: 2, summary: 'Adds checking with a gauge', author: { name: 'Priya Haldane' }, approver: { name: 'Odile Marchetti' } })
    expect(after.html).toContain('Check both sides with a toe gauge.')
    expect(after.contributors).toContainEqual({ id: after.author.id, name: 'Priya Haldane', editions: 1 })

    const mails = await app.mailTo(DEMO_PASSWORDS['priya']!.email)
    expect(mails.map((mail) => mail.subject).sort()).toEqual(['“Rear toe” is in the book', '“Rear toe”: changes asked for'].map((text) => text.replace('Rear toe', before.title)).sort())
    expect(mails.find((mail) => mail.subject.includes('changes asked for'))!.text).toContain('Which gauge?')
    const record = await rows<{ action: string }>(app, `select action from audit_entries where subject_id = $1 order by id`, [draft.id])
    expect(record.map((entry) => entry.action)).toEqual(['edit.create', 'edit.send', 'edit.ask', 'edit.send', 'edit.approve'])
  })

  it('makes a new guide with the next number, an address from its title and its effects in the table', async () => {
    const sent = await sentEdit(priya, { chapter: 'A' }, WHOLE_GUIDE, 'A new guide')
    const { slug, edition } = (await imre.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}).expect(200)).body
    expect({ slug, edition }).toEqual({ slug: 'gluing-tyres', edition: 1 })
    const guide = (await app.agent().get('/api/guides/gluing-tyres').expect(200)).body
    expect(guide).toMatchObject({ mark: 'A1', chapter: { letter: 'A' }, effects: [{ adjustable: 'tyre_insert', way: 'firmer' }] })
    expect(await rows(app, `select adjustable, phase from effects where guide_id = $1`, [guide.id])).toEqual([{ adjustable: 'tyre_insert', phase: 'middle' }])
  })

  it('shows in the preview exactly what publishing stores', async () => {
    const content = { ...WHOLE_GUIDE, title: 'Truing tyres', body: '## How\n\nText with :basis[a claim]{kind=physics}.\n\n::calculator{slug=fluid-blend}\n' }
    const preview = (await priya.post('/api/preview').send({ content }).expect(200)).body
    expect(preview.problems).toEqual([])
    const sent = await sentEdit(priya, { chapter: 'A' }, content)
    const { slug } = (await imre.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}).expect(200)).body
    const guide = (await app.agent().get(`/api/guides/${slug}`).expect(200)).body
    for (const part of ['html', 'parts', 'headings', 'effects', 'adjustables'] as const) expect(guide[part]).toEqual(preview[part])
  })

  it('declines with a reason that reaches the writer and the history, which names no writer', async () => {
    const sent = await sentEdit(priya, { guideSlug: 'sway-bars' }, { title: 'Bars' }, 'Shortens the title')
    await odile.post(`/api/edits/${sent.id}/decline`).set(...ifMatch(sent)).send({ reason: 'The long title is clearer.' }).expect(200)
    const mail = (await app.mailTo(DEMO_PASSWORDS['priya']!.email)).find(({ subject }) => subject.includes('not taken'))!
    expect(mail.text).toContain('The long title is clearer.')
    expect(mail.text).toContain(`/write/${sent.id}`)
    expect((await priya.get(`/api/edits/${sent.id}`).expect(200)).body.content.title).toBe('Bars')
    expect(await rows(app, `select count(*)::int as n from editions e join guides g on g.id = e.guide_id where g.slug = 'sway-bars'`)).toEqual([{ n: 1 }])
  })

  it('withdraws, and then lets the writer begin again', async () => {
    const first = await beginEdit(priya, { guideSlug: 'anti-squat' })
    await priya.post(`/api/edits/${first.id}/withdraw`).set(...ifMatch(first)).send({}).expect(200)
    const second = await beginEdit(priya, { guideSlug: 'anti-squat' })
    expect(second.id).not.toBe(first.id)
  })

  it('keeps a draft over a restart of the server', async () => {
    const draft = await beginEdit(priya, { guideSlug: 'shock-oil-and-pistons' })
    await saveEdit(priya, draft, { title: 'Half writ' })
    const other = await createTestApp({ databaseUrl: app.databaseUrl })
    try {
      const agent = await other.signedIn('priya')
      const found = (await agent.get(`/api/edits/${draft.id}`).expect(200)).body
      expect(found.content.title).toBe('Half writ')
    } finally {
      await other.stop()
    }
  })
})
