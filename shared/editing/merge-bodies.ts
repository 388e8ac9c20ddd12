export { mergeBodies }

import { diff3Merge } from 'node-diff3'
import { headingOf, linesOf } from './blocks.ts'
import { settle, type MergeConflict } from './merge-conflict.ts'

// The comparison takes time with the pairs of equal lines, and for each of them with the lines that differ. Past these
// the whole text is shown instead.
const MAX_EQUAL_PAIRS = 100_000
const MAX_LINE_PAIRS = 4_000_000

type Region =
  | { ok: string[]; conflict?: undefined }
  | { ok?: undefined; conflict: { a: string[]; o: string[]; b: string[] } }

/**
 * Three-way merge of a Markdown body by lines (diff3). Where both sides changed the same lines differently, the merged
 * text keeps mine and the conflict carries all three.
 */
function mergeBodies(base: string, mine: string, theirs: string): { body: string; conflicts: MergeConflict[] } {
  const whole = settle(base, mine, theirs)
  if (!whole.conflict) return { body: whole.value, conflicts: [] }
  const { start, middles: [o, a, b], end } = trimCommon([base, mine, theirs].map(linesOf) as Three)
  if (isTooMuch(o, a, b)) return { body: mine, conflicts: [{ field: 'body', label: 'Body', base, mine, theirs }] }
  const regions = diff3Merge(a, o, b, { excludeFalseConflicts: true }) as Region[]
  const conflicts: MergeConflict[] = []
  let heading: string | null = null
  let body = ''
  for (const region of [{ ok: start }, ...regions, { ok: end }] satisfies Region[]) {
    const lines = region.ok ?? region.conflict.a
    if (region.conflict !== undefined) {
      conflicts.push({
        field: 'body',
        label: heading === null ? 'Body' : `Body, under “${heading}”`,
        base: region.conflict.o.join(''),
        mine: region.conflict.a.join(''),
        theirs: region.conflict.b.join(''),
      })
    }
    body += lines.join('')
    for (const line of lines) heading = headingOf(line) ?? heading
  }
  return { body, conflicts }
}

/** Lines of the base, of mine and of theirs. */
type Three = [base: string[], mine: string[], theirs: string[]]

/** Sets aside what all three begin and end with: most of a long guide, in most edits. */
function trimCommon([o, a, b]: Three): { start: string[]; middles: Three; end: string[] } {
  const shortest = Math.min(o.length, a.length, b.length)
  let start = 0
  while (start < shortest && o[start] === a[start] && o[start] === b[start]) start += 1
  let end = 0
  while (end < shortest - start && o.at(-1 - end) === a.at(-1 - end) && o.at(-1 - end) === b.at(-1 - end)) end += 1
  const middle = (lines: string[]) => lines.slice(start, lines.length - end)
  return { start: o.slice(0, start), middles: [middle(o), middle(a), middle(b)], end: o.slice(o.length - end) }
}

function isTooMuch(o: string[], a: string[], b: string[]): boolean {
  if (o.length * Math.max(a.length, b.length) > MAX_LINE_PAIRS) return true
  const times = countLines(o)
  const equalPairs = (lines: string[]) => lines.reduce((sum, line) => sum + (times.get(line) ?? 0), 0)
  return Math.max(equalPairs(a), equalPairs(b)) > MAX_EQUAL_PAIRS
}

function countLines(lines: string[]): Map<string, number> {
  const times = new Map<string, number>()
  for (const line of lines) times.set(line, (times.get(line) ?? 0) + 1)
  return times
}
