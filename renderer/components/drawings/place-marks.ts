export { placeMarks, MARK_SPACE }
export type { PlacedMark }

import type { Callout } from './place-callouts.ts'

interface PlacedMark {
  text: string
  x: number
  y: number
}

/** How far the middles of two marks must be apart, so that both can be read on a phone. */
const MARK_SPACE = 66
const ROUNDS = 60
const EDGES = { left: 145, right: 925, top: 33, bottom: 267 }

/** The marks of the guides on the drawing of a phone: each at its places, pushed apart where they would cover one another. */
function placeMarks(callouts: readonly Callout[]): PlacedMark[] {
  const marks = callouts.flatMap(({ mark, spots }) => spots.map(({ x, y }) => ({ text: mark, x, y })))
  for (let round = 0; round < ROUNDS; round++) {
    marks.forEach((one, at) => marks.slice(at + 1).forEach((other) => pushApart(one, other)))
  }
  return marks.map(({ text, x, y }) => ({ text, x: Math.round(x), y: Math.round(y) }))
}

function pushApart(one: PlacedMark, other: PlacedMark): void {
  // Two marks on the very same spot part upwards and downwards.
  const dx = other.x - one.x
  const dy = other.y === one.y && dx === 0 ? 1 : other.y - one.y
  const apart = Math.hypot(dx, dy)
  if (apart >= MARK_SPACE) return
  const push = (MARK_SPACE - apart) / 2 / apart
  move(one, -dx * push, -dy * push)
  move(other, dx * push, dy * push)
}

function move(mark: PlacedMark, dx: number, dy: number): void {
  mark.x = Math.min(EDGES.right, Math.max(EDGES.left, mark.x + dx))
  mark.y = Math.min(EDGES.bottom, Math.max(EDGES.top, mark.y + dy))
}
