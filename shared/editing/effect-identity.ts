export { effectIdentity, sameEffect, changedEffectKeys }

import type { Effect } from '../schemas/effect.ts'

/** What makes two effects statements about the same thing: what is changed, which way, where, and what it acts on. */
function effectIdentity(effect: Effect): string {
  return [effect.adjustable, effect.direction, effect.phase, effect.quality].join(' ')
}

function sameEffect(a: Effect, b: Effect): boolean {
  return effectIdentity(a) === effectIdentity(b) && changedEffectKeys(a, b).length === 0
}

/** Which parts of a statement differ. The order of conditions says nothing, so it is not compared. */
function changedEffectKeys(before: Effect, after: Effect): (keyof Effect)[] {
  return (Object.keys(before) as (keyof Effect)[]).filter((key) => plain(before[key]) !== plain(after[key]))
}

function plain(value: Effect[keyof Effect]): string {
  return Array.isArray(value) ? [...value].sort().join(' ') : String(value)
}
