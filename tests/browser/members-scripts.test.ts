import { afterAll, beforeAll, expect, it } from 'vitest'
import { openBrowser, type Visit } from '../support/browser.ts'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'
import { holdsBack } from '#server/rendering/index.ts'
import { GuideDraft } from '#shared/schemas/guide-content.ts'
import { xssPayloads } from '../security/xss-payloads.ts'

/**
 * Members' words that try to run script, saved, sent, approved and then read in a real browser. The payloads are of our own making and call
 * `alert`; any dialog, script error or request to another host fails the test.
 */
let chromium: Awaited<ReturnType<typeof openBrowser>>
let app: TestApp
beforeAll(async () => {
  ;[chromium, app] = await Promise.all([openBrowser(), createTestApp()])
})
afterAll(() => Promise.all([chromium.close(), app.stop()]))

// A member may send ten edits an hour.
const PER_GUIDE = 60

it('the same payloads do fire when a page prints them raw, so silence means something', async () => {
  const { page, close } = await chromium.visit('about:blank')
  let fired = 0
  page.on('dialog', (dialog) => {
    fired += 1
    void dialog.dismiss()
  })
  for (const payload of xssPayloads.filter((text) => text.startsWith('<')).slice(0, 40)) {
    await page.setContent(`<!doctype html><body>${payload}</body>`, { waitUntil: 'commit' })
  }
  expect(fired).toBeGreaterThan(5)
  await close()
})

it('runs none of them for a reader, a writer or a moderator', async () => {
  const fired: string[] = []
  const writer = await app.signedIn('priya')
  const moderator = await app.signedIn('odile')
  const reading = await watched(await chromium.visit(app.url), fired)
  const judging = await watched(await chromium.visit(app.url), fired)
  await judging.context.request.post('/api/session', { data: DEMO_PASSWORDS.odile! })
  const writing = await watched(await chromium.visit(app.url), fired)
  await writing.context.request.post('/api/session', { data: DEMO_PASSWORDS.priya! })

  const printable = await printablePayloads()
  expect(printable.length).toBeGreaterThan(xssPayloads.length * 0.8)
  const groups = Array.from({ length: Math.ceil(printable.length / PER_GUIDE) }, (_, n) => printable.slice(n * PER_GUIDE, (n + 1) * PER_GUIDE))
  for (const [n, payloads] of groups.entries()) {
    const edit = (await writer.post('/api/edits').send({ guideSlug: 'rear-toe' }).expect(201)).body as EditBody
    const hostile = oneLine(payloads[n % payloads.length]!)
    const content = {
      ...edit.content,
      title: `Toe ${hostile}`.slice(0, 90),
      inShort: `What toe does, and then ${hostile}`.slice(0, 280),
      body: payloads.map((payload, at) => `## Part ${at}\n\n${payload}\n`).join('\n'),
      sources: [{ kind: 'common_practice', text: `Said at the pits ${hostile}`.slice(0, 400), url: '' }],
    }
    const saved = await writer
      .put(`/api/edits/${edit.id}`)
      .set('If-Match', `"${edit.version}"`)
      .send({ content, summary: `Payloads ${n} ${hostile}`.slice(0, 140) })
      .expect(200)
    await writing.page.goto(`/write/${edit.id}`, { waitUntil: 'networkidle' })
    const sent = await writer.post(`/api/edits/${edit.id}/send`).set('If-Match', `"${(saved.body as EditBody).version}"`).send({})
    expect(sent.status, JSON.stringify(sent.body)).toBe(200)
    await judging.page.goto(`/review/${edit.id}`, { waitUntil: 'networkidle' })
    await moderator.post(`/api/edits/${edit.id}/approve`).set('If-Match', `"${(sent.body as EditBody).version}"`).send({}).expect(200)
    for (const path of ['/guides/rear-toe', '/', '/chapters/C', '/guides/rear-toe/history', `/guides/rear-toe/compare?from=${n + 1}&to=${n + 2}`]) {
      await reading.page.goto(path, { waitUntil: 'networkidle' })
    }
    await pokeEverything(reading)
    expect(fired).toEqual([])
  }
  // What cannot be printed, because a part it asks for does not exist, can still be kept as a draft and looked at.
  const rest = xssPayloads.filter((text) => !printable.includes(text) && GuideDraft.safeParse({ body: text }).success)
  const draft = (await writer.post('/api/edits').send({ guideSlug: 'rear-toe' }).expect(201)).body as EditBody
  for (const payloads of [rest.slice(0, rest.length / 2), rest.slice(rest.length / 2)]) {
    const newest = (await writer.get(`/api/edits/${draft.id}`).expect(200)).body as EditBody
    await writer
      .put(`/api/edits/${draft.id}`)
      .set('If-Match', `"${newest.version}"`)
      .send({ content: { ...newest.content, body: payloads.join('\n\n') }, summary: '' })
      .expect(200)
    await writing.page.goto(`/write/${draft.id}`, { waitUntil: 'networkidle' })
    expect(fired).toEqual([])
  }
  for (const visit of [reading, judging, writing]) await visit.close()
})

async function printablePayloads(): Promise<string[]> {
  const printable: string[] = []
  for (const payload of xssPayloads.filter((text) => GuideDraft.safeParse({ body: text }).success)) {
    const rendered = await app.app.renderer.render(payload).catch(() => null)
    if (rendered !== null && !rendered.problems.some(holdsBack)) printable.push(payload)
  }
  return printable
}

interface EditBody {
  id: string
  version: number
  content: Record<string, unknown>
}

function oneLine(text: string): string {
  return text.replace(/[\u0000-\u001f\u007f-\u009f\u2028\u2029]/g, ' ')
}

async function watched(visit: Visit, fired: string[]): Promise<Visit> {
  visit.page.on('dialog', (dialog) => {
    fired.push(`dialog: ${dialog.message()}`)
    void dialog.dismiss()
  })
  visit.page.on('request', (request) => {
    if (!request.url().startsWith(app.url)) fired.push(`request: ${request.url()}`)
  })
  visit.page.on('pageerror', (error) => fired.push(`script error: ${error.message}`))
  return visit
}

/** Touches what a payload may have left behind: everything that takes focus, and every link in the text. */
async function pokeEverything({ page }: Visit): Promise<void> {
  await page.goto('/guides/rear-toe')
  await page.evaluate(() => {
    for (const element of document.querySelectorAll<HTMLElement>('main *')) {
      for (const type of ['mouseover', 'focus', 'click']) {
        if (type === 'click' && element instanceof HTMLAnchorElement && /^https?:/.test(element.href)) continue
        if (type === 'click' && element.closest('form, a[href]') !== null && !/^javascript/i.test(element.getAttribute('href') ?? '')) continue
        element.dispatchEvent(new MouseEvent(type, { bubbles: true }))
      }
    }
  })
}
