import { openBrowser, type Visit } from '../support/browser.ts'
import { startServerProcess } from '../support/server-process.ts'

/**
 * `npm run bench:size`: what a first visit to each kind of page carries over the wire, in bytes as sent, beside its budget.
 * Needs DATABASE_URL of a seeded database and a build. Sizes are exact, so the exit code says whether all budgets hold.
 */
const kB = 1000
const pages = [
  { name: 'guide without calculator', path: '/guides/rear-toe', budget: { script: 3 * kB, document: 30 * kB, stylesheet: 12 * kB } },
  { name: 'guide with calculators', path: '/guides/diff-fluids', budget: { script: 60 * kB, document: 30 * kB, stylesheet: 12 * kB } },
  { name: 'calculator', path: '/calculators/fluid-blend', budget: { script: 40 * kB, document: 30 * kB, stylesheet: 12 * kB } },
  { name: 'front page', path: '/', budget: { script: 3 * kB, document: 30 * kB, stylesheet: 12 * kB } },
]

const databaseUrl = process.env.DATABASE_URL
if (databaseUrl === undefined) throw new Error('DATABASE_URL: name a seeded database')
const server = await startServerProcess(databaseUrl)
const { visit, close } = await openBrowser()
let within = true
for (const { name, path, budget } of pages) {
  const sizes = await measure(await visit(server.url, { width: 390 }), path)
  const lines = Object.entries(sizes).map(([kind, { bytes, count }]) => {
    const limit = budget[kind as keyof typeof budget]
    const over = limit !== undefined && bytes > limit
    if (over) within = false
    return `  ${kind.padEnd(12)}${String(bytes).padStart(8)} B in ${count}${limit === undefined ? '' : `  (budget ${limit}${over ? ', OVER' : ''})`}`
  })
  console.log(`${name} ${path}\n${lines.join('\n')}`)
}
await close()
await server.stop()
process.exitCode = within ? 0 : 1

async function measure({ context, page, close: leave }: Visit, path: string): Promise<Record<string, { bytes: number; count: number }>> {
  const kinds = new Map<string, string>()
  const sizes: Record<string, { bytes: number; count: number }> = {}
  const session = await context.newCDPSession(page)
  await session.send('Network.enable')
  session.on('Network.responseReceived', ({ requestId, type }) => kinds.set(requestId, type.toLowerCase()))
  session.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
    const kind = kinds.get(requestId) ?? 'other'
    const sum = (sizes[kind] ??= { bytes: 0, count: 0 })
    sum.bytes += encodedDataLength
    sum.count += 1
  })
  await page.goto(path, { waitUntil: 'networkidle' })
  // Islands wake up near the viewport: go past all of them, as a reader would.
  for (const island of await page.locator('[data-island]').all()) {
    await island.scrollIntoViewIfNeeded()
    await page.waitForLoadState('networkidle')
  }
  await leave()
  return sizes
}
