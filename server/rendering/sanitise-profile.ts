export { ALLOWED_ELEMENTS, SAFE_ADDRESS }

import { PART_KINDS } from '#shared/rendering/split-parts.ts'

/** What an attribute's whole value must match. */
type AllowedAttributes = Record<string, RegExp>

/** Exactly what the renderer writes: http, https, mailto, this site, this page. */
const SAFE_ADDRESS = /^(?:https?:\/\/|mailto:|\/(?!\/)|#)/i

const classes = (...names: string[]): RegExp => new RegExp(`^(?:${names.join('|')})(?: (?:${names.join('|')}))*$`)

const SCROLL_REGION: AllowedAttributes = {
  role: /^region$/, tabindex: /^0$/, 'aria-label': /^(?:Table|Code)(?: \d+)?$/,
}
const CELL: AllowedAttributes = { class: classes('align-left', 'align-center', 'align-right') }

/** A length in MathML, at most 10 em either way so that nothing in a formula can reach over the page. */
const LENGTH = /^[-+]?(?:\d|10)?(?:\.\d{1,6})?(?:em|ex|pt|mu|width|height|depth)$|^0(?:px)?$|^\dpx$/
const LENGTHS = /^[-+.\d]{1,9}(?:em|ex|pt)(?: [-+.\d]{1,9}(?:em|ex|pt))*$/
const TRUE_OR_FALSE = /^(?:true|false)$/
const WORDS = /^[a-z-]+(?: [a-z-]+)*$/

const MATH: Record<string, AllowedAttributes> = {
  math: { display: /^block$/ },
  mrow: {}, mfrac: { linethickness: LENGTH }, msqrt: {}, mroot: {},
  msup: {}, msub: {}, msubsup: {}, mtext: { mathvariant: WORDS },
  mi: { mathvariant: WORDS }, mn: { mathvariant: WORDS },
  mo: {
    mathvariant: WORDS, stretchy: TRUE_OR_FALSE, fence: TRUE_OR_FALSE, separator: TRUE_OR_FALSE, form: WORDS,
    lspace: LENGTH, rspace: LENGTH, minsize: LENGTH, maxsize: LENGTH, accent: TRUE_OR_FALSE, movablelimits: TRUE_OR_FALSE,
  },
  mover: { accent: TRUE_OR_FALSE }, munder: { accentunder: TRUE_OR_FALSE }, munderover: {},
  mspace: { width: LENGTH, height: LENGTH, linebreak: WORDS },
  mpadded: { width: LENGTH, height: LENGTH, depth: LENGTH, lspace: LENGTH, voffset: LENGTH },
  mphantom: {}, menclose: { notation: WORDS },
  mstyle: { displaystyle: TRUE_OR_FALSE, scriptlevel: /^[0-3]$/ },
  mtable: { columnalign: WORDS, columnspacing: LENGTHS, rowspacing: LENGTHS, columnlines: WORDS, rowlines: WORDS },
  mtr: {}, mtd: {},
}

/**
 * Every element that stored HTML may hold, with every attribute and value. What is not here does not exist.
 */
const ALLOWED_ELEMENTS: ReadonlyMap<string, AllowedAttributes> = new Map(Object.entries<AllowedAttributes>({
  p: { class: classes('caution-k') },
  h2: { id: /^s-[a-z0-9-]+$/ }, h3: { id: /^s-[a-z0-9-]+$/ }, h4: { id: /^s-[a-z0-9-]+$/ },
  h5: { id: /^s-[a-z0-9-]+$/ }, h6: { id: /^s-[a-z0-9-]+$/ },
  ul: {}, ol: { start: /^\d{1,9}$/ }, li: {}, blockquote: {}, hr: {}, br: {},
  em: {}, strong: {}, s: {}, code: {},
  pre: { ...SCROLL_REGION },
  table: {}, thead: {}, tbody: {}, tr: {}, th: { ...CELL, scope: /^col$/ }, td: CELL,
  a: {
    href: SAFE_ADDRESS, rel: /^noopener nofollow ugc$/, class: classes('term'), 'data-term': /^[\p{L}\p{N} _-]+$/u,
  },
  aside: { class: classes('caution'), role: /^note$/, 'aria-label': /^Caution(?:: [A-Z][a-z ]+)?$/ },
  div: {
    ...SCROLL_REGION,
    class: classes('table-scroll', 'formula-block', 'caution-b'),
    'data-part': new RegExp(`^(?:${PART_KINDS.join('|')})$`), 'data-n': /^[1-9][0-9]?$/,
  },
  span: {
    class: classes(
      'caution-m', 'mk', 'mk-[a-z]+', 'formula', 'basis', 'basis-mark',
      'basis-physics', 'basis-common-practice', 'basis-reported',
    ),
    'aria-hidden': /^true$/,
  },
  ...MATH,
}))
