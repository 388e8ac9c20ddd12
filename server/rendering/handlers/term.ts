export { termHandler }

import { escapeHtml } from '../escape-html.ts'
import type { DirectiveHandler } from './handler.ts'

/** `:term[droop]` or `:term[pushes]{key=push}`: a word with its entry in the glossary. */
const termHandler: DirectiveHandler = {
  name: 'term',
  forms: ['text'],
  attributes: ['key'],
  label: 'markdown',
  toMarkup({ attributes, label }, context) {
    const wanted = attributes.get('key') ?? (label ?? '').trim().replace(/\s+/g, ' ').toLowerCase()
    const key = context.vocabulary.glossaryKeys.get(wanted)
    if (key === undefined) {
      context.report(
        'unknown_term',
        `The glossary has no “${wanted}”. Take the mark off, or name the entry: {key=…}.`,
      )
      return { before: '', after: '' }
    }
    if (context.insideLink) {
      context.report('link_in_link', `“${wanted}” stands inside a link and cannot be another one.`)
      return { before: '', after: '' }
    }
    const fragment = encodeURIComponent(key)
    return { before: `<a class="term" href="/glossary#${fragment}" data-term="${escapeHtml(key)}">`, after: '</a>' }
  },
}
