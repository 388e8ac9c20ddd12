export { assertLength, assertMarkup, assertTokens, measureMarkup }

import type { Token } from 'markdown-it'
import { RenderRefusedError } from './errors.ts'

/**
 * What a body may be before it is sanitised. Sanitising is more than linear in nesting depth: 14 kB of nested
 * emphasis took seconds without these limits, 64 KiB of prose takes well under one.
 */
const LIMITS = {
  bytes: 64 * 1024,
  depth: 32,
  tokens: 20_000,
  /** Elements of the HTML: one token may become several of them, as in a formula. */
  elements: 8_000,
  /** Of the HTML made from it: repeated references can turn a short text into a very long page. */
  htmlCharacters: 1024 * 1024,
}

const TOO_MANY =
  'This text has too many marks, links or table cells for one guide. Cut it down, or split it into two guides.'

/** @throws RenderRefusedError too_long */
function assertLength(markdown: string): void {
  const bytes = Buffer.byteLength(markdown, 'utf8')
  if (bytes <= LIMITS.bytes) return
  const over = Math.ceil((bytes - LIMITS.bytes) / 1024)
  throw new RenderRefusedError(
    'too_long',
    `The text is ${over} KiB over the limit of 64 KiB. Shorten it, or split it into two guides.`,
  )
}

/** @throws RenderRefusedError too_deep, too_many_tokens */
function assertTokens(tokens: Token[]): void {
  let count = 0
  for (const token of tokens) {
    const children = token.children ?? []
    count += 1 + children.length
    if (count > LIMITS.tokens) throw new RenderRefusedError('too_many_tokens', TOO_MANY)
    for (const child of children) assertDepth(token.level + child.level, token)
    assertDepth(token.level, token)
  }
}

function assertDepth(level: number, token: Token): void {
  if (level <= LIMITS.depth) return
  const where = token.map === null ? '' : ` near line ${token.map[0] + 1}`
  throw new RenderRefusedError(
    'too_deep',
    `Lists, quotes or emphasis are nested more than ${LIMITS.depth} deep${where}. Take some of the nesting out.`,
  )
}

/**
 * The limits of the HTML, before it is sanitised.
 *
 * @throws RenderRefusedError too_long, too_many_tokens
 */
function assertMarkup(html: string): void {
  if (html.length > LIMITS.htmlCharacters) {
    throw new RenderRefusedError(
      'too_long',
      'Written out, this text fills more than 1 MiB. Use fewer repeated links, or split it into two guides.',
    )
  }
  if (measureMarkup(html).elements > LIMITS.elements) throw new RenderRefusedError(
    'too_many_tokens',
    TOO_MANY,
  )
}

/** Counts the elements of well-formed markup and how deep they nest, in one pass. */
function measureMarkup(html: string): { elements: number; depth: number } {
  let elements = 0
  let open = 0
  let depth = 0
  for (const [, closing, name] of html.matchAll(/<(\/?)([a-zA-Z][a-zA-Z0-9]*)/g)) {
    if (closing === '/') {
      open -= 1
      continue
    }
    elements += 1
    if (name === 'br' || name === 'hr') continue
    open += 1
    depth = Math.max(depth, open)
  }
  return { elements, depth }
}
