export { effectIdentity, sameEffect, changedEffectKeys }

import type { EffectDraft } from '../schemas/effect.ts'

/** What makes two effects statements about the same thing: what is changed, which way, where, and what it acts on. */
function effectIdentity(effect: EffectDraft): string {
  return [effect.adjustable, effect.direction, effect.phase, effect.quality].join(' ')
}

function sameEffect(a: EffectDraft, b: EffectDraft): boolean {
  return effectIdentity(a) === effectIdentity(b) && changedEffectKeys(a, b).length === 0
}

/** Which parts of a statement differ. The order of conditions says nothing, so it is not compared. */
function changedEffectKeys(before: EffectDraft, after: EffectDraft): (keyof EffectDraft)[] {
  return (Object.keys(before) as (keyof EffectDraft)[]).filter((key) => plain(before[key]) !== plain(after[key]))
}

function plain(value: EffectDraft[keyof EffectDraft]): string {
  return Array.isArray(value) ? [...value].sort().join(' ') : String(value)
}
