export { plainText }

import type { Token } from 'markdown-it'
import { inlineText } from './prepare/inline-text.ts'

/**
 * The words of a body alone, one line a block. Calculators and formulas on lines of their own are left out.
 */
function plainText(tokens: Token[]): string {
  return tokens
    .map((token) => {
      if (token.type === 'inline') return inlineText(token.children ?? [])
      return token.type === 'fence' || token.type === 'code_block' ? token.content : ''
    })
    .map((text) => text.trim())
    .filter((text) => text !== '')
    .join('\n')
}
