import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openBrowser, signInByForm } from '../support/browser.ts'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')

let chromium: Awaited<ReturnType<typeof openBrowser>>
let app: TestApp
beforeAll(async () => {
  ;[chromium, app] = await Promise.all([openBrowser(), createTestApp()])
})
afterAll(() => Promise.all([chromium.close(), app.stop()]))

describe.each(['day', 'night'] as const)('from by feel on a phone, on the %s sheet', (sheet) => {
  it('a heat is reported in two touches', async () => {
    const { page, complaints, close } = await chromium.visit(app.url, { width: 390, sheet })
    const sound = async () => {
      // The policy of the page lets no script of ours in, so axe comes through the browser's own door.
      const found = await page.evaluate(`(async () => { ${axeSource}
        const { violations } = await axe.run(document)
        return violations.map(({ id, nodes }) => id + ': ' + nodes.map((node) => node.target.join(' ')).join(', ')) })()`)
      expect(found, page.url()).toEqual([])
      expect(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)).toBeLessThanOrEqual(0)
    }
    await signInByForm(page, DEMO_PASSWORDS.priya!)
    await page.goto('/feel?complaint=entry.steering.more&class=buggy_8e&surface=hard_packed&bite=high')
    await page.getByRole('link', { name: /Say how it went/ }).first().tap()
    await page.waitForURL(/\/report\?/)
    await sound()
    const helped = page.getByRole('button', { name: /Helped/ })
    expect((await helped.boundingBox())!.height).toBeGreaterThanOrEqual(64)
    await helped.tap()
    await page.waitForURL(/said=(?:saved|changed)/)
    expect(await page.locator('main').innerText()).toContain('1 of 1 agree')
    await sound()
    await page.getByRole('link', { name: 'Back to what to try' }).tap()
    await page.waitForURL(/\/feel\?complaint=entry.steering.more/)
    await page.goto('/you#reports')
    await sound()
    expect(complaints).toEqual([])
    await close()
  })
})
