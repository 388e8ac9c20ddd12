import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sql } from 'drizzle-orm'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'
import { GOOD_PASSWORD, behindProxy, from, joinAndVerify, tokenIn } from './people-support.ts'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp(behindProxy)
})
afterAll(() => app.stop())

const countMembers = async () => Number((await app.app.db.execute(sql`select count(*) from members`)).rows[0]?.count)

describe('joining', () => {
  it('goes from the form over the mail to signing in and out', async () => {
    const agent = app.agent()
    const person = { name: 'Ilse Brandt-Mwangi', email: 'ilse@marsh.example', password: GOOD_PASSWORD }
    const joined = await agent.post('/join').set(from(1)).type('form').send(person).expect(303)
    expect(joined.headers.location).toBe('/join?said=joined')
    expect(joined.headers['set-cookie']).toBeUndefined()

    await agent.post('/sign-in').set(from(1)).type('form').send({ email: person.email, password: person.password }).expect(303)
    expect((await agent.get('/api/session')).body.member).toMatchObject({ name: person.name, role: 'member', verified: false })

    const token = await tokenIn(app, person.email)
    const verified = await agent.post('/verify').set(from(1)).type('form').send({ token }).expect(303)
    expect(verified.headers.location).toBe('/you?said=verified')
    expect((await agent.get('/api/session')).body.member).toMatchObject({ verified: true })

    const out = await agent.post('/sign-out').expect(303)
    expect(out.headers['clear-site-data']).toBe('"cache"')
    expect((await agent.get('/api/session')).body).toEqual({ member: null })
  })

  it('sends the link from the configured origin, whatever the Host header says', async () => {
    const email = 'hosty@marsh.example'
    await app.agent().post('/api/members').set({ ...from(2), Host: 'else.example', 'X-Forwarded-Host': 'else.example' })
      .send({ name: 'Hosty', email, password: GOOD_PASSWORD }).expect(201)
    const [mail] = await app.mailTo(email)
    expect(mail?.text).toContain(`${app.app.config.origin}/verify?token=`)
    expect(mail?.text).not.toContain('else.example')
  })

  it('a link works once, and only the newest does', async () => {
    const email = 'newest@marsh.example'
    await app.agent().post('/api/members').set(from(3)).send({ name: 'Newest', email, password: GOOD_PASSWORD }).expect(201)
    const older = await tokenIn(app, email)
    await app.agent().post('/api/verification-mails').set(from(3)).send({ email }).expect(202)
    const newer = await tokenIn(app, email)
    expect(newer).not.toBe(older)
    await app.agent().post('/api/verifications').set(from(3)).send({ token: older }).expect(422)
    await app.agent().post('/api/verifications').set(from(3)).send({ token: newer }).expect(204)
    await app.agent().post('/api/verifications').set(from(3)).send({ token: newer }).expect(422)
  })

  it('a link stops working after 24 hours', async () => {
    const email = 'late@marsh.example'
    await app.agent().post('/api/members').set(from(4)).send({ name: 'Late', email, password: GOOD_PASSWORD }).expect(201)
    await app.app.db.execute(sql`update sign_in_tokens set expires_at = expires_at - interval '24 hours' where email = ${email}`)
    await app.agent().post('/api/verifications').set(from(4)).send({ token: await tokenIn(app, email) }).expect(422)
  })

  it('looking at a link does not use it up, and a link for one thing is none for the other', async () => {
    const email = 'looker@marsh.example'
    await app.agent().post('/api/members').set(from(5)).send({ name: 'Looker', email, password: GOOD_PASSWORD }).expect(201)
    const token = await tokenIn(app, email)
    await app.agent().get(`/verify?token=${token}`)
    await app.agent().post('/api/password-resets/redeem').set(from(5)).send({ token, password: GOOD_PASSWORD }).expect(422)
    await app.agent().post('/api/verifications').set(from(5)).send({ token }).expect(204)
  })

  it('keeps the secret of a link only as its SHA-256', async () => {
    const email = 'hashed@marsh.example'
    await app.agent().post('/api/members').set(from(6)).send({ name: 'Hashed', email, password: GOOD_PASSWORD }).expect(201)
    const token = await tokenIn(app, email)
    expect(token).toMatch(/^[\w-]{43}$/)
    const { rows } = await app.app.db.execute(sql`
      select secret_hash = encode(sha256(${token}::bytea), 'hex') as hashed, secret_hash from sign_in_tokens where email = ${email}`)
    expect(rows).toHaveLength(1)
    expect(rows[0]?.hashed).toBe(true)
  })
})

