import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, rows, saveEdit, WHOLE_GUIDE, type Agent } from './edits-support.ts'

let app: TestApp
let priya: Agent
let odile: Agent
beforeAll(async () => {
  app = await createTestApp()
  priya = await app.signedIn('priya')
  odile = await app.signedIn('odile')
})
afterAll(() => app.stop())
beforeEach(async () => {
  await rows(app, 'delete from rate_limits')
})

describe('If-Match', () => {
  it('is required for every change of an edit', async () => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    const answer = await priya.put(`/api/edits/${draft.id}`).send({ content: draft.content, summary: '' }).expect(428)
    expect(answer.body).toMatchObject({ code: 'precondition_required', status: 428 })
    await priya.put(`/api/edits/${draft.id}`).set('If-Match', '*').send({ content: draft.content, summary: '' }).expect(428)
    for (const deed of ['send', 'withdraw', 'rebase', 'merge']) await priya.post(`/api/edits/${draft.id}/${deed}`).send({}).expect(428)
  })

  it.each([['weak', 'W/"1"'], ['old', '"0"'], ['future', '"99"'], ['garbage', 'hello'], ['unquoted', '1'], ['list without it', '"7", "8"']])(
    '%s: 412, with the version it has now',
    async (_name, tag) => {
      const draft = await beginEdit(priya, { chapter: 'A' })
      const answer = await priya.put(`/api/edits/${draft.id}`).set('If-Match', tag).send({ content: WHOLE_GUIDE, summary: '' }).expect(412)
      expect(answer.body.version).toBe(draft.version)
      expect((await priya.get(`/api/edits/${draft.id}`)).body.content.title).toBe('')
    },
  )

  it('a list that holds it: done', async () => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    await priya.put(`/api/edits/${draft.id}`).set('If-Match', `"77", "${draft.version}"`).send({ content: WHOLE_GUIDE, summary: '' }).expect(200)
  })

  it('If-None-Match with the current version: 304 without a body, until a note is newer', async () => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    const tag = `"${draft.version}"`
    const same = await priya.get(`/api/edits/${draft.id}`).set('If-None-Match', tag).expect(304)
    expect(same.text).toBe('')
    await priya.post(`/api/edits/${draft.id}/notes`).send({ text: 'For myself' }).expect(201)
    await priya.get(`/api/edits/${draft.id}`).set('If-None-Match', tag).expect(200)
  })
})

describe('what cannot be sent says so at each field and loses nothing', () => {
  it('an empty new guide', async () => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    const answer = await priya.post(`/api/edits/${draft.id}/send`).set(...ifMatch(draft)).send({ summary: 'A new guide' }).expect(422)
    expect(answer.type).toBe('application/problem+json')
    expect(answer.body.errors.map((problem: { field: string }) => problem.field).sort()).toEqual(['content.body', 'content.inShort', 'content.title'])
  })

  it('does not hold back a text over what is only noticed: it is printed as it was written', async () => {
    const saved = await saveEdit(priya, await beginEdit(priya, { chapter: 'A' }), { ...WHOLE_GUIDE, title: 'Oddly marked', body: '# High\n\n:::nothing\nWords.\n:::\n' }, 'Fine summary')
    const preview = (await priya.post('/api/preview').send({ content: saved.content }).expect(200)).body
    expect(preview.problems.map(({ holds }: { holds: boolean }) => holds)).toEqual([false, false])
    await priya.post(`/api/edits/${saved.id}/send`).set('If-Match', `"${saved.version}"`).send({}).expect(200)
  })

  it.each([
    ['summary', {}, '', 'summary'],
    ['adjustable', { effects: [{ ...WHOLE_GUIDE.effects[0]!, adjustable: 'flux_capacitor' }] }, 'Fine summary', 'content.effects.0.adjustable'],
    ['unknown calculator', { body: 'Text.\n\n::calculator{slug=no-such-calculator}\n' }, 'Fine summary', 'content.body'],
    ['worked example', { body: '::worked{calculator=fluid-blend lowViscosity=5000 highViscosity=10000 targetViscosity=7000 totalVolume=10 expect=highVolume:9 tolerance=1%}\n' }, 'Fine summary', 'content.body'],
    ['too deep', { body: `${'> '.repeat(200)}deep` }, 'Fine summary', 'content.body'],
  ])('%s', async (_name, change, summary, field) => {
    const saved = await saveEdit(priya, await beginEdit(priya, { chapter: 'A' }), { ...WHOLE_GUIDE, ...change }, summary)
    const answer = await priya.post(`/api/edits/${saved.id}/send`).set(...ifMatch(saved)).send({}).expect(422)
    expect(answer.body.errors.map((problem: { field: string }) => problem.field)).toContain(field)
    const kept = (await priya.get(`/api/edits/${saved.id}`)).body
    expect(kept).toMatchObject({ state: 'draft', version: saved.version, content: saved.content })
  })
})

