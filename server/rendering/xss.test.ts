import { JSDOM } from 'jsdom'
import { expect, test } from 'vitest'
import { xssPayloads } from '../../tests/security/xss-payloads.ts'
import { vocabulary } from './fixtures/vocabulary.ts'
import { createBodyRenderer } from './render-body.ts'
import { ALLOWED_ELEMENTS } from './sanitise-profile.ts'

const render = createBodyRenderer()
const { window } = new JSDOM('')

/** A page with a body in it, read by a parser in the state of a whole document. */
function page(html: string): Document {
  return new window.DOMParser().parseFromString(`<!doctype html><body><main><article id="body">${html}</article></main>`, 'text/html')
}

test('there are many payloads, none twice', () => {
  expect(xssPayloads.length).toBeGreaterThanOrEqual(150)
  expect(new Set(xssPayloads).size).toBe(xssPayloads.length)
})

test.each(xssPayloads)('nothing runs: %j', (payload) => {
  const { html } = render(payload, vocabulary)
  const document = page(html)
  const article = document.getElementById('body')!

  expect(document.body.querySelectorAll('main > article').length, 'the text closed the element around it').toBe(1)
  expect(document.body.children.length).toBe(1)
  for (const element of article.querySelectorAll('*')) {
    expect(ALLOWED_ELEMENTS.has(element.localName), `<${element.localName}> in ${html}`).toBe(true)
    for (const { name, value } of element.attributes) {
      expect(name, html).not.toMatch(/^on|^style$|^src|^action$|^formaction$|^name$/)
      if (name === 'id') expect(value, html).toMatch(/^s-/)
      if (name === 'href') expectSafeAddress(value)
    }
  }
  const forbidden = 'script, style, link, meta, base, iframe, frame, object, embed, form, input, button, img, svg, template, a a'
  expect(article.querySelectorAll(forbidden).length, html).toBe(0)
})

function expectSafeAddress(value: string): void {
  const url = new URL(value, 'https://club.invalid/guides/x')
  expect(['http:', 'https:', 'mailto:'], value).toContain(url.protocol)
  expect(url.username + url.password, value).toBe('')
  if (!/^(?:https?:|mailto:)/.test(value)) expect(url.origin, value).toBe('https://club.invalid')
}

test('template marks of any kind stay words', () => {
  const { html } = render('{{7*7}} {{constructor.constructor(`x`)()}} ${1} <%= 2 %>', vocabulary)
  expect(html).toContain('{{7*7}}')
  expect(html).toContain('${1} &lt;%= 2 %&gt;')
})

test('headings cannot take the name of anything in the window or the document', () => {
  const names = ['location', 'body', 'cookie', 'constructor', '__proto__', 'attributes', 'getElementById', 's', '语言']
  const { html } = render(names.map((name) => `## ${name}`).join('\n\n'), vocabulary)
  const document = page(html)
  const untouched = new JSDOM('').window
  const ids = [...document.querySelectorAll('article [id]')].map((element) => element.id)
  expect(ids).toHaveLength(names.length)
  for (const id of ids) {
    expect(id).toMatch(/^s-/)
    expect(id in untouched.document).toBe(false)
    expect(id in untouched, id).toBe(false)
  }
  expect(String(document.cookie)).toBe('')
})
