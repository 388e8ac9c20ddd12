export { fenced, fn, frac, math, mathmlString, mathText, num, power, root, row, sub }
export type { MathNode, MathPart }

import { formatNumber } from '#shared/units/format-number.ts'

type MathTag = 'math' | 'mrow' | 'mi' | 'mn' | 'mo' | 'mtext' | 'mfrac' | 'msup' | 'msub' | 'msqrt'

/** One MathML element (MathML Core). Leaves have `text`, all others `children`. */
interface MathNode {
  tag: MathTag
  text?: string
  children?: readonly MathNode[]
  /** Fractions inside are set full size, as in a formula that stands alone. */
  displaystyle?: true
}

/**
 * A string is read as a number, an operator or an identifier; a number is printed with six significant
 * digits.
 */
type MathPart = MathNode | string | number

const operators = new Set([
  '=',
  '+',
  '−',
  '×',
  '·',
  '/',
  '(',
  ')',
  '[',
  ']',
  '≈',
  ',',
  '→',
  '\u2061',
  '≤',
  '≥',
])

/** A whole formula, left to right: `math('x', '=', frac('a', 'b'))`. */
function math(...parts: MathPart[]): MathNode {
  return { tag: 'math', displaystyle: true, children: [row(...parts)] }
}

function row(...parts: MathPart[]): MathNode {
  return { tag: 'mrow', children: parts.map(node) }
}

function frac(over: MathPart, under: MathPart): MathNode {
  return { tag: 'mfrac', children: [node(over), node(under)] }
}

function power(base: MathPart, exponent: MathPart): MathNode {
  return { tag: 'msup', children: [node(base), { ...node(exponent), displaystyle: true }] }
}

/** An index such as ν with 25 below. An index of several letters is a word, so it is set upright as text. */
function sub(base: MathPart, index: string): MathNode {
  const below: MathNode = index.length > 1 && !/\d/.test(index) ? { tag: 'mtext', text: index } : node(index)
  return { tag: 'msub', children: [node(base), below] }
}

function root(...parts: MathPart[]): MathNode {
  return { tag: 'msqrt', children: [row(...parts)] }
}

function fenced(...parts: MathPart[]): MathNode {
  return row('(', ...parts, ')')
}

/** A named function and its argument: `fn('ln', 'x')`. */
function fn(name: string, argument: MathPart): MathNode {
  return row(name, '\u2061', argument)
}

/** A number inside a formula, to so many significant digits; a negative one is fenced. */
function num(value: number, digits = 4): MathNode {
  const text = formatNumber(Math.abs(value), digits)
  return value < 0 ? fenced('−', { tag: 'mn', text }) : { tag: 'mn', text }
}

function node(part: MathPart): MathNode {
  if (typeof part === 'number') return num(part, 6)
  if (typeof part !== 'string') return part
  if (operators.has(part)) return { tag: 'mo', text: part }
  return { tag: /^[\d.,]+$/.test(part) ? 'mn' : 'mi', text: part }
}

/** The formula as MathML text, for the API. */
function mathmlString(part: MathNode): string {
  const inside =
    part.text === undefined ? (part.children ?? []).map(mathmlString).join('') : escaped(part.text)
  return `<${part.tag}${part.displaystyle ? ' displaystyle="true"' : ''}>${inside}</${part.tag}>`
}

/** The formula on one line of plain text, for outside programs and tests: `x = (a)/(b)`. */
function mathText(part: MathNode): string {
  if (part.text !== undefined)
    return ['=', '+', '−', '×', '≈'].includes(part.text) ? ` ${part.text} ` : part.text.replace('\u2061', ' ')
  const children = (part.children ?? []).map(mathText)
  const [first = '', second = ''] = children
  if (part.tag === 'mfrac') return `(${first})/(${second})`
  if (part.tag === 'msup') return `${first}^(${second})`
  if (part.tag === 'msub') return `${first}_${second}`
  if (part.tag === 'msqrt') return `√(${first})`
  return children.join('')
}

function escaped(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;')
}
