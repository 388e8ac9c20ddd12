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

/** Opens a draft and waits until its script keeps it: only then is there somebody who notices a lost connection. */
async function openDesk(page: Page, id: string): Promise<void> {
  await page.goto(`/write/${id}`)
  await page.getByRole('button', { name: 'Whole width' }).waitFor()
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
  await openDesk(writer.page, id)
  await writer.context.setOffline(true)
  await write(writer.page, 'Typed in the car park, without reception.')
  await writer.page.getByRole('button', { name: 'Keep as a draft' }).click()
  await writer.page.getByText('Saved on this device only').first().waitFor()
  await writer.page.close()
  await writer.context.setOffline(false)
  expect(await storedBody(id)).not.toContain('car park')

  writer.page = await writer.context.newPage()
  await openDesk(writer.page, id)
  expect(await writer.page.getByLabel('Your words').inputValue()).toContain('Typed in the car park, without reception.')
  await keepAsDraft(writer.page)
  expect(await storedBody(id)).toContain('Typed in the car park, without reception.')
})

it('never overwrites what another tab saved meanwhile, and loses neither', async () => {
  const id = await beginDraft('anti-squat')
  const other = await writer.context.newPage()
  await openDesk(writer.page, id)
  await openDesk(other, id)
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

it('keeps at the club what no guide could have yet, says what is wrong where it is, and says saved only of what is', async () => {
  const id = await beginDraft('sway-bars')
  const { page } = writer
  const state = page.locator('[data-state]')
  await openDesk(page, id)
  expect(await state.getAttribute('data-state')).toBe('saved')
  const title = 'A title that goes on, and on, and on, much longer than the ninety characters that a guide has for it'
  await page.getByRole('textbox', { name: 'Title' }).fill(title)
  expect(await state.innerText()).not.toContain('Saved')
  await page.getByText('Title: keep it under 91 characters.').first().waitFor()
  await page.getByRole('button', { name: 'Add an effect' }).click()
  await page.locator('.fx-card').last().getByLabel('Where on the lap').selectOption('bumps')
  await keepAsDraft(page)
  await page.locator('[data-state="saved"]').waitFor()

  await page.goto('/write', { waitUntil: 'networkidle' })
  await page.getByText(title).waitFor()
  await openDesk(page, id)
  expect(await page.getByRole('textbox', { name: 'Title' }).inputValue()).toBe(title)
  const added = page.locator('.fx-card').last()
  expect(await added.getByLabel('Where on the lap').inputValue()).toBe('bumps')
  expect(await added.getByLabel('What you change').inputValue()).toBe('')

  await page.getByRole('button', { name: 'Send for review' }).click()
  const summary = page.locator('#errors')
  await summary.waitFor()
  const lines = await summary.locator('li').allInnerTexts()
  expect(lines).toEqual([...new Set(lines)])
  expect(await page.locator('.bf-n').innerText()).toBe(`${lines.length} to mend`)
  expect(await summary.getByRole('heading').innerText()).toBe(`${lines.length} things to put right`)
  expect(await added.locator('.err').count()).toBe(6)
})
