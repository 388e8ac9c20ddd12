export { openBrowser, signInByForm, WIDTHS }
export type { Visit, VisitOptions }

import { existsSync } from 'node:fs'
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core'

/** A phone in the hand and a desk. */
const WIDTHS = [390, 1280] as const

interface VisitOptions {
  width?: number
  sheet?: 'day' | 'night'
  javaScript?: boolean
}

interface Visit {
  context: BrowserContext
  page: Page
  /** What the browser complained about: script errors, refused resources, hydration mismatches. */
  complaints: string[]
  close(): Promise<void>
}

/** Debian's Chromium, or the one that CHROMIUM_PATH names. */
async function openBrowser(): Promise<{ browser: Browser; visit(url: string, options?: VisitOptions): Promise<Visit>; close(): Promise<void> }> {
  const executablePath = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium'
  if (!existsSync(executablePath)) throw new Error(`There is no Chromium at ${executablePath}. Run these tests by \`npm test\`.`)
  const browser = await chromium.launch({
    executablePath,
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  })
  return {
    browser,
    async visit(baseURL, options = {}) {
      const context = await browser.newContext({
        baseURL,
        viewport: { width: options.width ?? 1280, height: 900 },
        colorScheme: options.sheet === 'night' ? 'dark' : 'light',
        javaScriptEnabled: options.javaScript ?? true,
        hasTouch: (options.width ?? 1280) < 500,
      })
      const page = await context.newPage()
      const complaints: string[] = []
      page.on('pageerror', (error) => complaints.push(`script error: ${error.message}`))
      page.on('console', (message) => {
        if (message.type() === 'error' || /hydration/i.test(message.text())) complaints.push(message.text())
      })
      return { context, page, complaints, close: () => context.close() }
    },
    close: () => browser.close(),
  }
}

/** Signs in as a person does: through the form. */
async function signInByForm(page: Page, who: { email: string; password: string }): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(who.email)
  await page.getByLabel('Password', { exact: true }).fill(who.password)
  await page.locator('main').getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => url.pathname !== '/sign-in')
}
