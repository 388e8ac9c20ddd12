import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sql } from 'drizzle-orm'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { beginEdit, rows, type Agent } from './edits-support.ts'

let app: TestApp
let priya: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
})
afterAll(() => app.stop())

const post = (key: string, body: object) => priya.post('/api/edits').set('Idempotency-Key', key).send(body)

/** Asks once, then turns the kept answer back into the claim of a server that was killed before it answered. */
async function claimLeftBehind(key: string, body: object, secondsAgo: number): Promise<void> {
  await post(key, body).expect(201)
  await rows(app, 'delete from edits')
  await rows(
    app,
    `update idempotency_keys set status = null, body = null, headers = null, created_at = now() - interval '1 second' * $2 where key = $1`,
    [key, secondsAgo],
  )
}

describe('a request under an Idempotency-Key', () => {
  it('acts once, however many come at the same time', async () => {
    const answers = await Promise.all(Array.from({ length: 50 }, () => post('fifty-at-once', { chapter: 'A' })))
    expect(answers.filter(({ status }) => status !== 201 && status !== 409)).toEqual([])
    expect(answers.filter(({ status }) => status === 201).length).toBeGreaterThan(0)
    expect(await rows(app, `select 1 from edits where chapter = 'A' and state = 'draft'`)).toHaveLength(1)
  })

  it('gets the same answer again, tag and all, and another request under the key is refused', async () => {
    const first = await post('asked-again', { chapter: 'B' }).expect(201)
    const again = await post('asked-again', { chapter: 'B' }).expect(201)
    expect(again.body).toEqual(first.body)
    expect(again.headers.etag).toBe(first.headers.etag)
    const other = await post('asked-again', { chapter: 'C' }).expect(422)
    expect(other.body.code).toBe('idempotency_key_reused')
  })

  it('waits for one that is still running', async () => {
    await claimLeftBehind('still-running', { chapter: 'D' }, 50)
    expect((await post('still-running', { chapter: 'D' }).expect(409)).body.code).toBe('still_running')
  })

  it('takes over from one whose server was killed, once', async () => {
    await claimLeftBehind('left-behind', { chapter: 'D' }, 61)
    expect((await post('left-behind', { chapter: 'E' }).expect(422)).body.code).toBe('idempotency_key_reused')
    const answers = await Promise.all(Array.from({ length: 8 }, () => post('left-behind', { chapter: 'D' })))
    const statuses = answers.map(({ status }) => status)
    expect(statuses).toContain(201)
    expect(statuses.filter((status) => status !== 201 && status !== 409)).toEqual([])
    expect(await rows(app, `select 1 from edits where chapter = 'D'`)).toHaveLength(1)
    await post('left-behind', { chapter: 'D' }).expect(201)
  })

  it('leaves no claim behind when its answer could not be kept', async () => {
    await app.app.db.execute(sql`alter table idempotency_keys add constraint no_answers check (status is null) not valid`)
    try {
      await post('not-kept', { chapter: 'F' }).expect(201)
      expect(await rows(app, `select 1 from idempotency_keys where key = 'not-kept'`)).toEqual([])
    } finally {
      await app.app.db.execute(sql`alter table idempotency_keys drop constraint no_answers`)
    }
  })

  it('is each member’s own', async () => {
    await post('the-same-key', { guideSlug: 'sway-bars' }).expect(201)
    const tomasz = await app.signedIn('tomasz')
    await tomasz.post('/api/edits').set('Idempotency-Key', 'the-same-key').send({ chapter: 'A' }).expect(201)
    await beginEdit(tomasz, { chapter: 'B' })
  })
})
