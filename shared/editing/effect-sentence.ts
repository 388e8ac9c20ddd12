export { effectSentence }

import type { Effect } from '../schemas/effect.ts'
import { bites, carClasses, surfaces } from '../vocabulary/conditions.ts'
import { bases, describeEffect } from '../vocabulary/effect-words.ts'

/** A whole effect as one line of text, for reading two versions side by side; every part of it is named. */
function effectSentence(effect: Effect): string {
  const conditions = [
    ...effect.surfaces.map((key) => surfaces[key]),
    ...effect.bites.map((key) => bites[key]),
    ...effect.carClasses.map((key) => carClasses[key]),
  ]
  return [
    `${effect.adjustable} ${effect.direction}: ${describeEffect(effect)}`,
    ...(conditions.length > 0 ? [`on ${conditions.join(', ')}`] : []),
    effect.mirrors ? 'the other way does the opposite' : 'says nothing about the other way',
    bases[effect.basis],
    ...(effect.note === '' ? [] : [effect.note]),
  ].join('; ')
}
