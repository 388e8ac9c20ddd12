import type { Page } from 'playwright-core'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { openBrowser, type Visit } from '../support/browser.ts'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'

let chromium: Awaited<ReturnType<typeof openBrowser>>
let app: TestApp
let writer: Visit
beforeAll(async () => {
  ;[chromium, app] = await Promise.all([openBrowser(), createTestApp()])
  writer = await chromium.visit(app.url)
  await writer.context.request.post('/api/session', { data: DEMO_PASSWORDS.tomasz! })
})
afterAll(async () => {
  await writer.close()
  await Promise.all([chromium.close(), app.stop()])
})

async function beginDraft(slug: string): Promise<string> {
  const answer = await writer.context.request.post('/api/edits', { data: { guideSlug: slug } })
  return ((await answer.json()) as { id: string }).id
}

async function storedBody(id: string): Promise<string> {
  const answer = await writer.context.request.get(`/api/edits/${id}`)
  return ((await answer.json()) as { content: { body: string } }).content.body
}

async function write(page: Page, words: string): Promise<void> {
  const body = page.getByLabel('Your words')
  await body.fill(`${await body.inputValue()}\n\n${words}\n`)
}

async function keepAsDraft(page: Page): Promise<void> {
  const [answer] = await Promise.all([
    page.waitForResponse((response) => response.request().method() === 'PUT'),
    page.getByRole('button', { name: 'Keep as a draft' }).click(),
  ])
  expect(answer.status()).toBe(200)
}

it('keeps on this device what is typed without a connection, through a closed page, and brings it to the club later', async () => {
  const id = await beginDraft('rear-toe')
  await writer.page.goto(`/write/${id}`, { waitUntil: 'networkidle' })
  await writer.context.setOffline(true)
  await write(writer.page, 'Typed in the car park, without reception.')
  await writer.page.getByRole('button', { name: 'Keep as a draft' }).click()
  await writer.page.getByText('Saved on this device only').first().waitFor()
  await writer.page.close()
  await writer.context.setOffline(false)
  expect(await storedBody(id)).not.toContain('car park')

  writer.page = await writer.context.newPage()
  await writer.page.goto(`/write/${id}`, { waitUntil: 'networkidle' })
  expect(await writer.page.getByLabel('Your words').inputValue()).toContain('Typed in the car park, without reception.')
  await keepAsDraft(writer.page)
  expect(await storedBody(id)).toContain('Typed in the car park, without reception.')
})

it('never overwrites what another tab saved meanwhile, and loses neither', async () => {
  const id = await beginDraft('anti-squat')
  const other = await writer.context.newPage()
  await writer.page.goto(`/write/${id}`, { waitUntil: 'networkidle' })
  await other.goto(`/write/${id}`, { waitUntil: 'networkidle' })
  await write(other, 'From the second tab.')
  await keepAsDraft(other)
  // The desk saves by itself soon after one stops typing, and is told then.
  const [refused] = await Promise.all([
    writer.page.waitForResponse((response) => response.request().method() === 'PUT'),
    write(writer.page, 'From the first tab.'),
  ])
  expect(refused.status()).toBe(412)
  await writer.page.getByText('another copy was saved meanwhile').first().waitFor()
  expect(await storedBody(id)).toContain('From the second tab.')
  expect(await writer.page.getByLabel('Your words').inputValue()).toContain('From the first tab.')
  await other.close()
})
