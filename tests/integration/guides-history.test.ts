import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { ServiceContext } from '#server/context.ts'
import { visitor } from '#server/context.ts'
import { listLapEffects } from '#server/effects/index.ts'
import { compareEditions, getChapter, getEdition, getHistory, listFreshInk, renewRenderings } from '#server/guides/index.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, sentEdit, type Agent } from './edits-support.ts'

let app: TestApp
let ctx: ServiceContext
let priya: Agent
let odile: Agent
beforeAll(async () => {
  app = await createTestApp()
  ctx = { ...app.app, actor: visitor, requestId: 'test', address: '127.0.0.1' }
  priya = await app.signedIn('priya')
  odile = await app.signedIn('odile')
})
afterAll(() => app.stop())

async function publish(change: Parameters<typeof sentEdit>[2], summary: string): Promise<void> {
  const sent = await sentEdit(priya, { guideSlug: 'rear-toe' }, change, summary)
  await odile.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}).expect(200)
}

describe('a guide that was changed twice and had one edit declined', () => {
  let first: { title: string; effects: { strength: 1 | 2 | 3 }[] }
  beforeAll(async () => {
    first = (await app.agent().get('/api/guides/rear-toe').expect(200)).body
    await publish({ title: 'Rear toe-in' }, 'Renames it')
    const declined = await sentEdit(priya, { guideSlug: 'rear-toe' }, { title: 'Toe' }, 'Shortens the title')
    await odile.post(`/api/edits/${declined.id}/decline`).set(...ifMatch(declined)).send({ reason: 'Too short to find.' }).expect(200)
    const content = (await odile.get(`/api/edits/${declined.id}`).expect(200)).body.content
    const effects = content.effects.map((effect: { strength: number }, n: number) => (n === 0 ? { ...effect, strength: effect.strength === 3 ? 2 : 3 } : effect))
    await publish({ effects }, 'Says it is stronger')
  })

  it('has its history, newest first, with the size of each change', async () => {
    const history = await getHistory(ctx, { slug: 'rear-toe' })
    expect(history).toMatchObject({ editions: 3, publishedEdition: 3, page: 1, pages: 1 })
    const layers = 'layers' in history ? history.layers : []
    expect(layers.map((layer) => (layer.kind === 'edition' ? layer.number : layer.kind))).toEqual([3, 'declined', 2, 1])
    expect(layers[0]).toMatchObject({ summary: 'Says it is stronger', author: { name: 'Priya Haldane' }, approver: { name: 'Odile Marchetti' }, changes: { words: 0, effects: 1 } })
    expect(layers[1]).toEqual({ kind: 'declined', summary: 'Shortens the title', reason: 'Too short to find.', declinedBy: expect.objectContaining({ name: 'Odile Marchetti' }), at: expect.any(String) })
    expect(layers[2]).toMatchObject({ changes: { fields: 1, effects: 0 } })
  })

  it('shows no sizes for an edition from before they were kept', async () => {
    await rows(app, 'alter table editions disable trigger editions_never_changed')
    await rows(app, `update editions set changes = '{}' where guide_id = (select id from guides where slug = 'anti-squat')`)
    await rows(app, 'alter table editions enable trigger editions_never_changed')
    const history = await getHistory(ctx, { slug: 'anti-squat' })
    expect(history).toMatchObject({ layers: [{ number: 1, changes: { words: 0, fields: 0, effects: 0, calculators: 0, pictures: 0, sources: 0 } }] })
  })

  it('keeps every edition readable as it was', async () => {
    expect(await getEdition(ctx, { slug: 'rear-toe', number: 1 })).toMatchObject({ title: first.title, edition: 1, isPublished: false, publishedEdition: 3 })
    expect(await getEdition(ctx, { slug: 'rear-toe', number: 3 })).toMatchObject({ title: 'Rear toe-in', isPublished: true })
    await expect(getEdition(ctx, { slug: 'rear-toe', number: 4 })).rejects.toMatchObject({ status: 404 })
    await expect(getEdition(ctx, { slug: 'rear-toe', number: Number.NaN })).rejects.toMatchObject({ status: 404 })
    await expect(getEdition(ctx, { slug: 'rear-toe', number: 1e12 })).rejects.toMatchObject({ status: 404 })
  })

  it('compares any two, both ways round', async () => {
    const there = await compareEditions(ctx, { slug: 'rear-toe', from: 1, to: 3 })
    expect(there).toMatchObject({ from: { number: 1 }, to: { number: 3 }, changes: { counts: { fields: 1, effects: 1 } } })
    const back = await compareEditions(ctx, { slug: 'rear-toe', from: 3, to: 1 })
    expect(back).toMatchObject({ changes: { effects: [{ before: { strength: first.effects[0]!.strength === 3 ? 2 : 3 } }] } })
    await expect(compareEditions(ctx, { slug: 'rear-toe', from: 1, to: 9 })).rejects.toMatchObject({ status: 404 })
  })

  it('has its effects replaced, not added to', async () => {
    const [count] = await rows<{ n: number }>(app, `select count(*)::int as n from effects e join guides g on g.id = e.guide_id where g.slug = 'rear-toe'`)
    expect(count!.n).toBe(first.effects.length)
  })

  it('is fresh ink, and acts on the lap where it says', async () => {
    expect((await listFreshInk(ctx, { limit: 1 }))[0]).toMatchObject({ slug: 'rear-toe', edition: 3, summary: 'Says it is stronger', changes: { effects: 1 } })
    const guide = (await app.agent().get('/api/guides/rear-toe').expect(200)).body
    const phase = guide.effects[0].phase
    const effects = await listLapEffects(ctx, phase)
    expect(effects.filter((effect) => effect.guide.slug === 'rear-toe')).toHaveLength(guide.effects.filter((effect: { phase: string }) => effect.phase === phase).length)
    expect(effects.map((effect) => effect.strength)).toEqual(effects.map((effect) => effect.strength).sort((a, b) => b - a))
    const chapter = await getChapter(ctx, guide.chapter.letter)
    const card = chapter.guides.find(({ slug }) => slug === 'rear-toe')!
    expect(card.reach[phase as 'entry']).toBe(Math.max(...guide.effects.filter((effect: { phase: string }) => effect.phase === phase).map((effect: { strength: number }) => effect.strength)))
  })

  it('brings an old edition back as a new edit, over the desk like any other', async () => {
    const draft = await beginEdit(priya, { guideSlug: 'rear-toe', restoreEdition: 1 })
    expect(draft).toMatchObject({ content: { title: first.title }, baseEdition: 3, summary: 'Brings back edition 1' })
    const sent = (await priya.post(`/api/edits/${draft.id}/send`).set(...ifMatch(draft)).send({}).expect(200)).body
    await odile.post(`/api/edits/${draft.id}/approve`).set(...ifMatch(sent)).send({}).expect(200)
    const guide = (await app.agent().get('/api/guides/rear-toe').expect(200)).body
    expect(guide).toMatchObject({ edition: 4, title: first.title })
    expect((await compareEditions(ctx, { slug: 'rear-toe', from: 1, to: 4 }))).toMatchObject({ changes: { counts: { words: 0, fields: 0, effects: 0, sources: 0 } } })
  })

  it('does not overwrite an open draft by bringing an edition back', async () => {
    const draft = await saveEdit(priya, await beginEdit(priya, { guideSlug: 'anti-squat' }), { title: 'My open draft' })
    const answer = await priya.post('/api/edits').send({ guideSlug: 'anti-squat', restoreEdition: 1 }).expect(200)
    expect(answer.body).toMatchObject({ id: draft.id, content: { title: 'My open draft' } })
  })
})

