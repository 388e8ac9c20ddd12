import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openBrowser, WIDTHS } from '../support/browser.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'

let chromium: Awaited<ReturnType<typeof openBrowser>>
let app: TestApp
beforeAll(async () => {
  ;[chromium, app] = await Promise.all([openBrowser(), createTestApp()])
})
afterAll(() => Promise.all([chromium.close(), app.stop()]))

describe.each(WIDTHS)('without JavaScript at %i px', (width) => {
  it('a guide is whole and its calculator computes by form', async () => {
    const { page, close } = await chromium.visit(app.url, { width, javaScript: false })
    await page.goto('/guides/shock-oil-and-pistons')
    expect(await page.locator('main table').count()).toBeGreaterThan(0)
    const instrument = page.locator('#fluid-temperature')
    await instrument.locator('input[type="text"][name$=".temperature"]').fill('3')
    await instrument.getByRole('button', { name: 'Work it out' }).click()
    await page.waitForURL(/temperature=3/)
    expect(new URL(page.url()).pathname).toBe('/guides/shock-oil-and-pistons')
    expect(await instrument.getByRole('status').first().innerText()).toMatch(/3\s°C/)
    await close()
  })

  it('a value out of range is explained at its field', async () => {
    const { page, close } = await chromium.visit(app.url, { width, javaScript: false })
    await page.goto('/calculators/fluid-temperature')
    await page.locator('input[type="text"][name$=".temperature"]').fill('155')
    await page.getByRole('button', { name: 'Work it out' }).click()
    const field = page.locator('input[type="text"][name$=".temperature"]')
    expect(await field.getAttribute('aria-invalid')).toBe('true')
    expect(await field.inputValue()).toBe('155')
    const described = (await field.getAttribute('aria-describedby'))!.split(' ')
    const message = (await Promise.all(described.map((id) => page.locator(`[id="${id}"]`).innerText()))).join(' ')
    expect(message).toMatch(/100/)
    expect(await page.locator('main').innerText()).not.toContain('NaN')
    await close()
  })
})
