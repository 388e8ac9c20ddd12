export { blockDirectiveRule }

import type { StateBlock } from 'markdown-it'
import { matchBrackets } from './brackets.ts'
import type { Directive } from './directive.ts'
import { scanDirective } from './scan.ts'

const COLON = 0x3a

/**
 * `::name[label]{attributes}` on a line of its own, and `:::name{attributes}` … `:::` around blocks. A
 * container ends at the first line of at least as many colons, so an outer one is written with more colons
 * than what it holds.
 */
function blockDirectiveRule(state: StateBlock, startLine: number, endLine: number, silent: boolean): boolean {
  if (state.sCount[startLine]! - state.blkIndent >= 4) return false
  const start = state.bMarks[startLine]! + state.tShift[startLine]!
  const end = state.eMarks[startLine]!
  const afterColons = state.skipChars(start, COLON)
  const colons = afterColons - start
  if (colons < 2) return false

  const source = state.src.slice(start, end).trimEnd()
  const strayFence = colons >= 3 && source.length === colons
  const scanned = scanDirective(source, colons, source.length, matchBrackets(source))
  if (scanned === null && !strayFence) return false
  if (silent) return true

  const directive: Directive = {
    form: colons === 2 || strayFence ? 'leaf' : 'container',
    name: scanned?.name ?? '',
    label: scanned?.label ?? null,
    attributes: scanned?.attributes ?? new Map<string, string>(),
    faults: scanned?.faults ?? [`“${source}” closes nothing: no block of as many colons is open above it.`],
    source,
  }
  const rest = scanned === null ? '' : source.slice(scanned.end).trim()
  if (rest !== '') directive.faults.push(`“${rest}” is left over: a block mark stands alone on its line.`)

  if (directive.form === 'leaf') pushLeaf(state, directive, startLine)
  else pushContainer(state, directive, startLine, endLine, colons)
  return true
}

function pushLeaf(state: StateBlock, directive: Directive, line: number): void {
  const token = state.push('directive', '', 0)
  token.block = true
  token.map = [line, line + 1]
  token.meta = { directive }
  state.line = line + 1
}

function pushContainer(
  state: StateBlock,
  directive: Directive,
  startLine: number,
  endLine: number,
  colons: number,
): void {
  const closeLine = findClose(state, startLine, endLine, colons)
  const closed = closeLine < endLine && isFence(state, closeLine, colons)
  if (!closed) directive.faults.push(`It is not closed: end it with a line of ${':'.repeat(colons)}`)

  const open = state.push('directive_open', '', 1)
  open.block = true
  open.map = [startLine, closeLine]
  open.meta = { directive }

  const outer = { parentType: state.parentType, lineMax: state.lineMax }
  // 'blockquote' makes paragraphs inside end where block rules say, and keeps list tightness to itself.
  state.parentType = 'blockquote'
  state.lineMax = closeLine
  state.md.block.tokenize(state, startLine + 1, closeLine)
  state.parentType = outer.parentType
  state.lineMax = outer.lineMax

  const close = state.push('directive_close', '', -1)
  close.block = true
  close.meta = { directive }
  state.line = closeLine + (closed ? 1 : 0)
}

/** The line that closes the container, or the line at which the block around it ends. */
function findClose(state: StateBlock, startLine: number, endLine: number, colons: number): number {
  for (let line = startLine + 1; line < endLine; line += 1) {
    const outdented = state.sCount[line]! < state.blkIndent && !state.isEmpty(line)
    if (outdented || isFence(state, line, colons)) return line
  }
  return endLine
}

function isFence(state: StateBlock, line: number, colons: number): boolean {
  if (state.sCount[line]! < state.blkIndent || state.sCount[line]! - state.blkIndent >= 4) return false
  const start = state.bMarks[line]! + state.tShift[line]!
  const afterColons = state.skipChars(start, COLON)
  if (afterColons - start < colons) return false
  return state.skipSpaces(afterColons) >= state.eMarks[line]!
}
