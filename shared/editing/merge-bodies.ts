export { mergeBodies }

import { diff3Merge } from 'node-diff3'
import { headingOf } from './blocks.ts'
import { settle, type MergeConflict } from './merge-conflict.ts'

// The line comparison takes time with the product of the lines that differ; past this the whole text is shown instead.
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
  const [o, a, b] = [base, mine, theirs].map(linesOf) as [string[], string[], string[]]
  if (effort(o, a) > MAX_LINE_PAIRS || effort(o, b) > MAX_LINE_PAIRS) {
    return { body: mine, conflicts: [{ field: 'body', label: 'Body', base, mine, theirs }] }
  }
  const regions = diff3Merge(a, o, b, { excludeFalseConflicts: true }) as Region[]
  const conflicts: MergeConflict[] = []
  let heading: string | null = null
  let body = ''
  for (const region of regions) {
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

/** Lines with their line ends, so that joining them gives the text again. */
function linesOf(text: string): string[] {
  return text.match(/[^\n]*\n|[^\n]+$/g) ?? []
}

function effort(one: string[], other: string[]): number {
  let start = 0
  while (start < one.length && start < other.length && one[start] === other[start]) start += 1
  return (one.length - start) * (other.length - start)
}
