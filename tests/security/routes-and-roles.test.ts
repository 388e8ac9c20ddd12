import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type supertest from 'supertest'
import { listRoutes } from '../support/list-routes.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'

/**
 * Every route against every role. Each request is otherwise fit to be carried out or fails only for what it carries, so a refusal
 * can come from nothing but the role: 401 not signed in, 403 not allowed, 404 hidden, `in` anything else. Posted forms ask a visitor to
 * sign in, on a page that keeps what was typed or by sending them there.
 */
const ROLES = ['visitor', 'unverified', 'member', 'moderator', 'admin'] as const
type Role = (typeof ROLES)[number]
type Outcome = 'in' | 'sign-in' | 401 | 403 | 404

const all = (outcome: Outcome): Outcome[] => ROLES.map(() => outcome)
const members: Outcome[] = [401, 'in', 'in', 'in', 'in']
const verified: Outcome[] = [401, 403, 'in', 'in', 'in']
const admins: Outcome[] = [401, 403, 403, 403, 'in']
/** Someone else's edit in review: hidden from members, readable for moderators, changed by nobody but its writer. */
const writerOnly: Outcome[] = [401, 404, 404, 403, 403]
const hidden: Outcome[] = [401, 404, 404, 404, 404]
const deskOnly: Outcome[] = [401, 404, 404, 'in', 'in']
/** A report of somebody else: moderators decide whether it counts. */
const moderators: Outcome[] = [401, 403, 403, 'in', 'in']
const form = (outcomes: Outcome[]): Outcome[] => outcomes.map((outcome) => (outcome === 401 ? 'sign-in' : outcome))

const matrix: Record<string, Outcome[]> = {
  'GET /healthz': all('in'),
  'GET /readyz': all('in'),
  'GET /api/health': all('in'),
  'GET /api/openapi.json': all('in'),
  'GET /api/by-feel': all('in'),
  'GET /robots.txt': all('in'),
  'GET /sitemap.xml': all('in'),
  'GET /{*path}': all('in'),
  'POST /sheet': all('in'),
  'GET /api/calculators': all('in'),
  'POST /api/calculators/:slug/run': all('in'),
  'GET /api/guides': all('in'),
  'GET /api/guides/:slug': all('in'),
  'GET /api/chapters': all('in'),
  'GET /api/glossary': all('in'),
  'GET /api/adjustables': all('in'),
  'GET /api/mailbox': all('in'),
  'GET /api/mailbox/:id': all(404),
  'POST /api/preview': verified,
  'GET /api/edits': members,
  'POST /api/edits': verified,
  'GET /api/edits/:id': deskOnly,
  'PUT /api/edits/:id': writerOnly,
  'POST /api/edits/:id/send': writerOnly,
  'POST /api/edits/:id/withdraw': writerOnly,
  'POST /api/edits/:id/merge': writerOnly,
  'POST /api/edits/:id/rebase': deskOnly,
  'POST /api/edits/:id/ask': deskOnly,
  'POST /api/edits/:id/decline': deskOnly,
  'POST /api/edits/:id/approve': deskOnly,
  'POST /api/edits/:id/notes': deskOnly,
  'GET /api/cars': members,
  'POST /api/cars': members,
  'POST /api/cars/merge': members,
  // Someone else's car is not there, for whoever asks.
  'PUT /api/cars/:id': hidden,
  'DELETE /api/cars/:id': hidden,
  'POST /api/cars/:id/choose': hidden,
  'GET /api/heat-reports': members,
  'POST /api/heat-reports': verified,
  'DELETE /api/heat-reports/:id': hidden,
  'POST /api/heat-reports/:id/set-aside': moderators,
  'DELETE /api/heat-reports/:id/set-aside': moderators,
  'POST /api/members': all('in'),
  'GET /api/members': admins,
  'PUT /api/members/:id/role': admins,
  'PUT /api/members/:id/status': admins,
  'DELETE /api/members/:id/sessions': admins,
  'POST /api/verifications': all('in'),
  'POST /api/verification-mails': all('in'),
  'POST /api/password-resets': all('in'),
  'POST /api/password-resets/redeem': all('in'),
  'PUT /api/password': members,
  'GET /api/session': all('in'),
  'POST /api/session': all('in'),
  'DELETE /api/session': all('in'),
  'GET /api/sessions': members,
  'DELETE /api/sessions': members,
  'DELETE /api/sessions/:handle': members,
  'POST /join': all('in'),
  'POST /sign-in': all('in'),
  'POST /sign-out': all('in'),
  'POST /forgotten': all('in'),
  'POST /reset': all('in'),
  'POST /verify': all('in'),
  'POST /you/password': form(members),
  'POST /you/sign-out-everywhere': form(members),
  'POST /you/sessions/:handle/end': form(members),
  'POST /you/resend': form(members),
  'POST /members/:id/role': form(admins),
  'POST /members/:id/status': form(admins),
  'POST /members/:id/end-sessions': form(admins),
  'POST /write': form(verified),
  'POST /write/:id': form(writerOnly),
  'POST /write/:id/withdraw': form(writerOnly),
  'POST /write/:id/rebase': form(deskOnly),
  'POST /my-car': form(members),
  'POST /my-car/:id': form(hidden),
  'POST /my-car/:id/choose': form(hidden),
  'POST /my-car/:id/copy': form(hidden),
  'POST /my-car/:id/delete': form(hidden),
  'POST /report': form(verified),
  'POST /you/reports/:id/take-back': form(hidden),
  'POST /reports/:id/set-aside': form(moderators),
  'POST /reports/:id/let-count': form(moderators),
  'POST /review/:id/approve': form(deskOnly),
  'POST /review/:id/ask': form(deskOnly),
  'POST /review/:id/decline': form(deskOnly),
  'POST /review/:id/note': form(deskOnly),
  'POST /review/:id/rebase': form(deskOnly),
}

