import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, sentEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let people: Record<'priya' | 'tomasz' | 'odile' | 'imre' | 'wanda', Agent>
beforeAll(async () => {
  app = await createTestApp()
  const keys = ['priya', 'tomasz', 'odile', 'imre', 'wanda'] as const
  people = Object.fromEntries(await Promise.all(keys.map(async (key) => [key, await app.signedIn(key)]))) as typeof people
})
afterAll(() => app.stop())

const forgetLimits = () => rows(app, 'delete from rate_limits')

describe('moderators who decide at once', () => {
  it('publish one edition, one review and one mail', async () => {
    for (let round = 1; round <= 5; round++) {
      await forgetLimits()
      const sent = await sentEdit(people.priya, { guideSlug: 'rear-toe' }, { bench: { reachFor: `Round ${round}`, moveBy: '', youGiveUp: '', takes: '' } })
      const deeds = [
        ...[people.odile, people.imre, people.wanda, people.odile].map((agent) =>
          agent.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}),
        ),
        people.imre.post(`/api/edits/${sent.id}/decline`).set(...ifMatch(sent)).send({ reason: 'No source' }),
      ]
      const statuses = (await Promise.all(deeds)).map((answer) => answer.status).sort()
      expect(statuses).toEqual([200, 409, 409, 409, 409])
      const [count] = await rows<{ editions: number; reviews: number; records: number }>(
        app,
        `select (select count(*)::int from editions where edit_id = $1) as editions,
                (select count(*)::int from reviews where edit_id = $1) as reviews,
                (select count(*)::int from audit_entries where subject_id = $2 and action in ('edit.approve', 'edit.decline')) as records`,
        [sent.id, sent.id],
      )
      expect(count!.reviews).toBe(1)
      expect(count!.records).toBe(1)
      expect(count!.editions).toBeLessThanOrEqual(1)
      const mails = await rows<{ n: number }>(app, `select count(*)::int as n from outbox where recipient = $1`, [DEMO_PASSWORDS['priya']!.email])
      expect(mails[0]!.n).toBe(round)
    }
  })

  it('publish exactly the version that was looked at, or nothing, while the writer takes it back', async () => {
    for (let round = 0; round < 5; round++) {
      await forgetLimits()
      const sent = await sentEdit(people.tomasz, { guideSlug: 'anti-squat' }, { inShort: `What was looked at in round ${round}, and nothing else.` })
      const [approved, withdrawn] = await Promise.all([
        people.odile.post(`/api/edits/${sent.id}/approve`).set(...ifMatch(sent)).send({}),
        people.tomasz.post(`/api/edits/${sent.id}/withdraw`).set(...ifMatch(sent)).send({}),
      ])
      expect([approved.status, withdrawn.status].sort()).toEqual([200, 409])
      const published = await rows<{ content: unknown }>(app, 'select content from editions where edit_id = $1', [sent.id])
      expect(published).toHaveLength(approved.status === 200 ? 1 : 0)
      if (approved.status === 200) expect(published[0]!.content).toMatchObject({ inShort: sent.content.inShort })
    }
  })

  it('do not publish a version that the writer changed after it was looked at', async () => {
    const looked = await sentEdit(people.tomasz, { guideSlug: 'filling-diffs-and-shocks' }, { inShort: 'The sentence that the moderator looked at first.' })
    const asked = (await people.imre.post(`/api/edits/${looked.id}/ask`).set(...ifMatch(looked)).send({ reason: 'Shorter, please' }).expect(200)).body
    const mended = await saveEdit(people.tomasz, asked, { inShort: 'Another sentence, which nobody has looked at.' })
    await people.tomasz.post(`/api/edits/${looked.id}/send`).set(...ifMatch(mended)).send({}).expect(200)
    const late = await people.odile.post(`/api/edits/${looked.id}/approve`).set(...ifMatch(looked)).send({})
    expect(late.status).toBe(412)
    expect(await rows(app, 'select 1 from editions where edit_id = $1', [looked.id])).toEqual([])
  })
})

