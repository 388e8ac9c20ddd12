import { JSDOM } from 'jsdom'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createTestApp, type TestApp } from '../support/test-app.ts'

let app: TestApp
beforeAll(async () => {
  app = await createTestApp()
})
afterAll(() => app.stop())

async function read(path: string, agent = app.agent()): Promise<Document> {
  const answer = await agent.get(path).expect(200)
  return new JSDOM(answer.text).window.document
}
const words = (element: Element | null | undefined) => element?.textContent?.replace(/\s+/g, ' ').trim() ?? ''

describe('a guide page', () => {
  it('answers from the top down: title, in short, two answers, lap, when and how much, text, who says so', async () => {
    const document = await read('/guides/diff-fluids')
    expect(words(document.querySelector('h1'))).toMatch(/^B1 /)
    const order = ['h1', '.deck', '.ways', '#around-the-lap', '#when-and-how-much', '.read.hang', '#who-says-so', '.g-end']
      .map((selector) => document.querySelector(selector)!)
    order.slice(1).forEach((element, at) => {
      expect(order[at]!.compareDocumentPosition(element) & document.defaultView!.Node.DOCUMENT_POSITION_FOLLOWING).toBeTruthy()
    })
    expect(words(document.querySelector('.g-side'))).toContain('Imre Vass')
    expect(words(document.querySelector('.g-side'))).toContain('by Odile Marchetti')
  })

  it('lists every section in the thumb index, in the order of the page', async () => {
    const document = await read('/guides/sway-bars')
    const targets = [...document.querySelectorAll<HTMLAnchorElement>('.thumb a')].map((anchor) => anchor.getAttribute('href')!.slice(1))
    const headings = [...document.querySelectorAll('article h2')].filter((heading) => heading.closest('.ways, .calc') === null)
    expect(targets).toEqual(headings.map((heading) => heading.id.replace(/-h$/, '')))
  })

  it('shows the effects as they stand in the database, and only those that hold on the ground asked for', async () => {
    const anywhere = await read('/guides/diff-fluids')
    expect(words(anywhere.querySelector('#around-the-lap'))).toContain('Front diff fluid: thicker')
    const low = await read('/guides/diff-fluids?ground=low_bite')
    expect(words(low.querySelector('.grounds [aria-pressed=true]'))).toBe('Low bite')
    expect(words(low.querySelector('#around-the-lap caption'))).toContain('low bite')
    expect(low.querySelector('#around-the-lap table')!.textContent).not.toBe(anywhere.querySelector('#around-the-lap table')!.textContent)
    const unknown = await read('/guides/diff-fluids?ground=gravel')
    expect(words(unknown.querySelector('.grounds [aria-pressed=true]'))).toBe('Any ground')
  })

  it('works examples out again and says that they match', async () => {
    const document = await read('/guides/diff-fluids')
    const examples = [...document.querySelectorAll('.worked')].map(words)
    expect(examples).toHaveLength(3)
    for (const example of examples) expect(example).toContain('Matches')
    expect(examples[0]).toContain('4.854\u00A0mL'.replace('\u00A0', ' '))
  })

  it('calculates without a script: the form goes to the guide itself, which answers with the numbers sent', async () => {
    const before = await read('/guides/diff-fluids')
    const form = before.querySelector<HTMLFormElement>('#fluid-blend form')!
    expect(form.method).toBe('get')
    expect(form.getAttribute('action')).toBe('/guides/diff-fluids#fluid-blend')
    const query = new URLSearchParams()
    for (const input of form.querySelectorAll<HTMLInputElement>('input[name]')) query.set(input.name, input.value)
    query.set('fluid-blend.targetViscosity', '8000')
    const after = await read(`/guides/diff-fluids?${query}`)
    // 10 mL × ln(8000/5000) / ln(10000/5000) = 6.78 mL, by hand from the rule of Arrhenius.
    expect(words(after.querySelector('#fluid-blend .says'))).toContain('6.78')
    expect(words(after.querySelector('#fluid-temperature .says'))).toBe(words(before.querySelector('#fluid-temperature .says')))
  })

  it('says at the field what is wrong with a number, and keeps it', async () => {
    const document = await read('/guides/diff-fluids?fluid-blend.targetViscosity=lots')
    expect(words(document.querySelector('#fluid-blend .says'))).toContain('No answer')
    expect(document.querySelector<HTMLInputElement>('[name="fluid-blend.targetViscosity"]')?.value).toBe('lots')
  })

  it('shows cautions, sources with their kind, and says honestly that nobody has reported a heat', async () => {
    const document = await read('/guides/lithium-battery-care')
    expect(document.querySelectorAll('.caution').length).toBeGreaterThan(1)
    const diffs = await read('/guides/diff-fluids')
    expect(diffs.querySelectorAll('.srcs > li').length).toBeGreaterThan(2)
    for (const source of diffs.querySelectorAll('.srcs > li')) expect(words(source.querySelector('small'))).not.toBe('')
    expect(words(diffs.querySelector('#who-says-so'))).toContain('No reports yet')
  })

  it('carries its article data as safe JSON', async () => {
    const document = await read('/guides/droop')
    const script = document.querySelector('script[type="application/ld+json"]')!
    expect(script.textContent).not.toMatch(/[<>]/)
    expect(JSON.parse(script.textContent!)).toMatchObject({ '@type': 'Article', url: `${app.app.config.origin}/guides/droop` })
  })

  it('offers a visitor to sign in and come back, and a member a draft', async () => {
    const visitor = await read('/guides/droop')
    expect(visitor.querySelector('.g-end a[href="/sign-in?next=%2Fguides%2Fdroop"]')).not.toBeNull()
    const member = await read('/guides/droop', await app.signedIn('priya'))
    const form = member.querySelector<HTMLFormElement>('.g-end form[action="/write"]')!
    expect(form.method).toBe('post')
    expect(form.querySelector<HTMLInputElement>('[name=guideSlug]')?.value).toBe('droop')
  })

  it('ships one small script, for its calculators, and none of its data twice', async () => {
    const { text } = await app.agent().get('/guides/diff-fluids').expect(200)
    const document = new JSDOM(text).window.document
    expect(document.querySelectorAll('[data-island]').length).toBe(2)
    const sentence = 'It never locks.'
    expect(text.split(sentence).length - 1).toBe(1)
  })
})

