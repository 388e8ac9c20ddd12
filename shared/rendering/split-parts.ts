export { PART_KINDS, partPlaceholder, splitParts }

import type { BodySegment, RenderedPart } from './parts.ts'

const PART_KINDS: readonly RenderedPart['kind'][] = ['calculator', 'effects', 'worked']
const PLACEHOLDER = new RegExp(`<div data-part="(?:${PART_KINDS.join('|')})" data-n="([1-9][0-9]?)"></div>`, 'g')

/** The empty element that stands for a part in stored HTML. */
function partPlaceholder({ kind, n }: Pick<RenderedPart, 'kind' | 'n'>): string {
  return `<div data-part="${kind}" data-n="${n}"></div>`
}

/**
 * A rendered body as what a page puts out one after the other: HTML and parts in reading order. Every HTML
 * segment is complete (parts stand only at the top level of a body), and a placeholder without its part is
 * left out.
 *
 * A member's words cannot pass for a placeholder: it holds both `<` and `"`, and serialised HTML never has
 * `<` in text nor `"` inside an attribute's value. A real element of that kind comes from the renderer alone,
 * because Markdown is read with HTML switched off, and the renderer checks that it finds exactly its own
 * placeholders in what it made.
 */
function splitParts(html: string, parts: readonly RenderedPart[]): BodySegment[] {
  const partByNumber = new Map(parts.map((part) => [part.n, part]))
  const segments: BodySegment[] = []
  let position = 0
  for (const match of html.matchAll(PLACEHOLDER)) {
    pushHtml(segments, html.slice(position, match.index))
    const part = partByNumber.get(Number(match[1]))
    if (part !== undefined && partPlaceholder(part) === match[0]) segments.push(part)
    position = match.index + match[0].length
  }
  pushHtml(segments, html.slice(position))
  return segments
}

function pushHtml(segments: BodySegment[], html: string): void {
  if (html !== '') segments.push({ kind: 'html', html })
}
