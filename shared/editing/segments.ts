export { changedWords, compareWords, textAfter, textBefore, wordCount }
export type { Segment }

import { diffWordsWithSpace } from 'diff'

/** A stretch of text that both versions have, or only one of them. */
interface Segment {
  kind: 'same' | 'added' | 'removed'
  text: string
}

/**
 * Compares two texts word by word. Same and removed segments joined give `before`, same and added give `after`.
 * @param maxChanges how many words may differ before the comparison falls back to "all of it was rewritten"; the cost
 *   grows with its square
 */
function compareWords(before: string, after: string, maxChanges = 1_000): Segment[] {
  if (before === after) return before === '' ? [] : [{ kind: 'same', text: before }]
  const parts = diffWordsWithSpace(before, after, { maxEditLength: maxChanges })
  if (parts === undefined) return rewritten(before, after)
  return joinAcrossSpaces(
    parts.map((part) => ({ kind: part.added ? 'added' : part.removed ? 'removed' : 'same', text: part.value })),
  )
}

/**
 * "One two" replaced by "three four" reads better as one replacement than as two with an unchanged space between, so a
 * space between two replaced words is counted as replaced too.
 */
function joinAcrossSpaces(segments: Segment[]): Segment[] {
  const joined: Segment[] = []
  let removed = ''
  let added = ''
  const flush = () => {
    joined.push(...rewritten(removed, added))
    removed = ''
    added = ''
  }
  segments.forEach((segment, at) => {
    if (segment.kind === 'removed') removed += segment.text
    else if (segment.kind === 'added') added += segment.text
    else if (removed !== '' && added !== '' && /^[^\S\n]+$/.test(segment.text) && isReplacement(segments, at + 1)) {
      removed += segment.text
      added += segment.text
    } else {
      flush()
      joined.push(segment)
    }
  })
  flush()
  return joined
}

function isReplacement(segments: Segment[], at: number): boolean {
  const kinds = [segments[at]?.kind, segments[at + 1]?.kind]
  return kinds.includes('removed') && kinds.includes('added')
}

function rewritten(before: string, after: string): Segment[] {
  const segments: Segment[] = [
    { kind: 'removed', text: before },
    { kind: 'added', text: after },
  ]
  return segments.filter((segment) => segment.text !== '')
}

function textBefore(segments: readonly Segment[]): string {
  return segments.map((segment) => (segment.kind === 'added' ? '' : segment.text)).join('')
}

function textAfter(segments: readonly Segment[]): string {
  return segments.map((segment) => (segment.kind === 'removed' ? '' : segment.text)).join('')
}

/** Words as a reader would count them: runs between white space that hold a letter or a digit. */
function wordCount(text: string): number {
  return text.split(/\s+/).filter((word) => /[\p{L}\p{N}]/u.test(word)).length
}

/** How many words were put in or taken out; a replaced word counts once. */
function changedWords(segments: readonly Segment[]): number {
  let total = 0
  let removed = 0
  let added = 0
  for (const segment of segments) {
    if (segment.kind === 'removed') removed += atLeastOne(segment.text)
    else if (segment.kind === 'added') added += atLeastOne(segment.text)
    else {
      total += Math.max(removed, added)
      removed = added = 0
    }
  }
  return total + Math.max(removed, added)
}

// A change of a comma alone is still a change to be seen; one of white space alone is not.
function atLeastOne(text: string): number {
  return text.trim() === '' ? 0 : Math.max(1, wordCount(text))
}