describe('the history of a guide', () => {
  it('shows one layer for each edition, and an edition that says clearly that it is one', async () => {
    const history = await read('/guides/droop/history')
    expect(history.querySelectorAll('.layer:not(.no)')).toHaveLength(1)
    const edition = await read('/guides/droop/editions/1')
    expect(words(edition.querySelector('.old-ed'))).toContain('Edition 1, the one that is printed now')
    expect(edition.querySelector('form[action="/write"]')).toBeNull()
  })

  it('says so when two editions are the same', async () => {
    const comparison = await read('/guides/droop/compare?from=1&to=1')
    expect(words(comparison.querySelector('.deck'))).toBe('The two say the same.')
  })
})

describe('the lap', () => {
  it('leads from every complaint on the front page to changes that answer it', async () => {
    const front = await read('/')
    const complaints = [...front.querySelectorAll<HTMLAnchorElement>('.lm a')].map((anchor) => anchor.getAttribute('href')!)
    expect(complaints.length).toBeGreaterThan(12)
    for (const complaint of complaints) {
      expect((await read(complaint)).querySelectorAll('.try').length, complaint).toBeGreaterThan(0)
    }
  })

  it('names size, strength, minutes and guide of each change', async () => {
    const document = await read('/lap/exit')
    for (const row of document.querySelectorAll('.lp-row')) {
      expect(words(row)).toMatch(/at a time/)
      expect(words(row)).toMatch(/(A touch|Clearly|A lot) (more|less)/)
      expect(words(row)).toMatch(/\d+ min/)
      expect(row.querySelector('a[href^="/guides/"]')).not.toBeNull()
    }
  })
})

describe('a calculator page', () => {
  it('computes what its address says, and names the guides that use it', async () => {
    const document = await read('/calculators/fluid-blend?fluid-blend.targetViscosity=8000')
    expect(words(document.querySelector('#fluid-blend .says'))).toContain('6.78')
    expect(document.querySelector('section[aria-labelledby="used"] a[href="/guides/diff-fluids"]')).not.toBeNull()
  })
})
