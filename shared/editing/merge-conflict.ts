export { settle }
export type { MergeConflict }

/** One place where two people changed the same thing differently. The three texts are for reading side by side. */
interface MergeConflict {
  field: string
  label: string
  base: string
  mine: string
  theirs: string
}

/** The three-way rule for one value: whoever changed it is right; if both did, differently, a person has to decide. */
function settle<T>(
  base: T,
  mine: T,
  theirs: T,
  same: (a: T, b: T) => boolean = Object.is,
): { value: T; conflict: boolean } {
  if (same(mine, theirs) || same(base, theirs)) return { value: mine, conflict: false }
  if (same(base, mine)) return { value: theirs, conflict: false }
  return { value: mine, conflict: true }
}