describe('what was published', () => {
  const changes = [
    `update editions set content = jsonb_set(content, '{title}', '"Other"')`, `update editions set number = number + 100`,
    `update editions set author_id = approver_id`, `update editions set summary = 'x y z'`, `update editions set changes = '{}'`, `update editions set renderer_version = 0`,
    'delete from editions', 'truncate editions cascade', `update audit_entries set action = 'edit.other'`, 'delete from audit_entries',
  ]
  it.each(changes)('never changes: %s', async (statement) => {
    await expect(rows(app, statement)).rejects.toThrow()
  })

  it('cannot be approved by its writer, in the database either', async () => {
    const sent = await sentEdit(priya, { chapter: 'F' }, { title: 'Weights', inShort: 'Where the weights go on a light car.', body: 'Low and central.' })
    await expect(
      rows(app, `insert into reviews (edit_id, edit_version, reviewer_id, decision) select id, version, author_id, 'approve' from edits where id = $1`, [sent.id]),
    ).rejects.toThrow(/own edit/)
    await expect(rows(app, `update edits set author_id = (select id from members where key = 'imre'), version = version + 1 where id = $1`, [sent.id])).rejects.toThrow(/forward/)
  })

  it('is rendered again, and only rendered, when the renderer is newer', async () => {
    const before = await rows<{ id: string; html: string; content: unknown }>(app, 'select id, html, content from editions order by id')
    // Only a database owner can make an edition look old; the trigger refuses everyone else.
    await rows(app, `alter table editions disable trigger editions_never_changed`)
    await rows(app, `update editions set html = 'stale', parts = '[]', renderer_version = 0`)
    await rows(app, `alter table editions enable trigger editions_never_changed`)
    expect(await renewRenderings(app.app)).toEqual({ renewed: before.length, failed: 0 })
    expect(await rows(app, 'select id, html, content from editions order by id')).toEqual(before)
    expect(await renewRenderings(app.app)).toEqual({ renewed: 0, failed: 0 })
  })
})
