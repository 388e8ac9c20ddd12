export { directives, directiveOf }

import type { MarkdownIt, Token } from 'markdown-it'
import { blockDirectiveRule } from './block-rule.ts'
import type { Directive } from './directive.ts'
import { inlineDirectiveRule } from './inline-rule.ts'

/**
 * markdown-it plug-in for generic directives, the CommonMark community's proposal
 * (https://talk.commonmark.org/t/generic-directives-plugins-syntax/444). It makes tokens `directive` (nothing
 * inside), `directive_open` and `directive_close`, each with the same {@link Directive} in `meta.directive`,
 * and renders nothing itself.
 */
function directives(md: MarkdownIt, options: { hasRawLabel: (name: string) => boolean }): void {
  md.block.ruler.before('fence', 'directive', blockDirectiveRule, {
    alt: ['paragraph', 'reference', 'blockquote', 'list'],
  })
  md.inline.ruler.after('escape', 'directive', inlineDirectiveRule(options.hasRawLabel))
}

/** The directive a token stands for; undefined for every other token. */
function directiveOf(token: Token): Directive | undefined {
  return token.type.startsWith('directive') ? (token.meta?.directive as Directive | undefined) : undefined
}
