import type { Page } from 'playwright-core'
import { openBrowser, signInByForm, type Visit } from '../support/browser.ts'
import { startServerProcess } from '../support/server-process.ts'
import { DEMO_PASSWORDS } from '../support/test-app.ts'

/**
 * `npm run bench:size`: what a first visit to each kind of page carries over the wire, beside its budget, in bytes as sent with
 * the headers of the answers. Sizes are exact, so a broken budget is an exit code other than 0.
 * Needs a build and DATABASE_URL of a seeded database, in which an invented member begins a draft and withdraws it.
 */
const kB = 1000
const kinds = ['document', 'stylesheet', 'font', 'script', 'rest', 'total', 'requests'] as const
type Sizes = Record<(typeof kinds)[number], number>

const anyPage = { document: 30 * kB, stylesheet: 12 * kB, font: 40 * kB, script: 3 * kB }
const rows: { name: string; path: string | typeof beginDraft; budget: Partial<Sizes> }[] = [
  { name: 'front page', path: '/', budget: anyPage },
  { name: 'chapter', path: '/chapters/c', budget: anyPage },
  { name: 'guide, one calculator', path: '/guides/anti-squat', budget: { ...anyPage, script: 40 * kB } },
  { name: 'guide, two calculators', path: '/guides/diff-fluids', budget: { ...anyPage, script: 50 * kB } },
  { name: 'calculator', path: '/calculators/fluid-blend', budget: { ...anyPage, script: 40 * kB } },
  { name: 'glossary', path: '/glossary', budget: anyPage },
  { name: 'sign-in', path: '/sign-in', budget: anyPage },
  { name: 'writing desk', path: beginDraft, budget: { script: 120 * kB } },
]

const databaseUrl = process.env.DATABASE_URL
if (databaseUrl === undefined) throw new Error('DATABASE_URL: name a seeded database')
const server = await startServerProcess(databaseUrl, { APP_MODE: 'demo' })
const { visit, close } = await openBrowser()
const broken: string[] = []
console.log(['page'.padEnd(24), ...kinds.map((kind) => kind.padStart(15))].join(''))
for (const { name, path, budget } of rows) {
  const sizes = await measure(await visit(server.url, { width: 390 }), path)
  const cells = kinds.map((kind) => {
    const limit = budget[kind]
    if (limit !== undefined && sizes[kind] > limit) broken.push(`${name}: ${kind} ${sizes[kind]}, budget ${limit}`)
    return `${sizes[kind]}${limit === undefined ? '' : `/${limit}`}`.padStart(15)
  })
  console.log([name.padEnd(24), ...cells].join(''))
}
await close()
await server.stop()
console.log(broken.length === 0 ? 'All budgets hold.' : `Over budget:\n  ${broken.join('\n  ')}`)
process.exitCode = broken.length === 0 ? 0 : 1

async function measure({ page, close: leave }: Visit, path: (typeof rows)[number]['path']): Promise<Sizes> {
  const draft = typeof path === 'string' ? undefined : await path(page)
  const sizes = await watch(page)
  await page.goto(draft?.path ?? String(path), { waitUntil: 'networkidle' })
  // Islands wake up near the viewport: go past all of them, as a reader would.
  for (const island of await page.locator('[data-island]').all()) {
    await island.scrollIntoViewIfNeeded()
    await page.waitForFunction((element) => element?.hasAttribute('data-alive'), await island.elementHandle())
  }
  await draft?.withdraw()
  await leave()
  return sizes
}

/** Counts what arrives from now on, with an empty cache. */
async function watch(page: Page): Promise<Sizes> {
  const sizes: Sizes = { document: 0, stylesheet: 0, font: 0, script: 0, rest: 0, total: 0, requests: 0 }
  const kindOf = new Map<string, keyof Sizes>()
  const session = await page.context().newCDPSession(page)
  await session.send('Network.enable')
  await session.send('Network.clearBrowserCache')
  session.on('Network.responseReceived', ({ requestId, type }) => {
    const kind = type.toLowerCase()
    kindOf.set(requestId, kind === 'document' || kind === 'stylesheet' || kind === 'font' || kind === 'script' ? kind : 'rest')
  })
  session.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
    sizes[kindOf.get(requestId) ?? 'rest'] += encodedDataLength
    sizes.total += encodedDataLength
    sizes.requests += 1
  })
  return sizes
}

async function beginDraft(page: Page): Promise<{ path: string; withdraw(): Promise<void> }> {
  await signInByForm(page, DEMO_PASSWORDS.priya!)
  const post = (path: string, data: object, headers = {}) => page.request.post(path, { data, headers: { Origin: server.url, ...headers } })
  const begun = await post('/api/edits', { guideSlug: 'rear-toe' })
  if (!begun.ok()) throw new Error(`POST /api/edits: ${begun.status()} ${await begun.text()}`)
  const { id, version } = (await begun.json()) as { id: string; version: number }
  return {
    path: `/write/${id}`,
    async withdraw() {
      // 200 instead of 201: a draft that was there before, which stays.
      if (begun.status() === 201) await post(`/api/edits/${id}/withdraw`, {}, { 'If-Match': `"${version}"` })
    },
  }
}
