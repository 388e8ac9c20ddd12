import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openBrowser, signInByForm, WIDTHS } from '../support/browser.ts'
import { createDatabase, dropDatabase, TEMPLATE } from '../support/database.ts'
import { startServerProcess, type ServerProcess } from '../support/server-process.ts'
import { DEMO_PASSWORDS } from '../support/test-app.ts'

let chromium: Awaited<ReturnType<typeof openBrowser>>
beforeAll(async () => {
  chromium = await openBrowser()
})
afterAll(() => chromium.close())

describe.each(WIDTHS)('the main job at %i px', (width) => {
  let databaseUrl: string
  let server: ServerProcess

  beforeAll(async () => {
    databaseUrl = await createDatabase({ template: TEMPLATE })
    server = await startServerProcess(databaseUrl)
  })
  afterAll(async () => {
    await server.stop()
    await dropDatabase(databaseUrl)
  })

  it('a visitor reads and calculates, a member improves, a moderator approves, the visitor reads the new edition', async () => {
    const sentence = `At ${width} pixels we say: count the turns twice.`

    const reader = await chromium.visit(server.url, { width })
    await reader.page.goto('/guides/shock-oil-and-pistons')
    await expectText(reader.page, 'h1', 'Shock oil')
    const instrument = reader.page.locator('[data-island="calculator"]', { has: reader.page.locator('#fluid-temperature') })
    await instrument.scrollIntoViewIfNeeded()
    const temperature = instrument.locator('input[type="text"][name$=".temperature"]')
    const before = await instrument.getByRole('status').first().innerText()
    await temperature.fill('3')
    await reader.page.waitForFunction(
      ([selector, old]) => (document.querySelector(selector!) as HTMLElement).innerText !== old,
      ['#fluid-temperature [role="status"]', before] as const,
    )
    expect(await instrument.getByRole('status').first().innerText()).toMatch(/3\s°C/)

    const writer = await chromium.visit(server.url, { width })
    await signInByForm(writer.page, DEMO_PASSWORDS.priya!)
    await writer.page.goto('/guides/shock-oil-and-pistons')
    await writer.page.getByRole('button', { name: 'Improve this guide' }).first().click()
    await writer.page.waitForURL(/\/write\/[0-9a-f-]{36}/)
    const address = new URL(writer.page.url()).pathname
    const body = writer.page.getByLabel('Your words')
    await body.fill(`${await body.inputValue()}\n\n${sentence}\n`)
    await writer.page.getByRole('textbox', { name: 'In short' }).fill('Oil and piston set how fast the shock may move: thicker oil or smaller holes slow it down.')
    await writer.page.getByRole('button', { name: 'Keep as a draft' }).click()
    await writer.page.getByText(/Saved/).first().waitFor()
    await writer.page.goto(address)
    expect(await writer.page.getByLabel('Your words').inputValue()).toContain(sentence)
    await writer.page.getByLabel('What did you change, in one line?').fill('Says to count the turns twice')
    // Sent when every word is saved already: pressing is then the only thing left to do.
    await Promise.all([
      writer.page.waitForResponse((response) => response.request().method() === 'PUT' && response.ok()),
      writer.page.getByRole('button', { name: 'Keep as a draft' }).click(),
    ])
    await writer.page.getByRole('button', { name: 'Send for review' }).click()
    await writer.page.getByText('Waiting for review').first().waitFor()

    const moderator = await chromium.visit(server.url, { width })
    await signInByForm(moderator.page, DEMO_PASSWORDS.imre!)
    await moderator.page.goto('/review')
    await moderator.page.getByRole('link', { name: /Shock oil/ }).first().click()
    await moderator.page.waitForURL(/\/review\/[0-9a-f-]{36}/)
    expect(await moderator.page.locator('main ins').allInnerTexts()).toContainEqual(expect.stringContaining('count the turns twice'))
    await moderator.page.getByRole('radio', { name: /^Approve/ }).check({ force: true })
    await moderator.page.getByRole('button', { name: 'Approve and print' }).click()
    await moderator.page.waitForURL(/\/guides\/shock-oil-and-pistons/)

    await reader.page.goto('/guides/shock-oil-and-pistons')
    await expectText(reader.page, 'main', sentence)
    await expectText(reader.page, 'main', 'Priya Haldane')
    await reader.page.goto('/guides/shock-oil-and-pistons/history')
    await expectText(reader.page, 'main', 'Says to count the turns twice')
    for (const visit of [reader, writer, moderator]) {
      expect(visit.complaints).toEqual([])
      await visit.close()
    }
  })
})

async function expectText(page: Page, selector: string, text: string): Promise<void> {
  expect(await page.locator(selector).first().innerText()).toContain(text)
}
