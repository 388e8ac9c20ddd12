export { inlineText }

import type { Token } from 'markdown-it'
import { directiveOf } from '../directives/plugin.ts'

/** The words of a stretch of inline tokens, without any markup. A formula counts as its TeX. */
function inlineText(tokens: Token[]): string {
  return tokens.map(textOf).join('')
}

function textOf(token: Token): string {
  switch (token.type) {
    case 'text':
    case 'text_special':
    case 'code_inline':
      return token.content
    case 'softbreak':
    case 'hardbreak':
      return ' '
    case 'image':
      return inlineText(token.children ?? [])
    case 'directive':
      return directiveOf(token)?.label ?? ''
    default:
      return ''
  }
}