/** What has to be sent for the role to be the only thing that can be wrong. */
const bodies: Record<string, object> = {
  'POST /api/edits': { guideSlug: 'rear-toe' },
  'POST /api/edits/:id/notes': { text: '' },
  'POST /write': { guideSlug: 'rear-toe' },
  'POST /review/:id/note': { text: '' },
}

let app: TestApp
let editId: string
let memberId: string
let carId: string
let reportId: string
let agents: Record<Role, ReturnType<typeof supertest.agent>>

beforeAll(async () => {
  app = await createTestApp()
  const writer = await app.signedIn('tomasz')
  const draft = await writer.post('/api/edits').send({ guideSlug: 'sway-bars' }).expect(201)
  editId = (draft.body as { id: string }).id
  await writer
    .post(`/api/edits/${editId}/send`)
    .set('If-Match', `"${(draft.body as { version: number }).version}"`)
    .send({ summary: 'Says the same in the same words' })
    .expect(200)
  // Nobody's client in this table, so that ending his sessions ends none of theirs.
  const me = await writer.get('/api/session').expect(200)
  carId = randomUUID()
  await writer.post('/api/cars').send({ id: carId, name: 'His own', values: { mass: 3.6 } }).expect(201)
  const tried = { adjustable: 'caster', direction: 'up', verdict: 'helped', carClass: 'buggy_8e', surface: 'loam', bite: 'low' }
  reportId = ((await writer.post('/api/heat-reports').send(tried).expect(201)).body as { id: string }).id
  memberId = (me.body as { member: { id: string } }).member.id
  agents = {
    visitor: app.agent(),
    unverified: await unverifiedMember(),
    member: await app.signedIn('priya'),
    moderator: await app.signedIn('odile'),
    admin: await app.signedIn('wanda'),
  }
})
afterAll(() => app.stop())

async function unverifiedMember(): Promise<ReturnType<typeof supertest.agent>> {
  const who = { name: 'Newly Joined', email: 'newly@saltmarsh.example', password: 'seven wet laps before noon' }
  const agent = app.agent()
  await agent.post('/api/members').send(who).expect(201)
  await agent.post('/api/session').send({ email: who.email, password: who.password }).expect(200)
  return agent
}

it('names every route there is, so that a new one cannot go without rights', () => {
  expect(Object.keys(matrix).sort()).toEqual([...new Set(listRoutes(app.express))].sort())
})

// What ends sessions comes last, since it ends those of the other rows too.
const rows = Object.entries(matrix).sort(([one], [other]) => Number(endsSessions(one)) - Number(endsSessions(other)))

describe.each(rows)('%s', (route, outcomes) => {
  it.each(ROLES.map((role, n) => [role, outcomes[n]!] as const))('%s: %s', async (role, expected) => {
    const [method, path] = route.split(' ') as [string, string]
    const agent = endsSessions(route) && role !== 'visitor' ? await freshClient(role) : agents[role]
    const status = await request(agent, method, path, bodies[route] ?? {})
    const asksToSignIn = status.location?.startsWith('/sign-in?next=') || (status.code === 401 && !route.includes(' /api/'))
    const outcome = asksToSignIn ? 'sign-in' : [401, 403, 404].includes(status.code) ? status.code : 'in'
    expect(isSameOutcome(route, outcome as Outcome, expected), `answered ${status.code}`).toBe(true)
    expect(status.code).toBeLessThan(500)
  })
})

/** Where nothing stands under a made-up handle, a 404 tells that the role was let in. */
function isSameOutcome(route: string, outcome: Outcome, expected: Outcome): boolean {
  return outcome === expected || (expected === 'in' && outcome === 404 && route.includes(':handle'))
}

function endsSessions(route: string): boolean {
  return ['DELETE /api/session', 'DELETE /api/sessions', 'POST /sign-out', 'POST /you/sign-out-everywhere', 'POST /api/session', 'POST /sign-in'].includes(route)
}

async function freshClient(role: Exclude<Role, 'visitor'>): Promise<ReturnType<typeof supertest.agent>> {
  if (role !== 'unverified') return app.signedIn({ member: 'priya', moderator: 'odile', admin: 'wanda' }[role])
  const agent = app.agent()
  await agent.post('/api/session').send({ email: 'newly@saltmarsh.example', password: 'seven wet laps before noon' }).expect(200)
  return agent
}

async function request(
  agent: ReturnType<typeof supertest.agent>,
  method: string,
  path: string,
  body: object,
): Promise<{ code: number; location: string | undefined }> {
  const url = path
    .replace('/members/:id', `/members/${memberId}`)
    .replace('/mailbox/:id', '/mailbox/none')
    .replace('/cars/:id', `/cars/${carId}`)
    .replace(/reports\/:id/, `reports/${reportId}`)
    .replace('/my-car/:id', `/my-car/${carId}`)
    .replace(':id', editId)
    .replace('guides/:slug', 'guides/droop')
    .replace(':slug', 'fluid-blend')
    .replace(':handle', 'none')
    .replace('{*path}', 'chapters')
  const call = agent[method.toLowerCase() as 'get' | 'post' | 'put' | 'delete'](url).redirects(0)
  // A version that no edit has: whoever is let in is told so (412, 428) and changes nothing.
  if (url.startsWith('/api/edits/') && method !== 'GET') void call.set('If-Match', '"999999"')
  if (method !== 'GET') {
    if (url.startsWith('/api/')) void call.send(body)
    else void call.type('form').send({ version: '999999', reason: 'A reason', ...body })
  }
  const answer = await call
  return { code: answer.status, location: answer.headers.location as string | undefined }
}