describe('too much', () => {
  it('a body over 64 KiB: 422 at the body', async () => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    const answer = await priya.put(`/api/edits/${draft.id}`).set(...ifMatch(draft)).send({ content: { ...WHOLE_GUIDE, body: 'é'.repeat(32_769) }, summary: '' }).expect(422)
    expect(answer.body.errors).toEqual([{ field: 'content.body', message: 'Body: it is longer than 64 KiB. Split it into two guides.' }])
    await priya.put(`/api/edits/${draft.id}`).set(...ifMatch(draft)).send({ content: { ...WHOLE_GUIDE, body: 'é'.repeat(32_768) }, summary: '' }).expect(200)
  })

  it('10 MB: 413 before anything is read', async () => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    await priya.put(`/api/edits/${draft.id}`).set(...ifMatch(draft)).send({ content: { ...WHOLE_GUIDE, body: 'x'.repeat(10_000_000) }, summary: '' }).expect(413)
  })

  it('61 effects: 422', async () => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    const effects = Array.from({ length: 61 }, () => WHOLE_GUIDE.effects[0])
    await priya.put(`/api/edits/${draft.id}`).set(...ifMatch(draft)).send({ content: { ...WHOLE_GUIDE, effects }, summary: '' }).expect(422)
  })

  it('more than sixty saves in ten minutes: 429 with Retry-After', async () => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    const answers = await Promise.all(
      Array.from({ length: 61 }, () => priya.put(`/api/edits/${draft.id}`).set('If-Match', '"0"').send({ content: WHOLE_GUIDE, summary: '' })),
    )
    const limited = answers.filter((answer) => answer.status === 429)
    expect(limited.length).toBeGreaterThanOrEqual(1)
    expect(Number(limited[0]!.headers['retry-after'])).toBeGreaterThan(0)
  })
})

describe('hostile and malformed', () => {
  it.each([
    ['no object', '[]'], ['null', 'null'], ['a number', '5'], ['not JSON', '{'], ['wrong types', '{"content":7,"summary":[]}'],
    ['prototype', '{"content":{"__proto__":{"title":"x"}},"summary":""}'], ['NUL', JSON.stringify({ content: { ...WHOLE_GUIDE, body: 'a\u0000b' }, summary: '' })],
    ['lone surrogate', JSON.stringify({ content: { ...WHOLE_GUIDE, body: 'a\ud800b' }, summary: '' }).replace('\ud800', '\\ud800')],
    ['a line break in the title', JSON.stringify({ content: { ...WHOLE_GUIDE, title: 'a\nb' }, summary: '' })],
    ['a line break in the summary', JSON.stringify({ content: WHOLE_GUIDE, summary: 'a\r\nBcc: x@example.org' })],
  ])('%s: refused in words, never a 500', async (_name, body) => {
    const draft = await beginEdit(priya, { chapter: 'A' })
    const answer = await priya.put(`/api/edits/${draft.id}`).set(...ifMatch(draft)).set('Content-Type', 'application/json').send(body)
    expect([400, 422]).toContain(answer.status)
    expect(answer.type).toBe('application/problem+json')
    expect(({} as { title?: string }).title).toBeUndefined()
  })

  it.each(['x', '1', '00000000-0000-0000-0000-000000000000', '%27%3B--', `${'a'.repeat(36)}`])('the id %s: 404', async (id) => {
    await priya.get(`/api/edits/${id}`).expect(404)
    await priya.put(`/api/edits/${id}`).set('If-Match', '"1"').send({}).expect(404)
  })

  it.each(['state=open', 'page=0', 'page=x', 'page=1&page=2', 'page=999999999999', 'whose=all', 'sort=up', 'state[]=draft'])('the query %s: 422', async (query) => {
    const answer = await priya.get(`/api/edits?${query}`).expect(422)
    expect(answer.body.errors.length).toBeGreaterThan(0)
  })

  it.each([{}, { chapter: 'Z' }, { chapter: 'a' }, { guideSlug: 'no-such-guide' }, { guideSlug: '../x' }, { guideSlug: 'droop', restoreEdition: 99 }, { guideSlug: 'droop', chapter: 'A' }, { guideSlug: ['droop'] }])(
    'beginning %j: refused',
    async (start) => {
      const answer = await priya.post('/api/edits').send(start)
      expect([404, 422]).toContain(answer.status)
    },
  )

  it('a reason is needed to ask and to decline', async () => {
    const saved = await saveEdit(priya, await beginEdit(priya, { chapter: 'A' }), WHOLE_GUIDE, 'A new guide')
    const sent = (await priya.post(`/api/edits/${saved.id}/send`).set(...ifMatch(saved)).send({}).expect(200)).body
    for (const deed of ['ask', 'decline']) {
      for (const reason of [undefined, '', '  ', 'no', 'x'.repeat(2_001)]) {
        const answer = await odile.post(`/api/edits/${sent.id}/${deed}`).set(...ifMatch(sent)).send({ reason }).expect(422)
        expect(answer.body.errors[0].field).toBe('reason')
      }
    }
    await odile.post(`/api/edits/${sent.id}/notes`).send({ text: ' \n ' }).expect(422)
  })

  it('a preview of half a guide says what is wrong and runs no script', async () => {
    const body = '<script>alert(1)</script>\n\n[x](javascript:alert(1))\n\n::calculator{slug=nope}\n'
    const preview = (await priya.post('/api/preview').send({ content: { title: '', inShort: '', body } }).expect(200)).body
    expect(preview.html).not.toMatch(/<script|href="javascript/i)
    expect(preview.problems.length).toBeGreaterThan(0)
    expect(preview.effects).toEqual([])
  })
})
