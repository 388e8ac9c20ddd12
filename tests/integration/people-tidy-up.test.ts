import { afterAll, beforeAll, expect, it } from 'vitest'
import { createTidyUp, type TidyUp } from '#server/maintenance/tidy.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'

let app: TestApp
let tidyUp: TidyUp
beforeAll(async () => {
  app = await createTestApp()
  tidyUp = createTidyUp(app.app)
})
afterAll(async () => {
  await tidyUp.close()
  await app.stop()
})

const query = (text: string) => app.app.connection.pool.query<{ name: string }>(text)

async function fill(): Promise<void> {
  await query(`
    delete from idempotency_keys; delete from rate_limits; delete from sign_in_tokens; delete from outbox; delete from sessions;
    insert into idempotency_keys (member_id, key, request_hash, created_at)
      select id, v.key, '', now() - v.age from members, (values ('old-request', interval '25 hours'), ('new-request', interval '23 hours')) v (key, age)
      where members.key = 'priya';
    insert into rate_limits (key, points, expire) values
      ('old', 1, extract(epoch from now()) * 1000 - 1000), ('new', 1, extract(epoch from now()) * 1000 + 60000), ('endless', 1, null);
    insert into sign_in_tokens (member_id, purpose, email, secret_hash, expires_at, used_at)
      select id, 'reset', 'x@marsh.example', v.name, now() + v.expires, now() + v.used from members, (values
        ('old-used', interval '0', interval '-8 days'), ('old-expired', interval '-8 days', null),
        ('new-used', interval '-8 days', interval '-6 days'), ('new-expired', interval '-6 days', null), ('good', interval '1 hour', null)
      ) v (name, expires, used) where members.key = 'priya';
    insert into outbox (recipient, subject, body, message_id, created_at, next_attempt_at, sent_at, dead_at)
      select 'x@marsh.example', v.name, '', v.name, now() - interval '40 days', now() + interval '1 day', now() + v.sent, now() + v.dead from (values
        ('old-sent', interval '-31 days', null), ('old-dead', null, interval '-31 days'),
        ('new-sent', interval '-29 days', null), ('waiting', null, null)) v (name, sent, dead);
    insert into sessions (sid, sess, expire) values ('old', '{}', now() - interval '1 second'), ('new', '{}', now() + interval '1 hour')`)
}

it('deletes what is past its time and nothing else', async () => {
  await fill()
  expect(await tidyUp.run()).toEqual({ idempotency_keys: 1, rate_limits: 1, sign_in_tokens: 2, outbox: 2, sessions: 1 })
  const { rows } = await query(`
    select key as name from idempotency_keys union all select key from rate_limits union all select secret_hash from sign_in_tokens
    union all select subject from outbox union all select sid from sessions`)
  expect(rows.map(({ name }) => name).sort()).toEqual(
    ['endless', 'good', 'new', 'new', 'new-expired', 'new-request', 'new-sent', 'new-used', 'waiting'],
  )
})

it('is left alone while another node is at it', async () => {
  await fill()
  const other = await app.app.connection.pool.connect()
  try {
    await other.query('select pg_advisory_lock(7264011)')
    expect(await tidyUp.run()).toEqual({})
    await other.query('select pg_advisory_unlock(7264011)')
  } finally {
    other.release()
  }
  expect(await tidyUp.run()).toMatchObject({ sessions: 1 })
})
