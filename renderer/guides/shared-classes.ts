export { withoutSharedClasses }
export type { ClassNote }

import type { LapEffect } from '#shared/effects/lap-rows.ts'
import { CAR_CLASSES } from '#shared/vocabulary/conditions.ts'
import { classWords } from '../words/class-words.ts'

/** “Front diff fluid, centre diff fluid: for 1/8 electric buggy, 1/8 truggy.” */
interface ClassNote {
  adjustables: string[]
  classes: string
}

/**
 * Where every effect of an adjustable is about the same car classes, that is said once beside the table instead of in every
 * cell: the classes leave the effects and come back as notes, adjustables with the same classes together.
 */
function withoutSharedClasses<T extends LapEffect & { adjustableName: string }>(
  effects: readonly T[],
): { effects: T[]; notes: ClassNote[] } {
  const shared = new Map<string, string>()
  for (const key of new Set(effects.map((effect) => effect.adjustable))) {
    const sets = new Set(effects.filter((effect) => effect.adjustable === key).map(classKey))
    const [only] = sets
    if (sets.size === 1 && only) shared.set(key, only)
  }
  const notes = [...new Set(shared.values())].map((classes) => ({
    adjustables: [...new Set(effects.filter((effect) => shared.get(effect.adjustable) === classes).map((effect) => effect.adjustableName))],
    classes: classWords(CAR_CLASSES.filter((carClass) => classes.split(' ').includes(carClass))),
  }))
  return {
    effects: effects.map((effect) => (shared.has(effect.adjustable) ? { ...effect, carClasses: [] } : effect)),
    notes: notes.filter(({ classes }) => classes !== ''),
  }
}

function classKey(effect: LapEffect): string {
  return CAR_CLASSES.filter((carClass) => effect.carClasses.includes(carClass)).join(' ')
}