describe('one draft saved from several places at once', () => {
  it('keeps exactly one and tells the others the version it has now', async () => {
    const draft = await beginEdit(people.wanda, { guideSlug: 'sway-bars' })
    let current = draft
    for (let round = 0; round < 5; round++) {
      const answers = await Promise.all(
        [1, 2, 3, 4].map((n) =>
          people.wanda.put(`/api/edits/${draft.id}`).set(...ifMatch(current)).send({ content: { ...draft.content, title: `Round ${round}, place ${n}` }, summary: '' }),
        ),
      )
      expect(answers.map((answer) => answer.status).sort()).toEqual([200, 412, 412, 412])
      const winner = answers.find((answer) => answer.status === 200)!.body
      for (const loser of answers.filter((answer) => answer.status === 412)) expect(loser.body.version).toBe(winner.version)
      current = (await people.wanda.get(`/api/edits/${draft.id}`).expect(200)).body
      expect(current.content.title).toBe(winner.content.title)
    }
  })

  it('never makes two open edits of one guide', async () => {
    const answers = await Promise.all([1, 2, 3, 4, 5].map(() => people.priya.post('/api/edits').send({ guideSlug: 'lithium-battery-care' })))
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 200, 200, 200, 201])
    expect(new Set(answers.map((answer) => answer.body.id)).size).toBe(1)
  })

  it('acts once for one Idempotency-Key', async () => {
    await forgetLimits()
    const key = 'one-new-guide-only'
    const answers = await Promise.all(
      Array.from({ length: 10 }, () => people.priya.post('/api/edits').set('Idempotency-Key', key).send({ chapter: 'F' })),
    )
    const made = answers.filter((answer) => answer.status === 201)
    expect(new Set(made.map((answer) => answer.body.id)).size).toBe(1)
    expect(answers.every((answer) => answer.status === 201 || (answer.status === 409 && answer.body.code === 'still_running'))).toBe(true)
    expect(await rows(app, `select 1 from edits where chapter = 'F'`)).toHaveLength(1)
    const again = await people.priya.post('/api/edits').set('Idempotency-Key', key).send({ chapter: 'F' })
    expect(again.body.id).toBe(made[0]!.body.id)
  })
})

describe('new guides approved at once', () => {
  it('get numbers and addresses of their own, even with the same title', async () => {
    await forgetLimits()
    const starts = [['priya', 'G'], ['tomasz', 'G'], ['wanda', 'G'], ['priya', 'H'], ['tomasz', 'H']] as const
    const sent = []
    for (const [who, chapter] of starts) sent.push(await sentEdit(people[who], { chapter }, { ...WHOLE_GUIDE, title: 'Choosing a pinion' }))
    const answers = await Promise.all(sent.map((edit, n) => people[n % 2 === 0 ? 'odile' : 'imre'].post(`/api/edits/${edit.id}/approve`).set(...ifMatch(edit)).send({})))
    expect(answers.map((answer) => answer.status)).toEqual([200, 200, 200, 200, 200])
    expect(new Set(answers.map((answer) => answer.body.slug))).toEqual(
      new Set(['choosing-a-pinion', 'choosing-a-pinion-2', 'choosing-a-pinion-3', 'choosing-a-pinion-4', 'choosing-a-pinion-5']),
    )
    const marks = await rows<{ chapter: string; number: number }>(app, `select chapter, number from guides where slug like 'choosing-a-pinion%' order by 1, 2`)
    const numbers = marks.filter(({ chapter }) => chapter === 'G').map(({ number }) => number)
    expect(numbers).toEqual([numbers[0]!, numbers[0]! + 1, numbers[0]! + 2])
  })
})

describe('the desk takes five edits of one member', () => {
  it('also when they are sent at once', async () => {
    await forgetLimits()
    await rows(app, `update edits set state = 'withdrawn', version = version + 1 where state in ('draft', 'in_review', 'changes_asked')`)
    const drafts = []
    for (let n = 0; n < 7; n++) {
      drafts.push(await saveEdit(people.priya, await beginEdit(people.priya, { chapter: 'C' }), { ...WHOLE_GUIDE, title: `Guide ${n}` }, 'A new guide'))
    }
    const answers = await Promise.all(drafts.map((draft) => people.priya.post(`/api/edits/${draft.id}/send`).set(...ifMatch(draft)).send({})))
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 200, 200, 200, 200, 409, 409])
    expect(answers.find((answer) => answer.status === 409)!.body.code).toBe('too_many_waiting')
  })
})
