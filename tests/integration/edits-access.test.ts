import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { EditView } from '#server/edits/index.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, sentEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let people: Record<'visitor' | 'priya' | 'tomasz' | 'odile' | 'wanda', Agent>
beforeAll(async () => {
  app = await createTestApp()
  const keys = ['priya', 'tomasz', 'odile', 'wanda'] as const
  const signedIn = await Promise.all(keys.map(async (key) => [key, await app.signedIn(key)]))
  people = { visitor: app.agent(), ...Object.fromEntries(signedIn) }
})
afterAll(() => app.stop())

const bodies: Record<string, object> = {
  send: {}, withdraw: {}, approve: {}, rebase: {}, ask: { reason: 'A reason' }, decline: { reason: 'A reason' },
  merge: { baseEdition: 1, content: WHOLE_GUIDE }, notes: { text: 'A note' },
}

describe('another person’s draft', () => {
  it.each(['tomasz', 'odile', 'wanda'] as const)('is not there for %s, whatever they try', async (who) => {
    const draft = await beginEdit(people.priya, { chapter: 'A' })
    const agent = people[who]
    await agent.get(`/api/edits/${draft.id}`).expect(404)
    await agent.put(`/api/edits/${draft.id}`).set(...ifMatch(draft)).send({ content: WHOLE_GUIDE, summary: '' }).expect(404)
    for (const [deed, body] of Object.entries(bodies)) {
      await agent.post(`/api/edits/${draft.id}/${deed}`).set(...ifMatch(draft)).send(body).expect(404)
    }
    const listed = (await agent.get('/api/edits?whose=mine').expect(200)).body as EditView[]
    expect(listed.map((edit) => edit.id)).not.toContain(draft.id)
    expect((await people.priya.get(`/api/edits/${draft.id}`).expect(200)).body).toMatchObject({ version: draft.version, notes: [] })
  })

  it('does not show in a moderator’s list of everyone’s edits', async () => {
    const draft = await beginEdit(people.priya, { chapter: 'A' })
    const everyone = (await people.odile.get('/api/edits?whose=everyone').expect(200)).body as EditView[]
    expect(everyone.map((edit) => edit.id)).not.toContain(draft.id)
    await people.priya.get('/api/edits?whose=everyone').expect(403)
  })
})

describe('a withdrawn edit', () => {
  const everyone = async () => ((await people.odile.get('/api/edits?state=withdrawn').expect(200)).body as EditView[]).map((edit) => edit.id)

  it('that was never sent stays hidden from moderators', async () => {
    const draft = await beginEdit(people.priya, { chapter: 'C' })
    const withdrawn = (await people.priya.post(`/api/edits/${draft.id}/withdraw`).set(...ifMatch(draft)).send({}).expect(200)).body as EditView
    await people.odile.get(`/api/edits/${draft.id}`).expect(404)
    await people.odile.post(`/api/edits/${draft.id}/decline`).set(...ifMatch(withdrawn)).send({ reason: 'A reason' }).expect(404)
    await people.odile.post(`/api/edits/${draft.id}/notes`).send({ text: 'A note' }).expect(404)
    expect(await everyone()).not.toContain(draft.id)
    await people.priya.get(`/api/edits/${draft.id}`).expect(200)
  })

  it('that was sent before stays readable to moderators', async () => {
    const sent = await sentEdit(people.priya, { guideSlug: 'anti-squat' }, { title: 'Anti-squat, again' })
    await people.priya.post(`/api/edits/${sent.id}/withdraw`).set(...ifMatch(sent)).send({}).expect(200)
    await people.odile.get(`/api/edits/${sent.id}`).expect(200)
    expect(await everyone()).toContain(sent.id)
  })
})

describe('an edit in review', () => {
  it('is hidden from other members and asks visitors to sign in', async () => {
    const sent = await sentEdit(people.priya, { guideSlug: 'droop' }, { title: 'Droop, measured' })
    await people.tomasz.get(`/api/edits/${sent.id}`).expect(404)
    await people.odile.get(`/api/edits/${sent.id}`).expect(200)
    await people.visitor.get(`/api/edits/${sent.id}`).expect(401)
    for (const [deed, body] of Object.entries(bodies)) {
      await people.visitor.post(`/api/edits/${sent.id}/${deed}`).set(...ifMatch(sent)).send(body).expect(401)
      await people.tomasz.post(`/api/edits/${sent.id}/${deed}`).set(...ifMatch(sent)).send(body).expect(404)
    }
  })

  it.each(['priya', 'odile', 'wanda'] as const)('of %s is decided by somebody else, whatever their role', async (who) => {
    const sent = await sentEdit(people[who], { guideSlug: 'rear-toe' }, { title: `Rear toe by ${who}` })
    for (const deed of ['approve', 'ask', 'decline']) {
      await people[who].post(`/api/edits/${sent.id}/${deed}`).set(...ifMatch(sent)).send(bodies[deed]).expect(403)
    }
    expect(await rows(app, 'select 1 from reviews where edit_id = $1', [sent.id])).toEqual([])
  })

  it('cannot be changed or sent by a moderator in the writer’s name', async () => {
    const sent = await sentEdit(people.priya, { guideSlug: 'sway-bars' }, { title: 'Sway bars, again' })
    await people.odile.put(`/api/edits/${sent.id}`).set(...ifMatch(sent)).send({ content: sent.content, summary: 'x y z' }).expect(403)
    await people.odile.post(`/api/edits/${sent.id}/withdraw`).set(...ifMatch(sent)).send({}).expect(403)
  })
})

describe('what a body cannot set', () => {
  it.each(['id', 'version', 'state', 'authorId', 'role', 'publishedAt', '__proto__x'])('%s', async (key) => {
    const draft = await beginEdit(people.tomasz, { chapter: 'B' })
    const answer = await people.tomasz.put(`/api/edits/${draft.id}`).set(...ifMatch(draft)).send({ content: draft.content, summary: '', [key]: 'approved' }).expect(422)
    expect(answer.body.errors).toContainEqual({ field: key, message: `“${key}” is not a field here.` })
    await people.tomasz.post('/api/edits').send({ chapter: 'B', [key]: 'x' }).expect(422)
  })

  it('does not tell anyone’s e-mail address', async () => {
    const sent = await sentEdit(people.tomasz, { chapter: 'B' }, WHOLE_GUIDE)
    const texts = [
      (await people.odile.get(`/api/edits/${sent.id}`)).text,
      (await people.odile.get('/api/edits?state=in_review')).text,
      (await people.visitor.get('/api/guides/droop')).text,
    ]
    for (const text of texts) expect(text).not.toMatch(/@saltmarsh|argon2|password/i)
  })
})

it('who has not confirmed their address cannot write', async () => {
  await rows(app, `update members set email_verified_at = null where key = 'tomasz'`)
  const answer = await people.tomasz.post('/api/edits').send({ guideSlug: 'droop' }).expect(403)
  expect(answer.body.title).toContain('Confirm your e-mail address')
  await people.tomasz.post('/api/preview').send({ content: WHOLE_GUIDE }).expect(403)
})

it('a saved draft is not sent by saving', async () => {
  const saved = await saveEdit(people.priya, await beginEdit(people.priya, { chapter: 'D' }), WHOLE_GUIDE)
  expect(saved.state).toBe('draft')
})
