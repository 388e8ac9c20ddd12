export { groundNames, groundsNamed, isGround, onGround }
export type { Ground }

import type { LapEffect } from '#shared/effects/lap-rows.ts'
import { BITES, SURFACES, bites, surfaces, type Bite, type Surface } from '#shared/vocabulary/conditions.ts'

/** What a reader may say about the ground: what it is made of, or how hard it bites. */
type Ground = Surface | `${Bite}_bite`

const grounds: readonly Ground[] = [...SURFACES, ...BITES.map((bite) => `${bite}_bite` as const)]

const groundNames: Record<Ground, string> = {
  ...surfaces,
  low_bite: bites.low,
  medium_bite: bites.medium,
  high_bite: bites.high,
}

function isGround(text: string | undefined): text is Ground {
  return grounds.some((ground) => ground === text)
}

/** The grounds on which these effects differ from elsewhere; on any other ground the table reads as it stands. */
function groundsNamed(effects: readonly LapEffect[]): Ground[] {
  return grounds.filter((ground) => effects.some((effect) => conditionFor(effect, ground).includes(ground)))
}

/** The effects that hold on this ground. Where it is the condition of an effect, the effect no longer has to name it. */
function onGround<T extends LapEffect>(effects: readonly T[], ground: Ground): T[] {
  return effects.flatMap((effect) => {
    const condition = conditionFor(effect, ground)
    if (condition.length > 0 && !condition.includes(ground)) return []
    return [isSurface(ground) ? { ...effect, surfaces: [] } : { ...effect, bites: [] }]
  })
}

function conditionFor(effect: LapEffect, ground: Ground): Ground[] {
  return isSurface(ground) ? [...effect.surfaces] : effect.bites.map((bite) => `${bite}_bite` as const)
}

function isSurface(ground: Ground): ground is Surface {
  return ground in surfaces
}
