import fc from 'fast-check'
import { JSDOM } from 'jsdom'
import { expect, test } from 'vitest'
import { isAppError } from '../errors.ts'
import { vocabulary } from './fixtures/vocabulary.ts'
import { createBodyRenderer } from './render-body.ts'
import { createSanitiser } from './sanitise.ts'
import { partPlaceholder, splitParts } from '#shared/rendering/split-parts.ts'
import type { RenderResult } from './types.ts'

const render = createBodyRenderer()
const sanitise = createSanitiser()
const template = new JSDOM('').window.document.createElement('template')

/** Pieces that mean something to Markdown, directives, TeX or HTML, mixed with any characters at all. */
const piece = fc.oneof(
  { weight: 5, arbitrary: fc.constantFrom(
    '\n', '\n\n', ' ', '    ', '\t', '- ', '1. ', '> ', '## ', '# ', '|', '|-|', '|a|b|\n|-|-|\n', '*', '**', '_', '~~', '`', '```\n',
    '[', ']', '(', ')', '![', '](/a)', '](https://example.org)', '[a]: /b\n', '<', '>', '<b>', '&lt;', '&#60;', '\\', '"', '\'', '{', '}',
    ':', '::', ':::', ':::\n', ':::caution{kind=eyes}\n', '::::caution{kind=heat}\n', ':term[droop]', ':term[', ':basis[a]{kind=physics}',
    '::calculator{slug=fluid-temperature temperature=55}\n', '::effects{adjustable=front_diff_fluid}\n', ':formula[', '\\frac{a}{b}', '\\sqrt',
    '^', '&', '\\begin{matrix}', '\\end{matrix}', '<div data-part="calculator" data-n="1"></div>', '\0', '\u2028', '\ufeff', 'word', '7',
  ) },
  { weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 12 }) },
)
const markdown = fc.array(piece, { maxLength: 40 }).map((pieces) => pieces.join(''))

/** The result, or null for a refusal; a body renderer may throw nothing else. */
function renderOrRefuse(text: string): RenderResult | null {
  try {
    return render(text, vocabulary)
  } catch (error) {
    if (isAppError(error)) return null
    throw error
  }
}

test('any text is rendered or refused in words, and what is rendered holds', { timeout: 60_000 }, () => {
  fc.assert(
    fc.property(markdown, (text) => {
      const result = renderOrRefuse(text)
      if (result === null) return
      const { html, parts, problems, headings } = result
      expect(sanitise(html), 'sanitising once is enough').toBe(html)

      const segments = splitParts(html, parts)
      expect(segments.filter((segment) => segment.kind !== 'html')).toEqual(parts)
      expect(segments.map((segment) => (segment.kind === 'html' ? segment.html : partPlaceholder(segment))).join('')).toBe(html)
      for (const segment of segments) {
        if (segment.kind !== 'html') continue
        template.innerHTML = segment.html
        expect(template.innerHTML, 'each segment is complete HTML').toBe(segment.html)
      }

      const lines = text.split(/\r\n|\r|\n/).length
      for (const problem of problems) {
        expect(problem.line).toBeGreaterThanOrEqual(1)
        expect(problem.line).toBeLessThanOrEqual(lines)
      }
      expect(new Set(headings.map((heading) => heading.id)).size).toBe(headings.length)
    }),
    { numRuns: 400 },
  )
})

test('the same text gives the same result, whatever was rendered before', { timeout: 60_000 }, () => {
  fc.assert(
    fc.property(markdown, markdown, (text, other) => {
      const first = renderOrRefuse(text)
      renderOrRefuse(other)
      expect(renderOrRefuse(text)).toEqual(first)
    }),
    { numRuns: 50 },
  )
})
