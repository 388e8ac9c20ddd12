import { readdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import type supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createTestApp, type TestApp } from '../support/test-app.ts'

/** Every page against every role: open, sent to sign in, forbidden or hidden. Pages are found by their folders. */
const ROLES = ['visitor', 'unverified', 'member', 'moderator', 'admin'] as const
type Role = (typeof ROLES)[number]
/** 302: sent on to somewhere else. */
type Outcome = 'open' | 'sign-in' | 302 | 403 | 404

const all = (outcome: Outcome): Outcome[] => ROLES.map(() => outcome)
const signedIn: Outcome[] = ['sign-in', 'open', 'open', 'open', 'open']

const matrix: Record<string, Outcome[]> = {
  '/': all('open'),
  '/about/approval': all('open'),
  '/about/sure': all('open'),
  '/calculators': all('open'),
  '/calculators/@slug': all('open'),
  '/chapters': all('open'),
  '/chapters/@letter': all('open'),
  '/feel': all('open'),
  '/forgotten': all('open'),
  '/glossary': all('open'),
  '/guides/@slug': all('open'),
  '/guides/@slug/compare': all('open'),
  '/guides/@slug/editions/@number': all('open'),
  '/guides/@slug/history': all('open'),
  '/join': all('open'),
  '/lap/@phase': all('open'),
  '/mailbox': all('open'),
  '/mailbox/@id': all(404),
  '/members': ['sign-in', 403, 403, 403, 'open'],
  // A visitor's car is kept by the browser.
  '/my-car': all('open'),
  '/report': ['sign-in', 403, 'open', 'open', 'open'],
  '/reports': ['sign-in', 403, 403, 'open', 'open'],
  '/reset': all('open'),
  '/review': ['sign-in', 403, 403, 'open', 'open'],
  '/review/@id': ['sign-in', 403, 403, 'open', 'open'],
  '/sign-in': ['open', 302, 302, 302, 302],
  '/verify': all('open'),
  '/write': signedIn,
  // Someone else's edit: nobody but its writer finds a desk to write at; a moderator sees it, as it was sent.
  '/write/@id': ['sign-in', 404, 404, 'open', 'open'],
  '/you': signedIn,
}

/** One's own address, and the mail that was caught. */
const SHOWS_ADDRESSES = ['/you', '/mailbox']

let app: TestApp
let editId: string
let agents: Record<Role, ReturnType<typeof supertest.agent>>

beforeAll(async () => {
  app = await createTestApp()
  const queue = await (await app.signedIn('odile')).get('/api/edits?state=in_review').expect(200)
  editId = (queue.body as { id: string }[])[0]!.id
  const joined = { name: 'Newly Joined', email: 'newly@saltmarsh.example', password: 'seven wet laps before noon' }
  const unverified = app.agent()
  await unverified.post('/api/members').send(joined).expect(201)
  await unverified.post('/api/session').send({ email: joined.email, password: joined.password }).expect(200)
  agents = {
    visitor: app.agent(),
    unverified,
    member: await app.signedIn('priya'),
    moderator: await app.signedIn('odile'),
    admin: await app.signedIn('wanda'),
  }
})
afterAll(() => app.stop())

it('names every page there is', () => {
  const pages = fileURLToPath(new URL('../../pages', import.meta.url))
  const found = readdirSync(pages, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('/+Page.vue') && !file.startsWith('_error'))
    .map((file) => `/${file.replace(/\/\+Page\.vue$/, '').split('/').filter((part) => !/^\(.*\)$|^index$/.test(part)).join('/')}`)
  expect(Object.keys(matrix).sort()).toEqual(found.sort())
})

describe.each(Object.entries(matrix))('%s', (page, outcomes) => {
  it.each(ROLES.map((role, n) => [role, outcomes[n]!] as const))('%s: %s', async (role, expected) => {
    const path = page
      .replace('calculators/@slug', 'calculators/fluid-blend')
      .replace('@slug', 'droop')
      .replace('@letter', 'B')
      .replace('@number', '1')
      .replace('@phase', 'exit')
      .replace('mailbox/@id', 'mailbox/none')
      .replace('@id', editId)
      .replace(/compare$/, 'compare?from=1&to=1')
    const answer = await agents[role].get(path).redirects(0)
    const outcome = answer.headers.location?.startsWith('/sign-in?next=') ? 'sign-in' : answer.status === 200 ? 'open' : answer.status
    expect(outcome).toBe(expected)
    // Only what is the same for all may be kept on the way; nothing private ever is.
    if (role !== 'visitor' || answer.status !== 200) expect(answer.headers['cache-control']).toContain('no-store')
    if (role === 'visitor') expect(answer.headers['set-cookie']).toBeUndefined()
    expect(answer.text).not.toContain('argon2')
    if (!SHOWS_ADDRESSES.includes(page)) expect(answer.text).not.toContain('@saltmarsh.example')
  })

  it('never gives away its data apart from its page', async () => {
    for (const spelling of ['index.pageContext.json', 'index.pageContext%2Ejson']) {
      const answer = await agents.admin.get(`${page === '/' ? '' : page.replace('@slug', 'droop').replace(/@\w+/g, 'x')}/${spelling}`)
      expect(answer.status).toBe(404)
    }
  })
})
