import { JSDOM } from 'jsdom'
import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { PHASES } from '#shared/vocabulary/phases.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp()
})
afterAll(() => app.stop())

async function read(path: string, status = 200): Promise<Document> {
  const answer = await app.agent().get(path).expect(status)
  return new JSDOM(answer.text, { url: `${app.url}${path}` }).window.document
}

const meta = (document: Document, name: string) =>
  document.querySelector(`meta[name="${name}"], meta[property="${name}"]`)?.getAttribute('content')

const SLUGS = [
  'diff-fluids', 'sway-bars', 'rear-toe', 'anti-squat', 'droop', 'shock-oil-and-pistons', 'filling-diffs-and-shocks', 'lithium-battery-care',
]
const PAGES = [
  '/', '/chapters', ...[...'ABCDEFGH'].map((letter) => `/chapters/${letter}`), ...SLUGS.map((slug) => `/guides/${slug}`),
  '/guides/droop/history', '/guides/droop/editions/1', '/guides/droop/compare?from=1&to=1', '/glossary', '/calculators',
  '/calculators/fluid-blend', '/calculators/fluid-temperature', ...PHASES.map((phase) => `/lap/${phase}`), '/about/approval', '/about/sure',
]

describe('every page that is read', () => {
  const titles = new Map<string, string>()
  const descriptions = new Map<string, string>()

  it.each(PAGES)('%s names itself, holds one h1 and skips no heading level', async (path) => {
    const document = await read(path)
    expect(document.title).toMatch(/Camber & Clay/)
    expect(titles.get(document.title)).toBeUndefined()
    titles.set(document.title, path)
    const description = meta(document, 'description') ?? ''
    expect(description.length).toBeGreaterThan(40)
    expect(descriptions.get(description)).toBeUndefined()
    descriptions.set(description, path)

    const levels = [...document.querySelectorAll('h1,h2,h3,h4,h5,h6')].map((heading) => Number(heading.tagName[1]))
    expect(levels.filter((level) => level === 1)).toHaveLength(1)
    levels.slice(1).forEach((level, at) => expect(level - levels[at]!, `heading ${at + 2} of ${path}`).toBeLessThanOrEqual(1))
  })

  it.each(PAGES)('%s has its canonical address and Open Graph data from the configured origin', async (path) => {
    const document = await read(path)
    const address = `${app.app.config.origin}${path.split('?')[0]}`
    expect(document.querySelector('link[rel=canonical]')?.getAttribute('href')).toBe(address)
    expect(meta(document, 'og:url')).toBe(address)
    expect(meta(document, 'og:title')).toBe(document.title)
    expect(meta(document, 'og:description')).toBe(meta(document, 'description'))
  })

  it.each(PAGES)('%s carries no style attribute, no repeated id and no link to an address that is not there', async (path) => {
    const document = await read(path)
    expect([...document.querySelectorAll('[style]')].map((element) => element.outerHTML)).toEqual([])
    const ids = [...document.querySelectorAll('[id]')].map(({ id }) => id)
    expect(ids.filter((id, at) => ids.indexOf(id) !== at)).toEqual([])
    for (const anchor of document.querySelectorAll<HTMLAnchorElement>('a[href^="#"]')) {
      const id = decodeURIComponent(anchor.hash.slice(1))
      expect(document.getElementById(id), `${anchor.getAttribute('href')} in ${path}`).not.toBeNull()
    }
  })

  it.each(['/', '/chapters', '/chapters/B', '/guides/droop/history', '/glossary', '/lap/entry', '/about/sure'])(
    '%s ships no script at all',
    async (path) => {
      const document = await read(path)
      const scripts = [...document.querySelectorAll('script')].filter((script) => !/json/.test(script.type))
      expect(scripts.map((script) => script.outerHTML)).toEqual([])
      expect([...document.querySelectorAll('link[rel=modulepreload]')].map((link) => link.outerHTML)).toEqual([])
    },
  )

  it('has no link inside the book that leads nowhere', async () => {
    const seen = new Set<string>()
    const dead: string[] = []
    for (const path of PAGES) {
      for (const anchor of (await read(path)).querySelectorAll<HTMLAnchorElement>('a[href^="/"]')) {
        const [address = '', hash] = anchor.getAttribute('href')!.split('#')
        const key = `${address}#${hash ?? ''}`
        if (seen.has(key)) continue
        seen.add(key)
        const answer = await app.agent().get(address)
        if (answer.status >= 400) dead.push(`${path} → ${address}: ${answer.status}`)
        else if (hash && answer.status === 200) {
          const target = new JSDOM(answer.text).window.document.getElementById(decodeURIComponent(hash))
          if (target === null) dead.push(`${path} → ${key}: no such part`)
        }
      }
    }
    expect(dead).toEqual([])
  }, 240_000)
})

describe('addresses', () => {
  it.each(['/guides/none-such', '/chapters/Z', '/calculators/none-such', '/lap/pits', '/guides/droop/editions/99', '/guides/droop/editions/x',
    '/guides/none-such/history', '/guides/droop/compare', '/guides/droop/compare?from=1&to=9', '/guides/droop/history?page=40'])(
    '%s answers 404 with the page for it',
    async (path) => {
      const document = await read(path, 404)
      expect(document.querySelector('h1')?.textContent).toBe('There is no such page')
    },
  )

  it('sends who comes by an old address to the new one', async () => {
    await app.app.db.execute(sql`insert into slug_redirects (slug, guide_id) select 'rear-droop', id from guides where slug = 'droop'`)
    for (const [old, now] of [
      ['/guides/rear-droop', '/guides/droop'],
      ['/guides/rear-droop/history', '/guides/droop/history'],
      ['/guides/rear-droop/editions/1', '/guides/droop/editions/1'],
    ] as const) {
      const answer = await app.agent().get(old).redirects(0).expect(301)
      expect(answer.headers.location).toBe(now)
    }
    await app.agent().get('/chapters/b').redirects(0).expect(301).expect('Location', '/chapters/B')
  })

  it('keeps search engines away from old editions and comparisons, and from nothing else', async () => {
    for (const path of PAGES) {
      const robots = meta(await read(path), 'robots')
      expect(robots, path).toBe(/\/(editions|compare)/.test(path) ? 'noindex' : undefined)
    }
  })
})
