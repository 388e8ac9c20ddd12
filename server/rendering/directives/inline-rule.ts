export { inlineDirectiveRule }

import type { StateInline } from 'markdown-it'
import { matchBrackets } from './brackets.ts'
import type { Directive } from './directive.ts'
import { scanDirective } from './scan.ts'

const COLON = 0x3a
const WORD_OR_COLON = /[\p{L}\p{N}:]/u

/**
 * `:name[label]{attributes}` inside a sentence. A label or attributes must follow the name at once and no
 * letter or digit may stand before the colon, so that “12:30” and “note: this” stay what they are.
 *
 * @param hasRawLabel names whose label is not Markdown, such as a formula
 */
function inlineDirectiveRule(hasRawLabel: (name: string) => boolean) {
  return (state: StateInline, silent: boolean): boolean => {
    const start = state.pos
    if (state.src.charCodeAt(start) !== COLON) return false
    if (start > 0 && WORD_OR_COLON.test(state.src[start - 1]!)) return false

    const scanned = scanDirective(state.src, start + 1, state.posMax, bracketsOf(state))
    if (scanned === null || scanned.end === start + 1 + scanned.name.length) return false
    if (silent) {
      state.pos = scanned.end
      return true
    }

    const { name, label, attributes, faults } = scanned
    const source = state.src.slice(start, scanned.end)
    const directive: Directive = { form: 'text', name, label, attributes, faults, source }
    if (label === null || hasRawLabel(name)) {
      state.push('directive', '', 0).meta = { directive }
    } else {
      state.push('directive_open', '', 1).meta = { directive }
      parseLabel(state, scanned.labelStart, scanned.labelEnd)
      state.push('directive_close', '', -1).meta = { directive }
    }
    state.pos = scanned.end
    return true
  }
}

const bracketsByState = new WeakMap<StateInline, Map<number, number>>()

/** Matched once for a block of text, however many directives it holds. */
function bracketsOf(state: StateInline): Map<number, number> {
  let brackets = bracketsByState.get(state)
  if (brackets === undefined) {
    brackets = matchBrackets(state.src)
    bracketsByState.set(state, brackets)
  }
  return brackets
}

function parseLabel(state: StateInline, start: number, end: number): void {
  const outerEnd = state.posMax
  state.pos = start
  state.posMax = end
  state.md.inline.tokenize(state)
  state.posMax = outerEnd
}
