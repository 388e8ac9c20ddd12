import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import type { EditEntry, EditView } from '#server/edits/index.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, sentEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let people: Record<'priya' | 'tomasz' | 'odile', Agent>
beforeAll(async () => {
  app = await createTestApp()
  const keys = ['priya', 'tomasz', 'odile'] as const
  people = Object.fromEntries(await Promise.all(keys.map(async (key) => [key, await app.signedIn(key)]))) as typeof people
})
beforeEach(() => rows(app, 'delete from rate_limits'))
afterAll(() => app.stop())

async function listed(agent: Agent, query: string, id: string): Promise<EditEntry | undefined> {
  const { body } = await agent.get(`/api/edits?${query}`).expect(200)
  return (body as EditEntry[]).find((edit) => edit.id === id)
}

const act = async (agent: Agent, edit: { id: string; version: number }, deed: string, body: object = {}) =>
  (await agent.post(`/api/edits/${edit.id}/${deed}`).set(...ifMatch(edit)).send(body).expect(200)).body as EditView

describe('a list of edits', () => {
  it('says how much each changes, once it is handed in', async () => {
    const draft = await saveEdit(people.priya, await beginEdit(people.priya, { guideSlug: 'droop' }), { title: 'Droop, measured' }, 'Renames it')
    expect(await listed(people.priya, 'whose=mine', draft.id)).toMatchObject({ changes: null })
    const sent = await act(people.priya, draft, 'send')
    expect(await listed(people.odile, 'state=in_review', draft.id)).toMatchObject({ changes: { fields: 1, effects: 0, sources: 0 } })

    const asked = await act(people.odile, sent, 'ask', { reason: 'Why measured?' })
    const effects = draft.content.effects.slice(1)
    const again = await act(people.priya, await saveEdit(people.priya, asked, { effects }), 'send')
    expect(again.changes).toMatchObject({ fields: 1, effects: 1 })
  })

  it('counts against the edition it was put in one with', async () => {
    const mine = await sentEdit(people.priya, { guideSlug: 'rear-toe' }, { title: 'Rear toe-in' })
    const theirs = await sentEdit(people.tomasz, { guideSlug: 'rear-toe' }, { bench: { reachFor: 'Often.', moveBy: '', youGiveUp: '', takes: '' } })
    await act(people.odile, theirs, 'approve')
    const before = await listed(people.odile, 'state=in_review', mine.id)
    await act(people.odile, mine, 'rebase')
    expect(before!.changes).toMatchObject({ fields: 1 })
    expect(await listed(people.odile, 'state=in_review', mine.id)).toMatchObject({ changes: before!.changes, baseEdition: 2 })
  })

  it('counts a new guide against an empty page', async () => {
    const sent = await sentEdit(people.tomasz, { chapter: 'D' }, WHOLE_GUIDE)
    expect(sent.changes).toMatchObject({ fields: 2, effects: 1, sources: 1 })
    expect(sent.changes!.words).toBeGreaterThan(15)
  })

  it('says what was asked last, while it is asked', async () => {
    const sent = await sentEdit(people.tomasz, { guideSlug: 'sway-bars' }, { title: 'Sway bars, said better' })
    expect(sent.asked).toBeNull()
    const asked = await act(people.odile, sent, 'ask', { reason: 'The first thing' })
    const later = await act(people.odile, await act(people.tomasz, asked, 'send'), 'ask', { reason: 'The second thing' })
    const entry = await listed(people.tomasz, 'whose=mine&state=changes_asked', later.id)
    expect(entry!.asked).toMatchObject({ reason: 'The second thing', reviewer: { name: 'Odile Marchetti' } })
    expect((await act(people.tomasz, later, 'send')).asked).toBeNull()
  })
})

describe('limits', () => {
  it('hold for every deed at an edit', async () => {
    const sent = await sentEdit(people.priya, { chapter: 'E' }, WHOLE_GUIDE)
    await rows(app, `insert into rate_limits (key, points, expire) select 'write:' || id, 60, (extract(epoch from now()) * 1000 + 600000)::bigint from members where key in ('priya', 'odile')
      on conflict (key) do update set points = 60, expire = excluded.expire`)
    for (const [deed, body] of [['approve', {}], ['ask', { reason: 'A reason' }], ['decline', { reason: 'A reason' }], ['rebase', {}], ['notes', { text: 'A note' }]] as const) {
      await people.odile.post(`/api/edits/${sent.id}/${deed}`).set(...ifMatch(sent)).send(body).expect(429)
    }
    for (const deed of ['withdraw', 'rebase']) await people.priya.post(`/api/edits/${sent.id}/${deed}`).set(...ifMatch(sent)).send({}).expect(429)
    await people.odile.get(`/api/edits/${sent.id}`).expect(200)
  })

  it('let one member have two previews made at once, and another theirs meanwhile', async () => {
    const preview = (agent: Agent) => agent.post('/api/preview').send({ content: { ...WHOLE_GUIDE, body: '| a | b |\n|---|---|\n'.padEnd(20_000, '| c | d |\n') } })
    const [other, ...own] = await Promise.all([preview(people.tomasz), ...Array.from({ length: 5 }, () => preview(people.priya))])
    expect(other!.status).toBe(200)
    expect(own.map(({ status }) => status).sort()).toEqual(expect.arrayContaining([200, 200, 503]))
    expect(own.find(({ status }) => status === 503)!.body.title).toContain('Your last preview is still being made')
  })
})
