import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, sentEdit, type Agent } from './edits-support.ts'

let app: TestApp
let priya: Agent
let tomasz: Agent
let odile: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
  tomasz = await app.signedIn('tomasz')
  odile = await app.signedIn('odile')
})
afterAll(() => app.stop())
beforeEach(async () => {
  await rows(app, 'delete from rate_limits')
})

/** Another member's edit of the same guide is published. */
async function publishMeanwhile(guideSlug: string, inShort: string): Promise<number> {
  const sent = await sentEdit(tomasz, { guideSlug }, { inShort })
  return (await odile.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}).expect(200)).body.edition
}

it('an edit whose base moved is merged when it is sent, and nothing of either side is lost', async () => {
  const draft = await saveEdit(priya, await beginEdit(priya, { guideSlug: 'rear-toe' }), { title: 'Rear toe-in' }, 'Renames it')
  const edition = await publishMeanwhile('rear-toe', 'This sentence was published while the other was written.')
  const opened = (await priya.get(`/api/edits/${draft.id}`).expect(200)).body
  expect(opened.baseMoved).toMatchObject({ edition, mergeable: true, conflicts: [] })
  const sent = (await priya.post(`/api/edits/${draft.id}/send`).set(...ifMatch(draft)).send({}).expect(200)).body
  expect(sent).toMatchObject({ merged: true, baseEdition: edition, baseMoved: null })
  expect(sent.content).toMatchObject({ title: 'Rear toe-in', inShort: 'This sentence was published while the other was written.' })
})

it('a conflict stops sending, shows both sides, and goes on once the writer has settled it', async () => {
  const draft = await saveEdit(priya, await beginEdit(priya, { guideSlug: 'filling-diffs-and-shocks' }), { inShort: 'What I say about it, in one sentence.' }, 'In short')
  const edition = await publishMeanwhile('filling-diffs-and-shocks', 'What they say about it, in one sentence.')
  const refused = await priya.post(`/api/edits/${draft.id}/send`).set(...ifMatch(draft)).send({}).expect(409)
  expect(refused.body).toMatchObject({
    code: 'base_moved',
    edition,
    conflicts: [{ field: 'inShort', label: 'In short', mine: 'What I say about it, in one sentence.', theirs: 'What they say about it, in one sentence.' }],
  })
  const content = { ...draft.content, inShort: 'What we both say about it, in one sentence.' }
  await priya.post(`/api/edits/${draft.id}/merge`).set(...ifMatch(draft)).send({ baseEdition: edition - 1, content }).expect(409)
  const settled = (await priya.post(`/api/edits/${draft.id}/merge`).set(...ifMatch(draft)).send({ baseEdition: edition, content }).expect(200)).body
  expect(settled).toMatchObject({ baseMoved: null, baseEdition: edition })
  await priya.post(`/api/edits/${draft.id}/send`).set(...ifMatch(settled)).send({}).expect(200)
})

it('approving never publishes a merge that nobody looked at: the moderator merges, looks, and approves', async () => {
  const sent = await sentEdit(priya, { guideSlug: 'sway-bars' }, { title: 'Sway bars, front and rear' })
  const edition = await publishMeanwhile('sway-bars', 'Published between sending and approving of the other edit.')
  const refused = await odile.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}).expect(409)
  expect(refused.body).toMatchObject({ code: 'base_moved_mergeable', edition })
  const rebased = (await odile.post(`/api/edits/${sent.id}/rebase`).set(...ifMatch(sent)).send({}).expect(200)).body
  expect(rebased).toMatchObject({ state: 'in_review', version: sent.version + 1, baseEdition: edition })
  await odile.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}).expect(412)
  await odile.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(rebased)).send({}).expect(200)
  const guide = (await app.agent().get('/api/guides/sway-bars').expect(200)).body
  expect(guide).toMatchObject({
    edition: edition + 1, title: 'Sway bars, front and rear', inShort: 'Published between sending and approving of the other edit.',
  })
})

it('approving an edit that conflicts says where, and publishes nothing', async () => {
  const sent = await sentEdit(priya, { guideSlug: 'anti-squat' }, { inShort: 'My sentence about anti-squat, sent for review.' })
  const edition = await publishMeanwhile('anti-squat', 'Their sentence about anti-squat, published first.')
  const refused = await odile.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}).expect(409)
  expect(refused.body).toMatchObject({ code: 'base_moved', edition, conflicts: [{ field: 'inShort' }] })
  await odile.post(`/api/edits/${sent.id}/rebase`).set(...ifMatch(sent)).send({}).expect(409)
  expect((await app.agent().get('/api/guides/anti-squat').expect(200)).body.edition).toBe(edition)
})

it('two edits of one guide approved at once: one is published, the other has to be brought up to date', async () => {
  const one = await sentEdit(priya, { guideSlug: 'diff-fluids' }, { title: 'Fluids for diffs' })
  const other = await sentEdit(tomasz, { guideSlug: 'diff-fluids' }, { inShort: 'Another sentence about what the fluid in a diff does.' })
  const answers = await Promise.all([one, other].map((edit) => odile.post(`/api/edits/${edit.id}/approve`).set(...ifMatch(edit)).send({})))
  expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409])
  expect(answers.find((answer) => answer.status === 409)!.body.code).toBe('base_moved_mergeable')
  expect(await rows(app, `select max(e.number)::int as last, count(*)::int as n from editions e join guides g on g.id = e.guide_id where g.slug = 'diff-fluids'`)).toEqual([{ last: 2, n: 2 }])
})
