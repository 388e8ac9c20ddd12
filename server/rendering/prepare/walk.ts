export { eachBlock, eachInline, hide }

import type { Token } from 'markdown-it'
import { directiveOf } from '../directives/plugin.ts'

/** Visits block tokens with their line in the Markdown, counted from 1. */
function eachBlock(tokens: Token[], visit: (token: Token, line: number, index: number) => void): void {
  let line = 1
  tokens.forEach((token, index) => {
    // Closing tokens and some table cells carry no line of their own.
    if (token.map !== null) line = token.map[0] + 1
    visit(token, line, index)
  })
}

/** Visits the inline tokens of every block with their line in the Markdown. */
function eachInline(
  tokens: Token[],
  visit: (child: Token, line: number, index: number, siblings: Token[]) => void,
): void {
  eachBlock(tokens, (block, firstLine) => {
    if (block.type !== 'inline' || block.children === null) return
    let line = firstLine
    block.children.forEach((child, index, siblings) => {
      visit(child, line, index, siblings)
      if (child.type === 'softbreak' || child.type === 'hardbreak') line += 1
      else if (child.type === 'directive') line += (directiveOf(child)?.source.split('\n').length ?? 1) - 1
    })
  })
}

/** Leaves a token out of the HTML without moving the others. */
function hide(token: Token): void {
  token.type = 'hidden'
  token.hidden = true
  token.tag = ''
  token.content = ''
  token.attrs = null
  token.meta = null
}
