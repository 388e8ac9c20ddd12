export { scanDirective }

import { parseAttributes } from './attributes.ts'

/** Longest attribute list; without an end a text of nothing but open braces would cost n² steps. */
const MAX_ATTRIBUTES = 1_000
const NAME = /[A-Za-z][A-Za-z0-9_-]{0,39}/y

interface ScannedDirective {
  name: string
  label: string | null
  /** Where the label starts and ends in the source, without the brackets. */
  labelStart: number
  labelEnd: number
  attributes: Map<string, string>
  faults: string[]
  /** The first position after the directive. */
  end: number
}

/**
 * Reads `name[label]{attributes}` at a position, just after the colons. Label and attributes may be missing.
 *
 * @param limit where the text to look at ends
 * @param closes which bracket closes which (brackets.ts)
 * @returns null when no name stands there
 */
function scanDirective(
  source: string,
  start: number,
  limit: number,
  closes: Map<number, number>,
): ScannedDirective | null {
  NAME.lastIndex = start
  const name = NAME.exec(source)?.[0]
  if (name === undefined) return null
  const scanned: ScannedDirective = {
    name, label: null, labelStart: 0, labelEnd: 0, attributes: new Map(), faults: [], end: start + name.length,
  }
  if (source[scanned.end] === '[') {
    const close = closes.get(scanned.end)
    if (close === undefined || close >= limit) return scanned
    scanned.labelStart = scanned.end + 1
    scanned.labelEnd = close
    scanned.label = source.slice(scanned.labelStart, close)
    scanned.end = close + 1
  }
  if (source[scanned.end] === '{') {
    const close = closingBrace(source, scanned.end, limit)
    if (close === -1) return scanned
    Object.assign(scanned, parseAttributes(source.slice(scanned.end + 1, close)))
    scanned.end = close + 1
  }
  return scanned
}

/** Attributes end at the first brace outside quotes, on the same line. */
function closingBrace(source: string, open: number, limit: number): number {
  let quote = ''
  const stop = Math.min(limit, open + MAX_ATTRIBUTES)
  for (let position = open + 1; position < stop; position += 1) {
    const character = source[position]!
    if (character === '\n') return -1
    if (quote !== '') {
      if (character === quote) quote = ''
    } else if ((character === '"' || character === "'") && source[position - 1] === '=') {
      quote = character
    } else if (character === '}') {
      return position
    } else if (character === '{') {
      return -1
    }
  }
  return -1
}
