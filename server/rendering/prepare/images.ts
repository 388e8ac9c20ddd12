export { prepareImages }

import type { Token } from 'markdown-it'
import { inlineText } from './inline-text.ts'
import type { Rendering } from './rendering.ts'
import { eachInline } from './walk.ts'

/** A guide shows no pictures from elsewhere: of each only the words for it stay, and the writer is told. */
function prepareImages(tokens: Token[], rendering: Rendering): void {
  eachInline(tokens, (token, line) => {
    if (token.type !== 'image') return
    rendering.report(
      line,
      'no_pictures',
      'Guides hold no pictures. Only the words in its brackets are shown.',
    )
    token.content = inlineText(token.children ?? [])
    token.type = 'text'
    token.tag = ''
    token.attrs = null
    token.children = null
  })
}
