import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import supertest from 'supertest'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp()
})
afterAll(() => app.stop())

const forgeries: { name: string; headers: Record<string, string>; type: string; status: number }[] = [
  { name: 'Sec-Fetch-Site: cross-site', headers: { 'Sec-Fetch-Site': 'cross-site' }, type: 'application/json', status: 403 },
  { name: 'Sec-Fetch-Site: same-site', headers: { 'Sec-Fetch-Site': 'same-site' }, type: 'application/json', status: 403 },
  { name: 'a foreign Origin', headers: { Origin: 'https://elsewhere.example' }, type: 'application/json', status: 403 },
  { name: 'Origin: null', headers: { Origin: 'null' }, type: 'application/json', status: 403 },
  { name: 'JSON sent as plain text', headers: {}, type: 'text/plain', status: 415 },
  { name: 'JSON sent as a form', headers: {}, type: 'application/x-www-form-urlencoded', status: 415 },
]

const writes = ['/api/session', '/api/members', '/api/edits', '/api/preview']
const forms = ['/sign-in', '/join', '/forgotten', '/sign-out', '/write', '/sheet']

describe.each(forgeries)('a request forged by $name', ({ headers, type, status }) => {
  it.each(writes)('is refused at POST %s', async (path) => {
    await supertest(app.url).post(path).set(headers).set('Content-Type', type).send(JSON.stringify(DEMO_PASSWORDS.priya)).expect(status)
  })
})

describe.each(forgeries.filter(({ status }) => status === 403))('a form forged by $name', ({ headers }) => {
  it.each(forms)('is refused at POST %s', async (path) => {
    const answer = await supertest(app.url).post(path).set(headers).type('form').send(DEMO_PASSWORDS.priya)
    expect(answer.status).toBe(403)
    expect(answer.headers['set-cookie']).toBeUndefined()
  })
})
