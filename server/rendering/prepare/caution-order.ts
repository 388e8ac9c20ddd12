export { emphasiseOrders }

import MarkdownIt from 'markdown-it'
import type { Token } from 'markdown-it'
import { directiveOf } from '../directives/plugin.ts'
import type { Rendering } from './rendering.ts'
import { eachBlock } from './walk.ts'

const SENTENCE_END = /[.!?…](?=\s|$)/

/** A caution opens with its order: the first sentence, made bold unless the writer did so. */
function emphasiseOrders(tokens: Token[], rendering: Rendering): void {
  eachBlock(tokens, (token, line, index) => {
    const directive = directiveOf(token)
    if (token.type !== 'directive_open' || directive?.form !== 'container' || directive.name !== 'caution') return
    const [paragraph, inline] = [tokens[index + 1], tokens[index + 2]]
    if (paragraph?.type !== 'paragraph_open' || inline === undefined) {
      rendering.report(
        line,
        'caution_without_order',
        'Start a caution with one sentence that says what to do, then the reason.',
      )
      return
    }
    const first = inline.children?.find((child) => child.type !== 'text' || child.content !== '')
    if (first?.type !== 'strong_open') inline.children = withBoldOrder(inline.children ?? [])
  })
}

function withBoldOrder(children: Token[]): Token[] {
  const open = new MarkdownIt.Token('strong_open', 'strong', 1)
  const close = new MarkdownIt.Token('strong_close', 'strong', -1)
  // Only words outside links and marks can end the sentence, so that nothing is cut in half.
  const index = children.findIndex(
    (child) => child.type === 'text' && child.level === 0 && SENTENCE_END.test(child.content),
  )
  if (index === -1) return [open, ...children, close]
  const last = children[index]!
  const end = SENTENCE_END.exec(last.content)!.index + 1
  const order = textToken(last.content.slice(0, end))
  const reason = textToken(last.content.slice(end))
  return [open, ...children.slice(0, index), order, close, reason, ...children.slice(index + 1)]
}

function textToken(content: string): Token {
  const token = new MarkdownIt.Token('text', '', 0)
  token.content = content
  return token
}
