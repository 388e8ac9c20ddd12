export { compareBodies }
export type { BodyChange }

import { diffArrays } from 'diff'
import { headingOf, splitBlocks } from './blocks.ts'
import { pairBlocks } from './pair-blocks.ts'
import { compareWords, wordCount, type Segment } from './segments.ts'

/**
 * One stretch of a body. A run of unchanged paragraphs is one `same` entry with its size, so that it can be folded away;
 * every other entry is one paragraph under the heading it stands under in the new text (in the old one when removed).
 * The blank lines after a paragraph do not make it another: a `same` entry has them as the new text has them.
 */
type BodyChange =
  | { kind: 'same'; text: string; blocks: number; words: number }
  | { kind: 'changed' | 'added' | 'removed'; heading: string | null; words: Segment[] }

// Bounds that keep the comparison of two 64 KiB bodies under about 200 ms; beyond them it gets coarser, never wrong.
const MAX_CHANGED_BLOCKS = 500
const WORD_EFFORT = 250_000

/** Compares two Markdown bodies, paragraphs first and then words inside paragraphs that changed. */
function compareBodies(before: string, after: string): BodyChange[] {
  const oldBlocks = splitBlocks(before)
  const newBlocks = splitBlocks(after)
  const runs = diffArrays(oldBlocks.map(withoutEnd), newBlocks.map(withoutEnd), { maxEditLength: MAX_CHANGED_BLOCKS })
  if (runs === undefined) return rewrittenBody(before, after)

  const changes: BodyChange[] = []
  let effort = WORD_EFFORT
  let heading: string | null = null
  let removed: string[] = []
  let added: string[] = []

  const flush = () => {
    for (const [old, fresh] of pairBlocks(removed, added)) {
      if (old === null) changes.push({ kind: 'added', heading, words: [{ kind: 'added', text: fresh }] })
      else if (fresh === null) changes.push({ kind: 'removed', heading, words: [{ kind: 'removed', text: old }] })
      else {
        const words = compareWords(old, fresh, Math.min(1_000, Math.floor(Math.sqrt(Math.max(0, effort)))))
        effort -= effortOf(words)
        changes.push({ kind: 'changed', heading, words })
      }
      if (fresh !== null) heading = headingOf(fresh) ?? heading
    }
    removed = []
    added = []
  }

  let oldAt = 0
  let newAt = 0
  for (const { value: { length }, removed: isRemoved, added: isAdded } of runs) {
    if (isRemoved) removed.push(...oldBlocks.slice(oldAt, oldAt + length))
    else if (isAdded) added.push(...newBlocks.slice(newAt, newAt + length))
    else {
      flush()
      const blocks = newBlocks.slice(newAt, newAt + length)
      const text = blocks.join('')
      changes.push({ kind: 'same', text, blocks: length, words: wordCount(text) })
      for (const block of blocks) heading = headingOf(block) ?? heading
    }
    if (!isAdded) oldAt += length
    if (!isRemoved) newAt += length
  }
  flush()
  return changes
}

function withoutEnd(block: string): string {
  return block.trimEnd()
}

// The word comparison takes time with the square of the words that differ.
function effortOf(words: Segment[]): number {
  const changed = words.reduce((sum, part) => (part.kind === 'same' ? sum : sum + 2 * wordCount(part.text)), 0)
  return Math.min(changed, 1_000) ** 2
}

function rewrittenBody(before: string, after: string): BodyChange[] {
  const changes: BodyChange[] = [
    { kind: 'removed', heading: null, words: [{ kind: 'removed', text: before }] },
    { kind: 'added', heading: null, words: [{ kind: 'added', text: after }] },
  ]
  return changes
}
