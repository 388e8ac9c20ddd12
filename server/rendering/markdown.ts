export { createMarkdown }

import createMarkdownIt from 'markdown-it'
import type { MarkdownIt } from 'markdown-it'
import { directiveOf, directives } from './directives/plugin.ts'
import { escapeHtml } from './escape-html.ts'
import { hasRawLabel } from './handlers/index.ts'
import { markupOf } from './prepare/resolve-directives.ts'

/** Counts the regions of one body, so that no two have the same name. */
interface RegionCounts {
  [name: string]: number
}

/** CommonMark with tables and directives; HTML in the text is text. */
function createMarkdown(): MarkdownIt {
  const md = new createMarkdownIt('default', { html: false, linkify: false, typographer: false, breaks: false })
  md.use(directives, { hasRawLabel })
  // Which addresses may be linked is decided after parsing (prepare/links.ts), where the writer can be told.
  // Nothing is rendered before that.
  md.validateLink = () => true

  const { rules } = md.renderer
  rules.directive = rules.directive_open = (tokens, index) => markupOf(directiveOf(tokens[index]!)!).before
  rules.directive_close = (tokens, index) => markupOf(directiveOf(tokens[index]!)!).after
  rules.hidden = () => ''
  rules.table_open = (_tokens, _index, _options, env) =>
    `<div class="table-scroll"${scrollRegion('Table', env)}><table>\n`
  rules.table_close = () => '</table></div>\n'
  rules.fence = rules.code_block = (tokens, index, _options, env) =>
    `<pre${scrollRegion('Code', env)}><code>${escapeHtml(tokens[index]!.content)}</code></pre>\n`
  return md
}

/** What scrolls sideways must be reachable from the keyboard and have a name of its own. */
function scrollRegion(name: string, env: Record<string, unknown> | undefined): string {
  const counts = (env?.regions ?? {}) as RegionCounts
  const count = (counts[name] ?? 0) + 1
  counts[name] = count
  return ` role="region" tabindex="0" aria-label="${count === 1 ? name : `${name} ${count}`}"`
}