describe('whether an address is in the book', () => {
  const stable = (headers: Record<string, unknown>) =>
    Object.fromEntries(Object.entries(headers).filter(([name]) => !['date', 'x-request-id'].includes(name)))

  it.each([
    ['/api/members', (email: string) => ({ name: 'Somebody', email, password: GOOD_PASSWORD })],
    ['/api/password-resets', (email: string) => ({ email })],
    ['/api/verification-mails', (email: string) => ({ email })],
    ['/join', (email: string) => ({ name: 'Somebody', email, password: GOOD_PASSWORD })],
    ['/forgotten', (email: string) => ({ email })],
  ])('%s answers the same for both', async (path, body) => {
    const known = DEMO_PASSWORDS.priya!.email
    const unknown = `nobody-${path.replace(/\W/g, '')}@marsh.example`
    const ask = (email: string, network: number) =>
      app.agent().post(path).set(from(network)).type(path.startsWith('/api') ? 'json' : 'form').send(body(email))
    await app.app.db.execute(sql`delete from rate_limits`)
    const [one, other] = [await ask(known, 11), await ask(unknown, 12)]
    expect([one.status, one.text, stable(one.headers)]).toEqual([other.status, other.text, stable(other.headers)])
    expect(one.status).toBeLessThan(400)
  })

  it('signing in fails the same way for both', async () => {
    const attempt = (email: string) => app.agent().post('/api/session').set(from(13)).send({ email, password: 'not the one at all' })
    const [one, other] = [await attempt(DEMO_PASSWORDS.tomasz!.email), await attempt('nobody-there@marsh.example')]
    expect([one.status, other.status]).toEqual([401, 401])
    const same = ({ instance: _instance, ...rest }: Record<string, unknown>) => rest
    expect(same(one.body)).toEqual(same(other.body))
    expect(stable(one.headers)).toEqual(stable(other.headers))
  })

  it('signing in is as much work for both', async () => {
    await app.app.db.execute(sql`delete from rate_limits`)
    const work = { known: [] as number[], unknown: [] as number[] }
    const keys = Object.keys(DEMO_PASSWORDS)
    for (let i = 0; i < 12; i += 1) {
      for (const kind of ['known', 'unknown'] as const) {
        const email = kind === 'known' ? DEMO_PASSWORDS[keys[i % keys.length]!]!.email : `nobody-${i}@marsh.example`
        const before = process.cpuUsage()
        await app.agent().post('/api/session').set(from(100 + i)).send({ email, password: 'not the one at all' }).expect(401)
        const { user, system } = process.cpuUsage(before)
        work[kind].push(user + system)
      }
    }
    // Processor time, not the clock: what else the machine does must not decide. A hash is most of the work, so without the
    // stand-in hash the unknown address would take less than half.
    const ratio = Math.min(...work.unknown) / Math.min(...work.known)
    expect(ratio).toBeGreaterThan(0.6)
    expect(ratio).toBeLessThan(1.6)
  })

  it.each([
    ['/api/password-resets', (email: string) => ({ email }), 150],
    ['/api/members', (email: string) => ({ name: 'Somebody', email, password: GOOD_PASSWORD }), 400],
  ])('%s answers no sooner for an unknown address', async (path, body, least) => {
    await app.app.db.execute(sql`delete from rate_limits`)
    for (const email of [DEMO_PASSWORDS.imre!.email, `nobody-slow-${least}@marsh.example`]) {
      const began = performance.now()
      await app.agent().post(path).set(from(14)).send(body(email))
      expect(performance.now() - began).toBeGreaterThan(least - 2)
    }
  })

  it('whoever has it learns by mail that somebody tried to join with it, and nothing is changed', async () => {
    await app.app.db.execute(sql`delete from rate_limits`)
    const { email, password } = DEMO_PASSWORDS.odile!
    const before = await countMembers()
    await app.agent().post('/api/members').set(from(15)).send({ name: 'Not Odile', email: email.toUpperCase(), password: GOOD_PASSWORD }).expect(201)
    expect((await app.mailTo(email))[0]?.subject).toContain('You are in the book already')
    expect(await countMembers()).toBe(before)
    await app.agent().post('/api/session').set(from(15)).send({ email, password }).expect(200)
  })

  it('is decided once when two people join with it at the same time', async () => {
    const email = 'twice@marsh.example'
    const answers = await Promise.all(
      [16, 17, 18].map((network) =>
        app.agent().post('/api/members').set(from(network)).send({ name: `Twice ${network}`, email, password: GOOD_PASSWORD }),
      ),
    )
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201])
    const { rows } = await app.app.db.execute(sql`select 1 from members where email = ${email}`)
    expect(rows).toHaveLength(1)
  })
})

