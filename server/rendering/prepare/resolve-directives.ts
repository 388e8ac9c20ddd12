export { markupOf, resolveDirectives }

import type { Token } from 'markdown-it'
import type { Directive, DirectiveForm } from '../directives/directive.ts'
import { directiveOf } from '../directives/plugin.ts'
import { escapeHtml } from '../escape-html.ts'
import { handlers } from '../handlers/index.ts'
import type { DirectiveHandler, HandlerContext, Markup, PartWithoutNumber } from '../handlers/handler.ts'
import { partPlaceholder } from '#shared/rendering/split-parts.ts'
import type { Rendering } from './rendering.ts'
import { eachBlock, eachInline } from './walk.ts'

/** A page computes every part on each reading, so there is an end to them. */
const MAX_PARTS = 30
const NOTHING: Markup = { before: '', after: '' }

const markups = new WeakMap<Directive, Markup>()

/** The HTML of a directive, once {@link resolveDirectives} has been over it. */
function markupOf(directive: Directive): Markup {
  return markups.get(directive) ?? NOTHING
}

/** Lets each directive's handler check it and say its HTML, in the order of the text. */
function resolveDirectives(tokens: Token[], rendering: Rendering): void {
  // Blocks and sentences are visited together, so that parts are numbered in reading order.
  eachBlock(tokens, (block, line) => {
    resolve(block, { line, topLevel: block.level === 0, insideLink: false }, rendering)
    if (block.type !== 'inline') return
    let openLinks = 0
    eachInline([block], (child, childLine) => {
      if (child.type === 'link_open') openLinks += 1
      if (child.type === 'link_close') openLinks -= 1
      resolve(child, { line: childLine, topLevel: false, insideLink: openLinks > 0 }, rendering)
    })
  })
}

interface Place {
  line: number
  topLevel: boolean
  insideLink: boolean
}

function resolve(token: Token, place: Place, rendering: Rendering): void {
  const directive = directiveOf(token)
  if (directive === undefined || token.type === 'directive_close') return
  const report = (code: string, message: string) => rendering.report(place.line, code, message)
  for (const fault of directive.faults) report('bad_directive', fault)

  const handler = handlerFor(directive, report)
  const context: HandlerContext = {
    vocabulary: rendering.vocabulary,
    insideLink: place.insideLink,
    report,
    addPart: (part) => addPart(part, place, rendering),
  }
  markups.set(directive, handler?.toMarkup(directive, context) ?? asWritten(directive, token))
}

function handlerFor(directive: Directive, report: HandlerContext['report']): DirectiveHandler | undefined {
  const { name, form, attributes, label } = directive
  if (name === '') return undefined
  const handler = handlers.get(name)
  if (handler === undefined) {
    report(
      'unknown_directive',
      `There is no mark called “${name}”. There are: ${[...handlers.keys()].join(', ')}.`,
    )
    return undefined
  }
  if (!handler.forms.includes(form)) {
    report(
      'wrong_form',
      `Write “${name}” ${handler.forms.map((right) => howToWrite(right, name)).join(' or ')}.`,
    )
    return undefined
  }
  if (handler.label === 'none' && label !== null) {
    report('unused_label', `“${name}” takes no words in brackets; they are not shown.`)
  }
  for (const key of attributes.keys()) {
    if (handler.attributes !== 'any' && !handler.attributes.includes(key)) {
      report('unknown_attribute', `“${name}” has no “${key}”.`)
    }
  }
  return handler
}

function howToWrite(form: DirectiveForm, name: string): string {
  switch (form) {
    case 'text':
      return `inside a sentence, as :${name}[…]`
    case 'leaf':
      return `on a line of its own, as ::${name}`
    case 'container':
      return `around lines, from :::${name} to :::`
  }
}

function addPart(part: PartWithoutNumber, place: Place, rendering: Rendering): Markup | null {
  // Between the parts there must be complete HTML, so none may stand inside a list, a quote or a caution.
  if (!place.topLevel) {
    rendering.report(
      place.line,
      'part_inside',
      'This works only on a line of its own outside lists, quotes and cautions. Move it out.',
    )
    return null
  }
  if (rendering.parts.length >= MAX_PARTS) {
    rendering.report(
      place.line,
      'too_many_parts',
      `A guide holds at most ${MAX_PARTS} calculators, worked examples and lap lines.`,
    )
    return null
  }
  const numbered = { n: rendering.parts.length + 1, ...part }
  rendering.parts.push(numbered)
  return { before: `${partPlaceholder(numbered)}\n`, after: '' }
}

/**
 * What means nothing is printed, so that nothing a member wrote is lost; what a container holds stays
 * anyway.
 */
function asWritten({ form, name, label, source }: Directive, token: Token): Markup {
  if (form === 'container') return NOTHING
  if (form === 'leaf') return { before: `<p>${escapeHtml(source)}</p>\n`, after: '' }
  if (token.type === 'directive') return { before: escapeHtml(source), after: '' }
  const before = `:${name}[`
  return { before, after: escapeHtml(source.slice(before.length + (label ?? '').length)) }
}
