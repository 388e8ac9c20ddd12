export { effectTitle, effectReading }

import type { Effect } from '#shared/schemas/effect.ts'
import { describeEffect } from '#shared/vocabulary/effect-words.ts'
import { phases } from '#shared/vocabulary/phases.ts'

interface AdjustableWords {
  key: string
  name: string
  up: string
  down: string
}

/** “Front diff fluid thicker, corner exit”: which statement this is, without what it says. */
function effectTitle(effect: Effect, adjustables: readonly AdjustableWords[]): string {
  return `${changeOf(effect, adjustables)}, ${phases[effect.phase].name.toLowerCase()}`
}

/** The whole statement as a reader would say it. */
function effectReading(effect: Effect, adjustables: readonly AdjustableWords[]): string {
  return `${changeOf(effect, adjustables)}: ${describeEffect(effect)}`
}

function changeOf({ adjustable, direction }: Effect, adjustables: readonly AdjustableWords[]): string {
  const words = adjustables.find(({ key }) => key === adjustable)
  return words === undefined ? `${adjustable} ${direction}` : `${words.name} ${words[direction]}`
}
