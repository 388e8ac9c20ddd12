import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import type { EditEntry, EditView } from '#server/edits/index.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { ifMatch, rows, saveEdit, sentEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let priya: Agent
let tomasz: Agent
let odile: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
  tomasz = await app.signedIn('tomasz')
  odile = await app.signedIn('odile')
})
afterAll(() => app.stop())
beforeEach(() => rows(app, 'delete from rate_limits'))

const SENT = 'These words were sent.'
const UNSENT = 'XYZZY words that nobody has sent'

const act = async (agent: Agent, edit: { id: string; version: number }, deed: string, body: object = {}) =>
  (await agent.post(`/api/edits/${edit.id}/${deed}`).set(...ifMatch(edit)).send(body).expect(200)).body as EditView

/** An edit that was sent, given back, and rewritten since in every place that a moderator could see. */
async function rewritten(start: { chapter: string } | { guideSlug: string }): Promise<{ sent: EditView; mine: EditView }> {
  const sent = await sentEdit(priya, start, { ...WHOLE_GUIDE, title: 'Gluing tyres, as sent', body: `${SENT}\n` }, 'The line as sent')
  const asked = await act(odile, sent, 'ask', { reason: 'Which glue?' })
  const change = { title: `Title ${UNSENT}`, inShort: `In short ${UNSENT}`, body: `Body ${UNSENT}\n` }
  return { sent, mine: await saveEdit(priya, { ...asked, content: sent.content }, change, `Line ${UNSENT}`) }
}

async function everythingOdileSees(id: string, shelf: string): Promise<string> {
  const texts: string[] = []
  for (const url of [`/api/edits/${id}`, `/api/edits?whose=everyone&state=${shelf}`, `/review/${id}`, `/review/${id}?view=proposed`, '/review?state=asked', `/write/${id}`]) {
    texts.push((await odile.get(url).expect(200)).text)
  }
  return texts.join('\n')
}

describe('while its writer is rewriting, a moderator', () => {
  it('reads the words as they were last sent, everywhere, and the writer their own', async () => {
    const { sent, mine } = await rewritten({ chapter: 'A' })
    expect(await everythingOdileSees(sent.id, 'changes_asked')).not.toContain('XYZZY')
    const seen = (await odile.get(`/api/edits/${sent.id}`).expect(200)).body as EditView
    expect(seen).toMatchObject({ title: 'Gluing tyres, as sent', summary: 'The line as sent', content: sent.content, changes: sent.changes, version: mine.version })
    const listed = ((await odile.get('/api/edits?whose=everyone&state=changes_asked').expect(200)).body as EditEntry[]).find(({ id }) => id === sent.id)
    expect(listed).toMatchObject({ title: 'Gluing tyres, as sent', summary: 'The line as sent', changes: sent.changes })
    const page = (await odile.get(`/review/${sent.id}`).expect(200)).text
    expect(page).toContain(SENT)
    expect(page).toContain('These are the words as they were last sent.')
    expect((await priya.get(`/api/edits/${sent.id}`).expect(200)).body).toMatchObject({ title: `Title ${UNSENT}`, content: mine.content })
    expect((await odile.post(`/api/edits/${sent.id}/notes`).send({ text: 'Still waiting' }).expect(201)).text).not.toContain('XYZZY')
  })

  it('reads them against the edition they stood on, also when a newer one is out', async () => {
    const { sent } = await rewritten({ guideSlug: 'rear-toe' })
    const theirs = await sentEdit(tomasz, { guideSlug: 'rear-toe' }, { inShort: 'Published while the other was being rewritten.' })
    await act(odile, theirs, 'approve')
    expect(await everythingOdileSees(sent.id, 'changes_asked')).not.toContain('XYZZY')
    expect((await odile.get(`/api/edits/${sent.id}`).expect(200)).body).toMatchObject({ baseEdition: sent.baseEdition, content: sent.content })
  })

  it('does not get to see them when the edit is withdrawn instead', async () => {
    const { sent, mine } = await rewritten({ chapter: 'B' })
    await act(priya, mine, 'withdraw')
    expect(await everythingOdileSees(sent.id, 'withdrawn')).not.toContain('XYZZY')
  })

  it('reads the new words once they are sent', async () => {
    const { sent, mine } = await rewritten({ chapter: 'C' })
    await act(priya, mine, 'send')
    expect((await odile.get(`/api/edits/${sent.id}`).expect(200)).body).toMatchObject({ title: `Title ${UNSENT}` })
    expect((await odile.get(`/review/${sent.id}`).expect(200)).text).toContain(UNSENT)
  })

  it('is shown nothing rather than unsent words where the record kept none', async () => {
    const { sent } = await rewritten({ chapter: 'D' })
    await rows(app, `insert into audit_entries (action, subject_kind, subject_id, details) values ('edit.ask', 'edit', $1, '{}')`, [sent.id])
    expect(await everythingOdileSees(sent.id, 'changes_asked')).not.toContain('XYZZY')
  })
})

it('a remark of the renderer leads to its line in the marked text', async () => {
  const sent = await sentEdit(priya, { chapter: 'E' }, { ...WHOLE_GUIDE, title: 'Remarked on', body: 'Words before.\n\n:::nothing\nWords.\n:::\n' })
  const page = (await odile.get(`/review/${sent.id}`).expect(200)).text
  expect(page).toMatch(/<a href="#remark-1"[^>]*>Line 3<\/a>/)
  expect(page).toMatch(/id="remark-1"/)
})
