export { mergeRows }

import { settle } from './merge-conflict.ts'

interface RowRules<T> {
  identity: (row: T) => string
  same: (a: T, b: T) => boolean
}

/** A row that both sides treated differently; undefined where the row is not there. */
interface RowConflict<T> {
  base: readonly T[]
  mine: readonly T[]
  theirs: readonly T[]
}

/**
 * Three-way merge of a list of rows by what they are about. Rows keep my order; rows that only they added come after
 * the row they stood behind. Rows about the same thing (there is normally one) are settled together.
 */
function mergeRows<T>(
  base: readonly T[],
  mine: readonly T[],
  theirs: readonly T[],
  rules: RowRules<T>,
): { rows: T[]; conflicts: RowConflict<T>[] } {
  const sameList = (a: readonly T[], b: readonly T[]) => a.length === b.length && a.every((row, at) => rules.same(row, b[at]!))
  const whole = settle(base, mine, theirs, sameList)
  if (!whole.conflict) return { rows: [...whole.value], conflicts: [] }

  const groups = { base: groupBy(base, rules.identity), mine: groupBy(mine, rules.identity), theirs: groupBy(theirs, rules.identity) }
  const conflicts: RowConflict<T>[] = []
  const merged = new Map<string, readonly T[]>()
  for (const key of keysInOrder(groups.mine, groups.theirs)) {
    const [o, a, b] = [groups.base, groups.mine, groups.theirs].map((group) => group.get(key) ?? []) as [T[], T[], T[]]
    const settled = settle<readonly T[]>(o, a, b, sameList)
    if (settled.conflict) conflicts.push({ base: o, mine: a, theirs: b })
    merged.set(key, settled.value)
  }
  return { rows: [...merged.values()].flat(), conflicts }
}

function groupBy<T>(rows: readonly T[], identity: (row: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>()
  for (const row of rows) groups.set(identity(row), [...(groups.get(identity(row)) ?? []), row])
  return groups
}

/** My keys in my order, with each key that only they have behind the one it follows on their side. */
function keysInOrder<T>(mine: ReadonlyMap<string, T>, theirs: ReadonlyMap<string, T>): string[] {
  const order = [...mine.keys()]
  let previous: string | undefined
  for (const key of theirs.keys()) {
    if (!mine.has(key)) order.splice(previous === undefined ? 0 : order.indexOf(previous) + 1, 0, key)
    previous = key
  }
  return order
}
