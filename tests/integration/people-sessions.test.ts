import { request } from 'node:http'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sql } from 'drizzle-orm'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'

const HOUR = 3_600_000
let app: TestApp
let now = Date.now()
beforeAll(async () => {
  app = await createTestApp({ clock: () => new Date(now) })
})
afterAll(() => app.stop())

const cookieOf = (headers: Record<string, unknown>) => (headers['set-cookie'] as string[] | undefined)?.[0]?.split(';')[0]
const whoIs = async (cookie: string, server = app) =>
  ((await server.agent().get('/api/session').set('Cookie', cookie)).body.member as { name: string; role: string } | null)?.name ?? null
const signIn = async (key: string, cookie?: string) => {
  const request = app.agent().post('/api/session')
  if (cookie !== undefined) request.set('Cookie', cookie)
  return cookieOf((await request.send(DEMO_PASSWORDS[key]).expect(200)).headers)!
}

describe('a session', () => {
  it('is begun by signing in and by nothing else', async () => {
    for (const path of ['/api/session', '/api/health', '/api/guides']) {
      expect((await app.agent().get(path)).headers['set-cookie']).toBeUndefined()
    }
    const wrong = await app.agent().post('/api/session').send({ email: 'nobody@marsh.example', password: 'not the one' })
    expect(wrong.headers['set-cookie']).toBeUndefined()
  })

  it('has a cookie that no script reads and no other site sends', async () => {
    const { headers } = await app.agent().post('/api/session').send(DEMO_PASSWORDS.priya).expect(200)
    const [cookie] = headers['set-cookie'] as unknown as string[]
    expect(cookie).toMatch(/^cc=/)
    expect(cookie).toMatch(/; HttpOnly/)
    expect(cookie).toMatch(/; SameSite=Lax/)
    expect(cookie).toMatch(/; Path=\//)
    expect(cookie).not.toMatch(/Domain/i)
  })

  it('gets a new id at signing in, so that a planted one is worth nothing', async () => {
    const planted = await signIn('tomasz')
    const own = await signIn('priya', planted)
    expect(own).not.toBe(planted)
    expect(await whoIs(planted)).toBeNull()
    expect(await whoIs(own)).toBe('Priya Haldane')
    expect(await whoIs('cc=s%3Amade-up.c2lnbmF0dXJl')).toBeNull()
  })

  it('ends at signing out, row and all', async () => {
    const cookie = await signIn('priya')
    await app.agent().delete('/api/session').set('Cookie', cookie).expect(204)
    expect(await whoIs(cookie)).toBeNull()
    await app.agent().get('/api/sessions').set('Cookie', cookie).expect(401)
  })

  it('is not brought back by a request that was under way when it ended', async () => {
    const cookie = await signIn('tomasz')
    await Promise.all([
      ...Array.from({ length: 8 }, () => app.agent().get('/api/session').set('Cookie', cookie)),
      app.agent().delete('/api/session').set('Cookie', cookie),
      ...Array.from({ length: 8 }, () => app.agent().get('/api/session').set('Cookie', cookie)),
    ])
    expect(await whoIs(cookie)).toBeNull()
  })

  it.each([
    ['priya', 30 * 24],
    ['imre', 12],
    ['wanda', 12],
  ])('of %s ends %i hours after signing in, however busy', async (key, hours) => {
    const began = now
    const cookie = await signIn(key)
    now = began + hours * HOUR - 1
    expect(await whoIs(cookie)).not.toBeNull()
    now = began + hours * HOUR + 1
    expect(await whoIs(cookie)).toBeNull()
    now = began
    expect(await whoIs(cookie)).toBeNull()
  })

  it.each([
    ['priya', 7 * 24],
    ['odile', 2],
  ])('of %s ends after %i hours without a request, and each request begins them anew', async (key, hours) => {
    const cookie = await signIn(key)
    const idleEnds = async () => {
      const { rows } = await app.app.db.execute(sql`
        select extract(epoch from max(expire)::timestamptz - now())::float8 / 3600 as hours from sessions
        where member_id = (select id from members where key = ${key})`)
      return Number(rows[0]?.hours)
    }
    expect(await idleEnds()).toBeCloseTo(hours, 1)
    await app.app.db.execute(sql`update sessions set expire = expire - interval '1 hour'`)
    expect(await whoIs(cookie)).not.toBeNull()
    expect(await idleEnds()).toBeCloseTo(hours, 1)
    await app.app.db.execute(sql`update sessions set expire = now() - interval '1 second'`)
    expect(await whoIs(cookie)).toBeNull()
  })

  it('holds on every node of one database', async () => {
    const cookie = await signIn('priya')
    const other = await createTestApp({ databaseUrl: app.databaseUrl })
    try {
      expect(await whoIs(cookie, other)).toBe('Priya Haldane')
      await other.agent().delete('/api/session').set('Cookie', cookie).expect(204)
      expect(await whoIs(cookie)).toBeNull()
    } finally {
      await other.stop()
    }
  })
})

describe('a form that is posted after the session ended', () => {
  it('answers with the sign-in page and what was typed, as text, and a wrong password does not lose it', async () => {
    const priya = app.agent()
    await priya.post('/api/session').send(DEMO_PASSWORDS.priya).expect(200)
    const { body: edit } = await priya.post('/api/edits').send({ chapter: 'C' }).expect(201)
    await app.app.db.execute(sql`delete from sessions`)
    const typed = { version: '1', title: 'Typed for an hour', body: 'Long.</textarea><script>alert(1)</script>', password: 'not to be shown' }
    const answer = await priya.post(`/write/${edit.id}`).type('form').send(typed).expect(401)
    expect(answer.text).toContain('What you typed; it was not sent')
    expect(answer.text).toContain('Typed for an hour')
    expect(answer.text).toContain(`value="/write/${edit.id}"`)
    expect(answer.text).toContain('Long.&lt;/textarea&gt;&lt;script&gt;')
    expect(answer.text).not.toContain('not to be shown')
    const form = { 'typed.body': 'Long and careful', next: `/write/${edit.id}`, email: DEMO_PASSWORDS.priya!.email, password: 'not the one at all' }
    const wrong = await priya.post('/sign-in').type('form').send(form).expect(401)
    expect(wrong.text).toContain('Long and careful')
    const right = await priya.post('/sign-in').type('form').send({ ...form, ...DEMO_PASSWORDS.priya }).expect(303)
    expect(right.headers.location).toBe(`/write/${edit.id}`)
  })

  it('is sent to sign in when nothing was typed', async () => {
    const answer = await app.agent().post('/write').type('form').send({ chapter: 'C' }).expect(303)
    expect(answer.headers.location).toMatch(/^\/sign-in\?next=/)
  })
})

describe('a request for no path', () => {
  it('has no session and breaks nothing', async () => {
    const { hostname, port } = new URL(app.url)
    const status = await new Promise<number | undefined>((resolve, reject) => {
      request({ hostname, port, method: 'OPTIONS', path: '*' }, (answer) => {
        answer.resume()
        resolve(answer.statusCode)
      }).on('error', reject).end()
    })
    expect(status).toBeLessThan(500)
  })
})

describe('over HTTPS', () => {
  it('the cookie is bound to the host and never sent in the clear', async () => {
    const secure = await createTestApp({ databaseUrl: app.databaseUrl, environment: { REQUIRE_HTTPS: 'true', TRUST_PROXY: '127.0.0.1' } })
    try {
      const answer = await secure.agent().post('/api/session').set('X-Forwarded-Proto', 'https').send(DEMO_PASSWORDS.priya).expect(200)
      const [cookie] = answer.headers['set-cookie'] as unknown as string[]
      expect(cookie).toMatch(/^__Host-cc=/)
      expect(cookie).toMatch(/; Secure/)
    } finally {
      await secure.stop()
    }
  })
})

describe('the sessions of a person', () => {
  it('are listed for them without anything that could be used as a cookie', async () => {
    await app.app.db.execute(sql`delete from sessions`)
    const here = await signIn('priya')
    const there = await signIn('priya')
    await signIn('tomasz')
    const { body, text } = await app.agent().get('/api/sessions').set('Cookie', here).expect(200)
    expect(body.sessions).toHaveLength(2)
    expect(body.sessions[0]).toMatchObject({ isThisOne: true })
    for (const cookie of [here, there]) {
      const id = decodeURIComponent(cookie).replace(/^cc=s:/, '').split('.')[0]!
      expect(text).not.toContain(id)
    }
    const lastSeen = new Date(body.sessions[0].lastSeenAt as string).getTime()
    expect(Math.abs(Date.now() - lastSeen)).toBeLessThan(60_000)
  })

  it('can be ended one by one, the own ones only', async () => {
    await app.app.db.execute(sql`delete from sessions`)
    const here = await signIn('priya')
    const there = await signIn('priya')
    const stranger = await signIn('tomasz')
    const { body } = await app.agent().get('/api/sessions').set('Cookie', here)
    const handle = (body.sessions as { handle: string; isThisOne: boolean }[]).find(({ isThisOne }) => !isThisOne)!.handle
    await app.agent().delete(`/api/sessions/${handle}`).set('Cookie', stranger).expect(404)
    expect(await whoIs(there)).toBe('Priya Haldane')
    await app.agent().post(`/you/sessions/${handle}/end`).set('Cookie', here).expect(303)
    expect(await whoIs(there)).toBeNull()
    expect(await whoIs(here)).toBe('Priya Haldane')
  })

  it('end everywhere else at once, and this one goes on under a new id', async () => {
    const elsewhere = [await signIn('priya'), await signIn('priya')]
    const here = await signIn('priya')
    const answer = await app.agent().post('/you/sign-out-everywhere').set('Cookie', here).expect(303)
    const renewed = cookieOf(answer.headers)!
    expect(renewed).not.toBe(here)
    expect(await Promise.all([...elsewhere, here, renewed].map((cookie) => whoIs(cookie)))).toEqual([null, null, null, 'Priya Haldane'])
  })
})
