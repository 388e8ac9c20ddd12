import argon2 from 'argon2'
import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'
import { behindProxy, from, joinAndVerify, tokenIn } from './people-support.ts'

const NEW_PASSWORD = 'two clicks up on the rear tower'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp(behindProxy)
})
afterAll(() => app.stop())
beforeEach(() => app.app.db.execute(sql`delete from rate_limits`))

const person = (n: number) => ({ name: `Person ${n}`, email: `person${n}@marsh.example`, password: `person ${n} waters the track` })
const signIn = (email: string, password: string) => app.agent().post('/api/session').send({ email, password })

describe('a forgotten password', () => {
  it('is set anew by the link, which signs nobody in and ends every session', async () => {
    const { email, password, name } = person(1)
    const old = await joinAndVerify(app, { name, email, password })
    await app.agent().post('/forgotten').type('form').send({ email }).expect(303)
    const token = await tokenIn(app, email)
    const answer = await app.agent().post('/reset').type('form').send({ token, password: NEW_PASSWORD }).expect(303)
    expect(answer.headers.location).toBe('/sign-in?said=password-set')
    expect(answer.headers['set-cookie']).toBeUndefined()
    expect((await old.get('/api/session')).body.member).toBeNull()
    await signIn(email, password).expect(401)
    await signIn(email, NEW_PASSWORD).expect(200)
    const [told] = await app.mailTo(email)
    expect(told?.subject).toContain('Your password is new')
    expect(told?.text).not.toContain(NEW_PASSWORD)
  })

  it('is set once, however many use the link at the same time', async () => {
    const { email, password, name } = person(2)
    await joinAndVerify(app, { name, email, password })
    await app.agent().post('/api/password-resets').send({ email }).expect(202)
    const token = await tokenIn(app, email)
    const answers = await Promise.all(
      Array.from({ length: 20 }, (_, i) =>
        app.agent().post('/api/password-resets/redeem').set(from(50 + i)).send({ token, password: `number ${i} held the wheel` }),
      ),
    )
    expect(answers.filter(({ status }) => status === 204)).toHaveLength(1)
    expect(answers.filter(({ status }) => status === 422)).toHaveLength(19)
    await signIn(email, `number ${answers.findIndex(({ status }) => status === 204)} held the wheel`).expect(200)
  })

  it('the newest link is the only one, and it works for 30 minutes', async () => {
    const { email } = DEMO_PASSWORDS.priya!
    await app.agent().post('/api/password-resets').send({ email }).expect(202)
    const older = await tokenIn(app, email)
    await app.agent().post('/api/password-resets').send({ email }).expect(202)
    const newer = await tokenIn(app, email)
    const redeem = (token: string) => app.agent().post('/api/password-resets/redeem').send({ token, password: NEW_PASSWORD })
    await redeem(older).expect(422)
    await app.app.db.execute(sql`update sign_in_tokens set expires_at = expires_at - interval '30 minutes' where email = ${email}`)
    await redeem(newer).expect(422)
    await redeem('made-up').expect(422)
  })

  it('a refused password does not cost the link', async () => {
    const { email } = DEMO_PASSWORDS.tomasz!
    await app.agent().post('/api/password-resets').send({ email }).expect(202)
    const token = await tokenIn(app, email)
    const redeem = (password: string) => app.agent().post('/api/password-resets/redeem').send({ token, password })
    const refused = await redeem('too short').expect(422)
    expect(refused.body.errors[0]).toMatchObject({ field: 'password' })
    await redeem(DEMO_PASSWORDS.tomasz!.password).expect(204)
  })

  it('a link dies when the address it was sent to is no longer the member’s', async () => {
    const { email, password, name } = person(3)
    await joinAndVerify(app, { name, email, password })
    await app.agent().post('/api/password-resets').send({ email }).expect(202)
    const token = await tokenIn(app, email)
    await app.app.db.execute(sql`update members set email = 'moved@marsh.example' where email = ${email}`)
    await app.agent().post('/api/password-resets/redeem').send({ token, password: NEW_PASSWORD }).expect(422)
  })

  it('the link also confirms the address, since it came by mail', async () => {
    const { email, password, name } = person(4)
    await app.agent().post('/api/members').send({ name, email, password }).expect(201)
    await app.agent().post('/api/password-resets').send({ email }).expect(202)
    await app.agent().post('/api/password-resets/redeem').send({ token: await tokenIn(app, email), password: NEW_PASSWORD }).expect(204)
    expect((await signIn(email, NEW_PASSWORD)).body.member).toMatchObject({ verified: true })
  })
})

