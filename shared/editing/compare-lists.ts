export { compareEffects, compareSources }
export type { EffectChange, SourceChange }

import type { Effect, EffectDraft } from '../schemas/effect.ts'
import type { Source } from '../schemas/guide-content.ts'
import { changedEffectKeys, effectIdentity, sameEffect } from './effect-identity.ts'

interface EffectChange<E extends EffectDraft = Effect> {
  kind: 'added' | 'removed' | 'changed'
  before?: E
  after?: E
  /** For `changed`: the parts of the statement that differ. */
  changedKeys: (keyof EffectDraft)[]
}

interface SourceChange {
  kind: 'added' | 'removed' | 'changed'
  before?: Source
  after?: Source
}

/** What was said about the lap before and what is said now; `reordered` when only the order of rows differs. */
function compareEffects<E extends EffectDraft>(before: readonly E[], after: readonly E[]): { changes: EffectChange<E>[]; reordered: boolean } {
  const { pairs, removed, added } = match(before, after, effectIdentity, sameEffect)
  const changes: EffectChange<E>[] = [
    ...pairs
      .map(([old, fresh]) => ({ kind: 'changed' as const, before: old, after: fresh, changedKeys: changedEffectKeys(old, fresh) }))
      .filter((change) => change.changedKeys.length > 0),
    ...added.map((effect) => ({ kind: 'added' as const, after: effect, changedKeys: [] })),
    ...removed.map((effect) => ({ kind: 'removed' as const, before: effect, changedKeys: [] })),
  ]
  const reordered = changes.length === 0 && before.some((effect, at) => !sameEffect(effect, after[at]!))
  return { changes, reordered }
}

function compareSources(before: readonly Source[], after: readonly Source[]): SourceChange[] {
  const same = (a: Source, b: Source) => a.text === b.text && a.kind === b.kind && a.url === b.url
  const { pairs, removed, added } = match(before, after, (source) => source.text, same)
  return [
    ...pairs.filter(([old, fresh]) => !same(old, fresh)).map(([old, fresh]) => ({ kind: 'changed' as const, before: old, after: fresh })),
    ...added.map((source) => ({ kind: 'added' as const, after: source })),
    ...removed.map((source) => ({ kind: 'removed' as const, before: source })),
  ]
}

/** Pairs rows that are about the same thing: equal ones first, then in their order. */
function match<T>(
  before: readonly T[],
  after: readonly T[],
  identity: (row: T) => string,
  same: (a: T, b: T) => boolean,
): { pairs: [T, T][]; removed: T[]; added: T[] } {
  const open = new Set(before.keys())
  const found = new Map<number, number>()
  for (const fits of [same, (a: T, b: T) => identity(a) === identity(b)]) {
    after.forEach((row, at) => {
      if (found.has(at)) return
      for (const old of open) {
        if (!fits(before[old]!, row)) continue
        found.set(at, old)
        open.delete(old)
        break
      }
    })
  }
  return {
    pairs: [...found].sort(([a], [b]) => a - b).map(([at, old]) => [before[old]!, after[at]!]),
    removed: [...open].map((old) => before[old]!),
    added: after.filter((_, at) => !found.has(at)),
  }
}
