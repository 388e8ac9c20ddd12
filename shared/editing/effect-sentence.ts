export { effectSentence }

import { isWholeEffect, type EffectDraft } from '../schemas/effect.ts'
import { bites, carClasses, surfaces } from '../vocabulary/conditions.ts'
import { bases, describeEffect, strengths } from '../vocabulary/effect-words.ts'
import { phases } from '../vocabulary/phases.ts'
import { qualities } from '../vocabulary/qualities.ts'

const OPEN = 'not chosen yet'

/** An effect as one line of text, for reading two versions side by side; every part of it is named, also one still open. */
function effectSentence(effect: EffectDraft): string {
  const conditions = [
    ...effect.surfaces.map((key) => surfaces[key]),
    ...effect.bites.map((key) => bites[key]),
    ...effect.carClasses.map((key) => carClasses[key]),
  ]
  return [
    `${effect.adjustable || OPEN} ${effect.direction || OPEN}: ${isWholeEffect(effect) ? describeEffect(effect) : openWords(effect)}`,
    ...(conditions.length > 0 ? [`on ${conditions.join(', ')}`] : []),
    effect.mirrors ? 'the other way does the opposite' : 'says nothing about the other way',
    effect.basis === '' ? OPEN : bases[effect.basis],
    ...(effect.note === '' ? [] : [effect.note]),
  ].join('; ')
}

function openWords({ strength, change, quality, phase }: EffectDraft): string {
  return [
    strength === '' ? OPEN : strengths[strength],
    change || OPEN,
    quality === '' ? OPEN : qualities[quality].name,
    phase === '' ? OPEN : phases[phase].name.toLowerCase(),
  ].join(', ')
}
