export { prepareHeadings, headingId }

import type { Token } from 'markdown-it'
import { inlineText } from './inline-text.ts'
import type { Rendering } from './rendering.ts'
import { eachBlock, hide } from './walk.ts'

/**
 * Ids get it so that no heading can take the name of something in the page or of a property of the window.
 */
const ID_PREFIX = 's-'
const MAX_SLUG = 60
const TOP_LEVEL = 2

/** Gives headings ids, keeps the page's `h1` for its title, and gathers the list of headings. */
function prepareHeadings(tokens: Token[], rendering: Rendering): void {
  const timesUsed = new Map<string, number>()
  let levelBefore = TOP_LEVEL - 1

  eachBlock(tokens, (open, line, index) => {
    if (open.type !== 'heading_open') return
    const inline = tokens[index + 1]!
    const close = tokens[index + 2]!
    const text = inlineText(inline.children ?? []).trim()
    if (text === '') {
      rendering.report(line, 'empty_heading', 'This heading has no words. Give it some, or take the # out.')
      for (const token of [open, inline, close]) hide(token)
      inline.children = []
      return
    }

    const written = Number(open.tag.slice(1))
    const level = Math.max(TOP_LEVEL, written)
    if (written < TOP_LEVEL) {
      rendering.report(
        line,
        'heading_too_high',
        'The title is the only heading with one #. Start headings in the text with ##.',
      )
    } else if (level > levelBefore + 1) {
      const marks = '#'.repeat(levelBefore + 1)
      rendering.report(line, 'heading_skips', `This heading skips a level: write ${marks} here.`)
    }
    levelBefore = level

    const id = uniqueId(headingId(text), timesUsed)
    open.tag = close.tag = `h${level}`
    open.attrSet('id', id)
    if (open.level === 0) rendering.headings.push({ level, id, text })
  })
}

/** `Why it works` → `s-why-it-works`. */
function headingId(text: string): string {
  const slug = text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-/, '')
    .slice(0, MAX_SLUG)
    .replace(/-$/, '')
  return ID_PREFIX + (slug === '' ? 'section' : slug)
}

function uniqueId(base: string, timesUsed: Map<string, number>): string {
  let id = base
  while (timesUsed.has(id)) {
    const times = timesUsed.get(base)! + 1
    timesUsed.set(base, times)
    id = `${base}-${times}`
  }
  timesUsed.set(id, 1)
  return id
}