describe('what is typed', () => {
  it.each([
    ['a name with a line break', { name: 'Eve\r\nBcc: else@marsh.example' }, 'name'],
    ['a name with a hidden mark', { name: 'Wanda\u202eOkonjo' }, 'name'],
    ['a name of one letter', { name: 'E' }, 'name'],
    ['an address with a line break', { email: 'eve@marsh.example\r\nBcc: else@marsh.example' }, 'email'],
    ['two addresses', { email: 'eve@marsh.example,else@marsh.example' }, 'email'],
    ['no address', { email: 'eve' }, 'email'],
    ['an address beyond ASCII', { email: 'ève@marsh.example' }, 'email'],
    ['no password', { password: undefined }, 'password'],
    ['a password that is a list', { password: ['a', 'b'] }, 'password'],
    ['a password that is too short', { password: 'quiet otters 1' }, 'password'],
    ['a password that is too long', { password: 'wet clay '.repeat(14) + 'abc' }, 'password'],
    ['a field that is none', { role: 'admin' }, 'role'],
    ['a field that would reach the prototype', JSON.parse('{"__proto__":{"role":"admin"},"constructor":1}') as object, 'constructor'],
  ])('is refused at the field: %s', async (_what, change, field) => {
    const body = { name: 'Eve Field', email: 'eve@marsh.example', password: GOOD_PASSWORD, ...change }
    const answer = await app.agent().post('/api/members').set(from(20)).send(body).expect(422)
    expect(answer.headers['content-type']).toContain('application/problem+json')
    expect((answer.body.errors as { field: string }[]).map((error) => error.field)).toContain(field)
    expect(({} as { role?: string }).role).toBeUndefined()
  })

  it.each([
    [15, 201],
    [64, 201],
    [128, 201],
    [14, 422],
    [129, 422],
  ])('a password of %i characters answers %i', async (length, status) => {
    const password = Array.from({ length }, (_, i) => String.fromCodePoint(0x4e00 + i * 7)).join('')
    await app.agent().post('/api/members').set(from(30 + length)).send({ name: 'Length', email: `l${length}@marsh.example`, password }).expect(status)
  })

  it('a password counts to its last byte', async () => {
    const start = 'the wind is from the marsh and the clay is wet and the jump is long okay'
    expect(start).toHaveLength(72)
    const email = 'bytes@marsh.example'
    await joinAndVerify(app, { name: 'Bytes', email, password: `${start}x` }, 41)
    await app.agent().post('/api/session').set(from(41)).send({ email, password: `${start}y` }).expect(401)
    await app.agent().post('/api/session').set(from(41)).send({ email, password: start }).expect(401)
    await app.agent().post('/api/session').set(from(41)).send({ email, password: `${start}x` }).expect(200)
  })

  it('every mail has one recipient and the fixed headers', async () => {
    await joinAndVerify(app, { name: 'Nils "Bcc: x" <y@z.example>', email: 'nils@marsh.example' }, 42)
    const mail = app.app.mailbox!.list().find(({ to }) => to.includes('nils@marsh.example'))!
    expect(mail.to).toEqual(['nils@marsh.example'])
    expect(mail.headers.map(({ name }) => name).sort()).toEqual([
      'auto-submitted', 'content-transfer-encoding', 'content-type', 'date', 'from', 'message-id', 'mime-version', 'subject', 'to',
    ])
  })
})
