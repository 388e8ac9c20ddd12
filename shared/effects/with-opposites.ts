export { oppositeOf, withOpposites }
export type { Movable, Moved }

import type { Change, Direction } from '../vocabulary/effect-words.ts'

interface Movable {
  adjustable: string
  direction: Direction
  phase: string
  quality: string
  change: Change
  mirrors: boolean
}

/** An effect as it counts for one direction; `mirrored` when a guide states it for the other. */
type Moved<T> = { effect: T; direction: Direction; change: Change; mirrored: boolean }

const oppositeOf: Record<Direction, Direction> = { up: 'down', down: 'up' }

/**
 * Each effect as it stands, and, where it mirrors, the other way round too: moved in the opposite direction it makes the
 * opposite change, unless that direction has an effect of its own on the same adjustable, part of the lap and quality.
 */
function withOpposites<T extends Movable>(effects: readonly T[]): Moved<T>[] {
  const place = (effect: T, direction: Direction) => [effect.adjustable, direction, effect.phase, effect.quality].join(' ')
  const stated = new Set(effects.map((effect) => place(effect, effect.direction)))
  return effects.flatMap((effect) => {
    const own: Moved<T> = { effect, direction: effect.direction, change: effect.change, mirrored: false }
    const direction = oppositeOf[effect.direction]
    if (!effect.mirrors || stated.has(place(effect, direction))) return [own]
    return [own, { effect, direction, change: effect.change === 'more' ? 'less' : 'more', mirrored: true }]
  })
}
