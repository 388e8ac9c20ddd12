export { prepareTables }

import type { Token } from 'markdown-it'
import { inlineText } from './inline-text.ts'
import { eachBlock } from './walk.ts'

/** Column heads say what they head; alignment is a class, because styles in the page are not allowed. */
function prepareTables(tokens: Token[]): void {
  eachBlock(tokens, (cell, _line, index) => {
    if (cell.type !== 'th_open' && cell.type !== 'td_open') return
    const align = /^text-align:(left|center|right)$/.exec(String(cell.attrGet('style') ?? ''))?.[1]
    cell.attrs = align === undefined ? null : [['class', `align-${align}`]]
    if (cell.type === 'td_open') return
    if (inlineText(tokens[index + 1]?.children ?? []).trim() === '') {
      // A head without words heads nothing, and a screen reader would announce it empty.
      cell.tag = tokens[index + 2]!.tag = 'td'
    } else {
      cell.attrPush(['scope', 'col'])
    }
  })
}
