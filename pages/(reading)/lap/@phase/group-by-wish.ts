export { groupByWish }
export type { LapChange, Wish }

import type { AdjustableView, LapEffect } from '#server/effects/index.ts'
import { withOpposites } from '#shared/effects/with-opposites.ts'
import { CHANGES, type Change } from '#shared/vocabulary/effect-words.ts'
import { QUALITIES, qualities, type Quality } from '#shared/vocabulary/qualities.ts'

/** One change to try, the way it has to be moved for what the driver wants. */
interface LapChange {
  effect: LapEffect
  adjustable: AdjustableView
  /** The name of the direction to move it: “thicker”. */
  way: string
  /** True where the guide states the other way and the effect is read backwards. */
  mirrored: boolean
  /** Another row of the same change does the opposite to this quality: the guides name the conditions. */
  disputed: boolean
}

/** What the driver wants on this part of the lap, and every published change that gives it. */
interface Wish {
  anchor: string
  quality: Quality
  change: Change
  rows: LapChange[]
}

/**
 * Sorts the published effects of one part of the lap by what a driver may want there. An effect that mirrors counts for
 * both directions.
 */
function groupByWish(effects: readonly LapEffect[], adjustables: readonly AdjustableView[]): Wish[] {
  const byKey = new Map(adjustables.map((adjustable) => [adjustable.key, adjustable]))
  const moves = withOpposites(effects).flatMap((moved) => {
    const adjustable = byKey.get(moved.effect.adjustable)
    return adjustable === undefined ? [] : [{ ...moved, adjustable, way: adjustable[moved.direction] }]
  })
  const keyOf = (move: (typeof moves)[number]) => `${move.effect.adjustable} ${move.direction} ${move.effect.quality}`
  const changesOf = new Map<string, Set<Change>>()
  for (const move of moves) changesOf.set(keyOf(move), (changesOf.get(keyOf(move)) ?? new Set()).add(move.change))

  const wishes = QUALITIES.flatMap((quality) =>
    CHANGES.map((change) => ({
      anchor: `${quality}-${change}`,
      quality,
      change,
      rows: moves
        .filter((move) => move.effect.quality === quality && move.change === change)
        .map((move) => ({
          effect: move.effect,
          adjustable: move.adjustable,
          way: move.way,
          mirrored: move.mirrored,
          disputed: (changesOf.get(keyOf(move))?.size ?? 0) > 1,
        }))
        .sort((a, b) => b.effect.strength - a.effect.strength || a.adjustable.minutes - b.adjustable.minutes),
    })),
  ).filter((wish) => wish.rows.length > 0)
  return [...wishes.filter(isUsual), ...wishes.filter((wish) => !isUsual(wish))]
}

/** What drivers usually want; the opposite is for who has gone too far, and stands below. */
function isUsual({ quality, change }: Pick<Wish, 'quality' | 'change'>): boolean {
  const { wanted } = qualities[quality]
  return wanted === 'neither' || wanted === change
}