describe('changing the password', () => {
  it('needs the current one, ends the other sessions and kills every link', async () => {
    const { email, password, name } = person(5)
    const here = await joinAndVerify(app, { name, email, password })
    const elsewhere = app.agent()
    await elsewhere.post('/api/session').send({ email, password }).expect(200)
    await app.agent().post('/api/password-resets').send({ email }).expect(202)
    const token = await tokenIn(app, email)

    const wrong = await here.put('/api/password').send({ currentPassword: 'not this one at all', newPassword: NEW_PASSWORD }).expect(403)
    expect(wrong.body).toMatchObject({ code: 'wrong_password', errors: [{ field: 'currentPassword' }] })
    await here.put('/api/password').send({ newPassword: NEW_PASSWORD }).expect(422)
    await here.put('/api/password').send({ currentPassword: password, newPassword: password }).expect(422)
    expect((await elsewhere.get('/api/session')).body.member).not.toBeNull()

    const before = (await here.get('/api/sessions')).body.sessions as { handle: string; isThisOne: boolean }[]
    await here.put('/api/password').send({ currentPassword: password, newPassword: NEW_PASSWORD }).expect(204)
    const after = (await here.get('/api/sessions')).body.sessions as { handle: string; isThisOne: boolean }[]
    expect(after).toHaveLength(1)
    expect(before.map(({ handle }) => handle)).not.toContain(after[0]!.handle)
    expect((await elsewhere.get('/api/session')).body.member).toBeNull()
    await app.agent().post('/api/password-resets/redeem').send({ token, password: 'a third one that is fine' }).expect(422)
    await signIn(email, password).expect(401)
    await signIn(email, NEW_PASSWORD).expect(200)
    const [told] = await app.mailTo(email)
    expect(told?.subject).toContain('Your password was changed')
    expect(told?.text).not.toContain(NEW_PASSWORD)
  })

  it('counts wrong current passwords', async () => {
    const { email, password, name } = person(6)
    const here = await joinAndVerify(app, { name, email, password })
    const attempt = () => here.put('/api/password').send({ currentPassword: 'not this one at all', newPassword: NEW_PASSWORD })
    for (let i = 0; i < 10; i += 1) await attempt().expect(403)
    const refused = await attempt().expect(429)
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0)
  })

  it('is for who has signed in', async () => {
    await app.agent().put('/api/password').send({ currentPassword: 'x', newPassword: NEW_PASSWORD }).expect(401)
  })
})

describe('a password that changes at the same moment', () => {
  /** Changes the row as a reset by mail does, and commits only once `meanwhile` waits for it. */
  async function whileReset(email: string, meanwhile: () => PromiseLike<{ status: number }>): Promise<number> {
    const { pool } = app.app.connection
    const other = await pool.connect()
    try {
      const hash = await app.app.passwords.hash(NEW_PASSWORD)
      await other.query('begin')
      await other.query('update members set password_hash = $1 where email = $2', [hash, email])
      await other.query('delete from sessions where member_id = (select id from members where email = $1)', [email])
      const answer = Promise.resolve(meanwhile())
      await expect
        .poll(async () => (await pool.query(
          `select 1 from pg_stat_activity where datname = current_database() and wait_event_type = 'Lock'`,
        )).rowCount, { timeout: 10_000 })
        .toBeGreaterThan(0)
      await other.query('commit')
      return (await answer).status
    } finally {
      other.release()
    }
  }

  it('wins over a sign-in with the old one that is under way', async () => {
    const { email, password, name } = person(7)
    await joinAndVerify(app, { name, email, password })
    expect(await whileReset(email, () => signIn(email, password))).toBe(401)
    const { rows } = await app.app.db.execute(sql`
      select 1 from sessions where member_id = (select id from members where email = ${email})`)
    expect(rows).toEqual([])
    await signIn(email, NEW_PASSWORD).expect(200)
  })

  it('wins over a change of the password that is under way', async () => {
    const { email, password, name } = person(8)
    const here = await joinAndVerify(app, { name, email, password })
    const change = { currentPassword: password, newPassword: 'the third heat starts at noon' }
    expect(await whileReset(email, () => here.put('/api/password').send(change))).toBe(403)
    await signIn(email, change.newPassword).expect(401)
    await signIn(email, NEW_PASSWORD).expect(200)
  })
})

describe('stored passwords', () => {
  it('are argon2id with the full work, every one', async () => {
    const { rows } = await app.app.db.execute(sql`select password_hash from members where password_hash is not null`)
    expect(rows.length).toBeGreaterThan(4)
    for (const row of rows) expect(row.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
  })

  it('made with less work are made anew at the next sign-in', async () => {
    const { email, password } = DEMO_PASSWORDS.odile!
    const weak = await argon2.hash(password, { type: argon2.argon2id, memoryCost: 8_192, timeCost: 1, parallelism: 1 })
    await app.app.db.execute(sql`update members set password_hash = ${weak} where email = ${email}`)
    await signIn(email, password).expect(200)
    const { rows } = await app.app.db.execute(sql`select password_hash from members where email = ${email}`)
    expect(rows[0]?.password_hash).toMatch(/\$m=19456,t=2,p=1\$/)
    await signIn(email, password).expect(200)
  })
})

describe('the answers of the API', () => {
  it('hold no address but the own one on the own page, no hash and no session id', async () => {
    const wanda = await app.signedIn('wanda')
    const paths = ['/api/session', '/api/sessions', '/api/members', '/api/guides', '/api/members?page=1']
    const texts = await Promise.all(paths.map(async (path) => (await wanda.get(path).expect(200)).text))
    for (const text of texts) {
      expect(text).not.toMatch(/argon2|password|@saltmarsh\.example|secret/i)
    }
  })
})
