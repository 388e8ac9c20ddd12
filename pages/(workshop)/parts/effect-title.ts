export { effectTitle, effectReading }

import { isWholeEffect, type EffectDraft } from '#shared/schemas/effect.ts'
import { describeEffect } from '#shared/vocabulary/effect-words.ts'
import { phases } from '#shared/vocabulary/phases.ts'

interface AdjustableWords {
  key: string
  name: string
  up: string
  down: string
}

/** “Front diff fluid thicker, corner exit”: which statement this is, without what it says. */
function effectTitle(effect: EffectDraft, adjustables: readonly AdjustableWords[]): string {
  return [changeOf(effect, adjustables), ...(effect.phase === '' ? [] : [phases[effect.phase].name.toLowerCase()])].join(', ')
}

/** The whole statement as a reader would say it; of an unfinished one what is chosen so far. */
function effectReading(effect: EffectDraft, adjustables: readonly AdjustableWords[]): string {
  return isWholeEffect(effect) ? `${changeOf(effect, adjustables)}: ${describeEffect(effect)}` : `${effectTitle(effect, adjustables)} – not finished yet`
}

function changeOf({ adjustable, direction }: EffectDraft, adjustables: readonly AdjustableWords[]): string {
  if (adjustable === '') return 'A new effect'
  const words = adjustables.find(({ key }) => key === adjustable)
  const way = direction === '' ? '' : (words?.[direction] ?? direction)
  return `${words?.name ?? adjustable} ${way}`.trim()
}
