export { formulaHandler }

import katex from 'katex'
import { measureMarkup } from '../gates.ts'
import type { DirectiveHandler, HandlerContext } from './handler.ts'

const MAX_LENGTH = 1_000
/** Deep nesting is what makes sanitising slow, and no formula in a guide needs it. */
const MAX_DEPTH = 24
/** In em: keeps `\rule` and `\hspace` from covering the page. */
const MAX_SIZE = 10
const MAX_EXPANSIONS = 200

/** `:formula[\nu_{25}]` in a sentence, `::formula[…]` on its own line: TeX, turned into MathML. */
const formulaHandler: DirectiveHandler = {
  name: 'formula',
  forms: ['text', 'leaf'],
  attributes: [],
  label: 'raw',
  toMarkup({ form, label }, context) {
    // A label ends at its bracket, so a single bracket is written with a backslash; TeX does not know that.
    const tex = (label ?? '').replace(/\\(\\|[[\]])/g, (pair, escaped: string) => (escaped === '\\' ? pair : escaped)).trim()
    if (tex === '') {
      context.report('empty_formula', 'Write the formula in brackets: :formula[\\nu = \\nu_{25}]')
      return null
    }
    const display = form === 'leaf'
    const math = toMathMl(tex, display, context)
    if (math === null) return null
    return display
      ? { before: `<div class="formula-block">${math}</div>\n`, after: '' }
      : { before: `<span class="formula">${math}</span>`, after: '' }
  },
}

function toMathMl(tex: string, displayMode: boolean, context: HandlerContext): string | null {
  if (tex.length > MAX_LENGTH) {
    context.report(
      'long_formula',
      `The formula is longer than ${MAX_LENGTH} characters. Break it into steps.`,
    )
    return null
  }
  let rendered: string
  let refused: string | undefined
  // Links, pictures and attributes: KaTeX asks for each of them, and would print the command in red when told
  // no.
  const trust = ({ command }: { command: string }): boolean => {
    refused = command
    return false
  }
  try {
    rendered = katex.renderToString(tex, {
      displayMode, output: 'mathml', throwOnError: true, strict: 'error', trust,
      maxExpand: MAX_EXPANSIONS, maxSize: MAX_SIZE, macros: {},
    })
  } catch (error) {
    context.report('bad_formula', `The formula cannot be read: ${reason(error)}`)
    return null
  }
  if (refused !== undefined) {
    context.report('bad_formula', `A formula cannot hold ${refused}.`)
    return null
  }
  const math = presentationOnly(rendered)
  if (measureMarkup(math).depth > MAX_DEPTH) {
    context.report(
      'deep_formula',
      'The formula is nested too deeply. Give its inner parts names of their own.',
    )
    return null
  }
  return math
}

/**
 * KaTeX wraps the formula with a copy of its TeX, which readers would see twice once the wrapper is
 * sanitised away.
 */
function presentationOnly(rendered: string): string {
  return rendered
    .replace(/^<span class="katex">/, '')
    .replace(/<\/span>$/, '')
    .replace(/<semantics>/, '')
    .replace(/<annotation encoding="application\/x-tex">[^<]*<\/annotation><\/semantics>/, '')
}

function reason(error: unknown): string {
  const message = error instanceof Error ? error.message : String(error)
  return message.replace(/^KaTeX parse error: /, '').slice(0, 200)
}
