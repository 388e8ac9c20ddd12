export { createBodyRenderer }

import { assertLength, assertMarkup, assertTokens } from './gates.ts'
import { createMarkdown } from './markdown.ts'
import { plainText } from './plain-text.ts'
import { emphasiseOrders } from './prepare/caution-order.ts'
import { prepareHeadings } from './prepare/headings.ts'
import { prepareImages } from './prepare/images.ts'
import { prepareLinks } from './prepare/links.ts'
import { Rendering } from './prepare/rendering.ts'
import { resolveDirectives } from './prepare/resolve-directives.ts'
import { prepareTables } from './prepare/tables.ts'
import { createSanitiser } from './sanitise.ts'
import { partPlaceholder } from '#shared/rendering/split-parts.ts'
import type { RenderedPart } from '#shared/rendering/parts.ts'
import type { RenderResult, RenderVocabulary } from './types.ts'
import { RENDERER_VERSION } from './version.ts'
import { indexVocabulary } from './vocabulary-index.ts'

/**
 * Makes the function that turns a guide's Markdown body into safe HTML. It may run for seconds on a hostile
 * text, so nothing but the worker and tests calls it: everyone else asks the pool (guide-renderer.ts).
 *
 * The function throws RenderRefusedError for a text beyond the limits; everything else a writer may get wrong
 * is in `problems`.
 */
function createBodyRenderer(): (markdown: string, vocabulary: RenderVocabulary) => RenderResult {
  const md = createMarkdown()
  const sanitise = createSanitiser()

  return (markdown, vocabulary) => {
    assertLength(markdown)
    const env = { regions: {} }
    const tokens = md.parse(markdown, env)
    assertTokens(tokens)

    const rendering = new Rendering(indexVocabulary(vocabulary))
    prepareImages(tokens, rendering)
    prepareHeadings(tokens, rendering)
    prepareTables(tokens)
    prepareLinks(tokens, rendering)
    emphasiseOrders(tokens, rendering)
    resolveDirectives(tokens, rendering)

    const unsafeHtml = md.renderer.render(tokens, md.options, env)
    assertMarkup(unsafeHtml)
    const html = sanitise(unsafeHtml)
    assertOwnPlaceholders(html, rendering.parts)

    const { parts, headings } = rendering
    const problems = rendering.problems.toSorted((a, b) => a.line - b.line)
    return { html, parts, headings, problems, plainText: plainText(tokens), rendererVersion: RENDERER_VERSION }
  }
}

/**
 * No placeholder but the renderer's own may be in what is stored; anything else is a fault of ours, never
 * shown.
 */
function assertOwnPlaceholders(html: string, parts: RenderedPart[]): void {
  const found = html.match(/<[^<>]*\sdata-(?:part|n)=[^<>]*>(?:<\/div>)?/g) ?? []
  const expected = parts.map(partPlaceholder)
  if (found.length !== expected.length || found.some((placeholder, at) => placeholder !== expected[at])) {
    throw new Error(`The rendered body holds other parts than it should: ${found.length} for ${expected.length}.`)
  }
}
