import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createTestApp, type TestApp } from '../support/test-app.ts'
import { rows } from './edits-support.ts'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp()
})
afterAll(() => app.stop())

describe('GET /api/guides', () => {
  it('lists guides by mark, as the contract says', async () => {
    const list = (await app.agent().get('/api/guides').expect(200)).body
    expect(list.length).toBeGreaterThanOrEqual(8)
    for (const guide of list) {
      expect(Object.keys(guide).sort()).toEqual(['chapter', 'edition', 'inShort', 'mark', 'slug', 'title'])
      expect(guide.mark).toMatch(/^[A-Z]\d+$/)
    }
    const marks = list.map((guide: { mark: string }) => guide.mark)
    expect(marks).toEqual([...marks].sort((a, b) => a[0]!.localeCompare(b[0]!) || Number(a.slice(1)) - Number(b.slice(1))))
  })

  it('lists one chapter, and an empty one as empty', async () => {
    const list = (await app.agent().get('/api/guides?chapter=B').expect(200)).body
    expect(new Set(list.map((guide: { chapter: string }) => guide.chapter))).toEqual(new Set(['B']))
    expect((await app.agent().get('/api/guides?chapter=Z').expect(200)).body).toEqual([])
    expect((await app.agent().get('/api/guides?page=9').expect(200)).body).toEqual([])
  })

  it.each(['chapter=b', 'chapter=BB', 'page=0', 'page=-1', 'page=1.5', 'x=1', 'chapter=A&chapter=B'])('%s: 422 at the field', async (query) => {
    const answer = await app.agent().get(`/api/guides?${query}`).expect(422)
    expect(answer.type).toBe('application/problem+json')
    expect(answer.body.errors).toHaveLength(1)
  })
})

describe('GET /api/guides/:slug', () => {
  it('gives the whole guide', async () => {
    const guide = (await app.agent().get('/api/guides/droop').expect(200)).body
    expect(guide).toMatchObject({ slug: 'droop', mark: 'E3', chapter: { letter: 'E' }, edition: 1, editions: 1, author: { name: 'Priya Haldane' } })
    expect(guide.html).toContain('<h2')
    expect(guide.headings[0]).toMatchObject({ level: 2, text: 'What it is' })
    for (const effect of guide.effects) expect(guide.adjustables.map((one: { key: string }) => one.key)).toContain(effect.adjustable)
  })

  it('takes at most four statements', async () => {
    const { pool } = app.app.connection
    let statements = 0
    const query = pool.query.bind(pool)
    pool.query = ((...args: Parameters<typeof query>) => {
      statements += 1
      return query(...args)
    }) as typeof pool.query
    try {
      await app.agent().get('/api/guides/sway-bars').expect(200)
    } finally {
      pool.query = query as typeof pool.query
    }
    expect(statements).toBeGreaterThan(0)
    expect(statements).toBeLessThanOrEqual(4)
  })

  it.each(['no-such-guide', '..%2Fx', '%00', 'x'.repeat(300), 'DROOP'])('%s: 404', async (slug) => {
    const answer = await app.agent().get(`/api/guides/${slug}`).expect(404)
    expect(answer.type).toBe('application/problem+json')
  })

  it('sends an old address on to the new one', async () => {
    await rows(app, `insert into slug_redirects (slug, guide_id) select 'down-travel', id from guides where slug = 'droop'`)
    const answer = await app.agent().get('/api/guides/down-travel').expect(301)
    expect(answer.headers['location']).toBe('/api/guides/droop')
  })
})

it('chapters count their guides and what they lack', async () => {
  const chapters = (await app.agent().get('/api/chapters').expect(200)).body
  expect(chapters.map((chapter: { letter: string }) => chapter.letter)).toEqual(['A', 'B', 'C', 'D', 'E', 'F', 'G', 'H'])
  const [counted] = await rows<{ guides: number; wanted: number }>(
    app,
    `select (select count(*)::int from guides where chapter = 'B') as guides, (select count(*)::int from wanted_guides where chapter = 'B') as wanted`,
  )
  expect(chapters[1]).toMatchObject(counted!)
})

it('glossary and adjustables are there for outside programs', async () => {
  const terms = (await app.agent().get('/api/glossary').expect(200)).body
  expect(terms.find((term: { key: string }) => term.key === 'droop')).toMatchObject({ term: expect.any(String), short: expect.any(String) })
  const adjustables = (await app.agent().get('/api/adjustables').expect(200)).body
  expect(adjustables.find((one: { key: string }) => one.key === 'front_diff_fluid')).toMatchObject({ up: 'thicker', down: 'thinner', unit: 'cSt', axle: 'front' })
})
