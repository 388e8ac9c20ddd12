import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import supertest from 'supertest'
import { createDatabase, dropDatabase, TEMPLATE } from '../support/database.ts'
import { startServerProcess } from '../support/server-process.ts'
import { DEMO_PASSWORDS } from '../support/test-app.ts'

interface EditBody {
  id: string
  version: number
  state: string
  content: Record<string, unknown> & { body: string }
}

describe('the server is killed between saving a draft and sending it', () => {
  let databaseUrl: string

  beforeAll(async () => {
    databaseUrl = await createDatabase({ template: TEMPLATE })
  })
  afterAll(() => dropDatabase(databaseUrl))

  it('finds the draft again, word for word, and sends it once', async () => {
    const first = await startServerProcess(databaseUrl)
    const writer = supertest.agent(first.url)
    await writer.post('/api/session').send(DEMO_PASSWORDS.priya).expect(200)
    const created = await writer.post('/api/edits').send({ guideSlug: 'sway-bars' }).expect(201)
    const draft = created.body as EditBody
    const content = { ...draft.content, body: `${draft.content.body}\nA bent bar is a soft bar. Sight along it before you blame the setting.\n` }
    const saved = await writer
      .put(`/api/edits/${draft.id}`)
      .set('If-Match', `"${draft.version}"`)
      .send({ content, summary: 'Says to look for a bent bar' })
      .expect(200)
    const cookies = writer.jar.getCookies({ domain: '127.0.0.1', path: '/', secure: false, script: false })
    await first.kill()

    const second = await startServerProcess(databaseUrl)
    const again = supertest.agent(second.url)
    // The session is kept in the database too, so the writer does not even have to sign in again.
    const cookie = `${cookies[0]!.name}=${cookies[0]!.value}`
    const found = await again.get(`/api/edits/${draft.id}`).set('Cookie', cookie).expect(200)
    expect((found.body as EditBody).content).toEqual(content)
    expect((found.body as EditBody).state).toBe('draft')
    const version = (saved.body as EditBody).version
    const send = () =>
      again
        .post(`/api/edits/${draft.id}/send`)
        .set('Cookie', cookie)
        .set('If-Match', `"${version}"`)
        .set('Idempotency-Key', 'send-once-after-the-crash')
        .send({})
    const sent = await send().expect(200)
    expect((sent.body as EditBody).state).toBe('in_review')
    const repeated = await send().expect(200)
    expect(repeated.body).toEqual(sent.body)
    expect(await second.stop()).toBe(0)
  })
})
