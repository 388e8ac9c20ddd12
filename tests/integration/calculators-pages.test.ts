import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { loadCalculators } from '#server/calculators/index.ts'
import { createTestApp, type TestApp } from '../support/test-app.ts'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp()
})
afterAll(() => app.stop())

const page = async (path: string) => (await app.agent().get(path).expect(200)).text
const calculators = [...(await loadCalculators()).values()]

/** The entries of the shelf that are shown. */
const shown = (html: string) =>
  [...html.matchAll(/<li([^>]*)data-words="[^"]*"[^>]*>\s*<a href="\/calculators\/([^"]+)"/g)]
    .filter(([, attributes]) => !attributes!.includes('hidden'))
    .map(([, , slug]) => slug)

describe('the shelf of calculators', () => {
  it('shows every calculator, by the part of the car it is about', async () => {
    const html = await page('/calculators')
    expect(shown(html).sort()).toEqual(calculators.map(({ slug }) => slug).sort())
    expect(html).toContain('Diffs and driveline')
  })

  it.each([
    ['pinion', 'gearing'],
    ['how thick in the heat', 'fluid-temperature'],
    ['SPRINGS', 'spring-rate'],
  ])('finds “%s” without a script', async (question, slug) => {
    const html = await page(`/calculators?find=${encodeURIComponent(question)}`)
    expect(shown(html)).toContain(slug)
    expect(shown(html).length).toBeLessThan(calculators.length / 2)
    expect(html).toContain(`value="${question}"`)
  })

  it('says what to do when nothing answers', async () => {
    const html = await page('/calculators?find=xylophone')
    expect(shown(html)).toEqual([])
    expect(html).toContain('Nothing answers “xylophone” yet.')
    expect(html).toContain('Say it in other words')
  })

  it.each(['<script>alert(1)</script>', '"><img src=x onerror=alert(1)>', '%', 'é'.repeat(500), '\u0000', '-'])(
    'takes %j as words',
    async (question) => {
      const html = await page(`/calculators?find=${encodeURIComponent(question)}`)
      expect(html).not.toContain('<script>alert')
      expect(html).not.toContain('<img src=x')
    },
  )

  it('ships one script, that of its search', async () => {
    expect((await page('/calculators')).match(/<script(?![^>]*json)/g)).toHaveLength(1)
  })

  it('takes the first of two questions', async () => {
    expect(shown(await page('/calculators?find=pinion&find=spring'))).not.toEqual([])
  })
})

describe('the page of a calculator', () => {
  it.each(calculators.map(({ slug }) => slug))('%s explains itself', async (slug) => {
    const html = await page(`/calculators/${slug}`)
    expect(html).toContain('Where the formula comes from')
    expect(html).toContain('Where it holds')
    expect(html).toContain('Who says so')
    expect(html).toContain('Show the working')
    expect(html).not.toMatch(/NaN|undefined|Infinity/)
    // The policy of the page refuses style attributes.
    expect(html).not.toMatch(/\sstyle="/)
  })

  it('lists the guides that use it and the others about the same part', async () => {
    const html = await page('/calculators/fluid-temperature')
    expect(html).toContain('Guides that use it')
    expect(html).toContain('/calculators/fluid-blend')
  })

  it('does not send the derivation to the browser a second time', async () => {
    const html = await page('/calculators/fluid-temperature')
    expect(html.match(/A liquid flows when its molecules/g)).toHaveLength(1)
  })

  it('is missing with a page that says so', async () => {
    await app.agent().get('/calculators/no-such-thing').expect(404)
  })
})
