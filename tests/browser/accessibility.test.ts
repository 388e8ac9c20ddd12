import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openBrowser } from '../support/browser.ts'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']

/** Every kind of page, by who can see it; `edit:` addresses are filled in with the edit that waits at the review desk. */
const PAGES: Record<string, string[]> = {
  visitor: [
    '/', '/chapters', '/chapters/B', '/chapters/A', '/guides/diff-fluids', '/guides/lithium-battery-care', '/guides/droop/history',
    '/guides/droop/editions/1', '/guides/droop/compare?from=1&to=1', '/glossary', '/calculators', '/calculators/fluid-blend',
    '/calculators/fluid-temperature?c.temperature=155', '/lap/entry', '/about/approval', '/about/sure', '/sign-in', '/join', '/forgotten',
    '/no-such-page', '/mailbox',
  ],
  tomasz: ['/you', '/write', '/write/edit:'],
  imre: ['/review', '/review/edit:', '/write'],
  wanda: ['/members'],
}

let chromium: Awaited<ReturnType<typeof openBrowser>>
let app: TestApp
let editOf: Record<string, string>

beforeAll(async () => {
  ;[chromium, app] = await Promise.all([openBrowser(), createTestApp()])
  const writer = await app.signedIn('tomasz')
  const draft = await writer.post('/api/edits').send({ guideSlug: 'sway-bars' })
  const desk = await (await app.signedIn('imre')).get('/api/edits?state=in_review&whose=everyone').expect(200)
  editOf = {
    tomasz: (draft.body as { id: string }).id,
    imre: (desk.body as { id: string }[])[0]!.id,
  }
})
afterAll(() => Promise.all([chromium.close(), app.stop()]))

describe.each(['day', 'night'] as const)('on the %s sheet', (sheet) => {
  describe.each([1280, 320])('at %i px', (width) => {
    it.each(Object.keys(PAGES))('nothing that a %s sees breaks an accessibility rule or scrolls sideways', async (who) => {
      const { context, page, complaints, close } = await chromium.visit(app.url, { width, sheet })
      if (who !== 'visitor') await context.request.post('/api/session', { data: DEMO_PASSWORDS[who]! })
      for (const path of PAGES[who]!) {
        await page.goto(path.replace('edit:', editOf[who] ?? ''), { waitUntil: 'networkidle' })
        // The policy of the page lets no script of ours in, so axe comes through the browser's own door.
        const found = await page.evaluate(`(async () => { ${axeSource}
          const { violations } = await axe.run(document, { runOnly: ${JSON.stringify(RULES)} })
          return violations.map(({ id, nodes }) => id + ': ' + nodes.map((node) => node.target.join(' ')).join(', ')) })()`)
        expect(found, path).toEqual([])
        const sideways = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)
        expect(sideways, `${path} scrolls sideways`).toBeLessThanOrEqual(0)
      }
      // A missing page is the one answer that the browser itself reports.
      expect(complaints.filter((complaint) => !complaint.includes('404'))).toEqual([])
      await close()
    })
  })
})
