import { sql } from 'drizzle-orm'
import supertest from 'supertest'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { createApp } from '#server/app.ts'
import { ensureDemoSignIns } from '#server/people/index.ts'
import { createTestApp, DEMO_PASSWORDS, testConfig, type TestApp } from '../support/test-app.ts'
import { GOOD_PASSWORD } from './people-support.ts'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp()
})
afterAll(() => app.stop())
beforeEach(() => app.app.db.execute(sql`delete from rate_limits`))

/** The attributes of the field with this name, as they stand in the page. */
const field = (html: string, name: string) => new RegExp(`<(?:input|select)[^>]*\\bname="${name}"[^>]*>`).exec(html)?.[0] ?? ''

describe('the pages of a visitor', () => {
  it.each(['/sign-in', '/join', '/forgotten', '/reset?token=x', '/verify?token=x'])('%s is shown, kept nowhere and sets no cookie', async (path) => {
    const { headers, text } = await app.agent().get(path).expect(200)
    expect(headers['cache-control']).toContain('no-store')
    expect(headers['set-cookie']).toBeUndefined()
    expect(text).toContain('<h1')
    expect(text).not.toMatch(/ style="/)
  })

  it.each(['/reset?token=x', '/verify?token=x'])('%s tells no other site the secret in its address', async (path) => {
    expect((await app.agent().get(path)).headers['referrer-policy']).toBe('same-origin')
  })

  it.each([
    ['/sign-in', 'email', 'email'],
    ['/sign-in', 'password', 'current-password'],
    ['/join', 'email', 'email'],
    ['/join', 'password', 'new-password'],
    ['/reset?token=x', 'password', 'new-password'],
  ])('%s tells password managers what %s is', async (path, name, autocomplete) => {
    const html = (await app.agent().get(path)).text
    expect(field(html, name)).toContain(`autocomplete="${autocomplete}"`)
    if (name === 'password') expect(field(html, name)).toContain('type="password"')
  })

  it('offers another ready passphrase each time', async () => {
    const words = async () => /class="ready-pass"[^>]*>([^<]+)</.exec((await app.agent().get('/join')).text)?.[1]
    const [one, other] = [await words(), await words()]
    expect(one?.split(' ').length).toBeGreaterThanOrEqual(5)
    expect(one).not.toBe(other)
  })

  it.each(['/you', '/members'])('%s asks to sign in first and comes back', async (path) => {
    const answer = await app.agent().get(path)
    expect([302, 303, 307]).toContain(answer.status)
    expect(answer.headers.location).toBe(`/sign-in?next=${encodeURIComponent(path)}`)
  })
})

describe('a refused form', () => {
  it('shows what to put right and keeps what was typed, but never a password', async () => {
    const typed = { name: 'Ilse Brandt', email: 'no address', password: 'short one' }
    const { text, headers } = await app.agent().post('/join').type('form').send(typed).expect(422)
    expect(headers['cache-control']).toContain('no-store')
    expect(field(text, 'name')).toContain('value="Ilse Brandt"')
    expect(field(text, 'email')).toContain('value="no address"')
    expect(field(text, 'email')).toContain('aria-invalid="true"')
    expect(field(text, 'email')).toMatch(/aria-describedby="email-error/)
    expect(text).toContain('href="#email"')
    expect(text).not.toContain('short one')
  })

  it('after a wrong password keeps the address and the way back', async () => {
    const { email } = DEMO_PASSWORDS.priya!
    const typed = { email, password: 'not the one at all', next: '/guides' }
    const { text, headers } = await app.agent().post('/sign-in').type('form').send(typed).expect(401)
    expect(field(text, 'email')).toContain(`value="${email}"`)
    expect(field(text, 'next')).toContain('value="/guides"')
    expect(text).not.toContain('not the one at all')
    expect(headers['set-cookie']).toBeUndefined()
  })

  it('after too many tries says how long to wait', async () => {
    const attempt = () => app.agent().post('/sign-in').type('form').send({ email: 'nobody@marsh.example', password: 'not the one' })
    for (let i = 0; i < 5; i += 1) await attempt().expect(401)
    const { headers, text } = await attempt().expect(429)
    expect(Number(headers['retry-after'])).toBeGreaterThan(0)
    expect(text).toMatch(/Try again in \d+ minutes/)
  })

  it('a link that no longer works says so on its page', async () => {
    for (const [path, fields] of [['/verify', { token: 'old' }], ['/reset', { token: 'old', password: GOOD_PASSWORD }]] as const) {
      expect((await app.agent().post(path).type('form').send(fields).expect(422)).text).toContain('does not work any more')
    }
  })
})

describe('signing in by the form', () => {
  it.each([
    ['/guides?chapter=B', '/guides?chapter=B'],
    ['//else.example', '/'],
    ['/\\else.example', '/'],
    ['https://else.example/', '/'],
    [undefined, '/'],
  ])('with next %j goes on to %s', async (next, location) => {
    const answer = await app.agent().post('/sign-in').type('form').send({ ...DEMO_PASSWORDS.priya, ...(next === undefined ? {} : { next }) }).expect(303)
    expect(answer.headers.location).toBe(location)
  })

  it('from another site is refused', async () => {
    for (const forged of [{ 'Sec-Fetch-Site': 'cross-site' }, { Origin: 'https://else.example' }, { Origin: 'null' }]) {
      const answer = await app.agent().post('/sign-in').set(forged).type('form').send(DEMO_PASSWORDS.priya)
      expect(answer.status).toBe(403)
      expect(answer.headers['set-cookie']).toBeUndefined()
    }
  })
})

describe('the own page', () => {
  it('shows who one is, where one is signed in and the way out', async () => {
    const { text, headers } = await (await app.signedIn('priya')).get('/you').expect(200)
    expect(headers['cache-control']).toBe('private, no-store')
    expect(text).toContain('Priya Haldane')
    expect(text).toContain(DEMO_PASSWORDS.priya!.email)
    expect(text).toContain('action="/sign-out"')
    expect(text).toContain('(this one)')
    expect(field(text, 'currentPassword')).toContain('autocomplete="current-password"')
    expect(field(text, 'newPassword')).toContain('autocomplete="new-password"')
    expect(text).not.toMatch(/argon2/)
  })

  it('shows a wrong current password at its field', async () => {
    const typed = { currentPassword: 'not the one at all', newPassword: GOOD_PASSWORD }
    const { text } = await (await app.signedIn('priya')).post('/you/password').type('form').send(typed).expect(403)
    expect(field(text, 'currentPassword')).toContain('aria-invalid="true"')
    expect(text).not.toContain(GOOD_PASSWORD)
  })
})

describe('the members', () => {
  it('are shown to an admin, with no address', async () => {
    const { text } = await (await app.signedIn('wanda')).get('/members').expect(200)
    expect(text).toContain('Priya Haldane')
    expect(text).not.toContain('@saltmarsh.example')
    await (await app.signedIn('imre')).get('/members').expect(403)
  })
})

describe('the mailbox', () => {
  it('shows the captured mail, its link working', async () => {
    const { email } = DEMO_PASSWORDS.odile!
    await app.agent().post('/forgotten').type('form').send({ email }).expect(303)
    await app.mailTo(email)
    const list = await app.agent().get('/mailbox').expect(200)
    const href = /href="(\/mailbox\/\d+)"/.exec(list.text)?.[1]
    const mail = await app.agent().get(href!).expect(200)
    expect(mail.text).toMatch(/<a href="\/reset\?token=[\w-]{43}"/)
    await app.agent().get('/mailbox/9999').expect(404)
  })

  it('does not exist in production', async () => {
    const config = testConfig(app.databaseUrl, {
      APP_MODE: 'production', SESSION_SECRET: 'a secret of the test, long enough for it', ORIGIN: 'https://book.example',
      SMTP_URL: 'smtp://127.0.0.1:1', TRUST_PROXY: '127.0.0.1',
    })
    const production = await createApp(config)
    try {
      for (const path of ['/mailbox', '/mailbox/1', '/api/mailbox']) await supertest(production.express).get(path).expect(404)
      await expect(ensureDemoSignIns(production.app)).rejects.toThrow('never')
    } finally {
      await production.close()
    }
  })
})
