export { keepApart }
export type { PlacedText }

import { letter } from './figure-size.ts'

interface PlacedText {
  x: number
  y: number
  text: string
  anchor: 'start' | 'middle' | 'end'
  look: string
}

const line = 15
const tries = [0, -8, 8, -16, 16, -24, 24, -32, 32, -40, 40]

/**
 * The words of a drawing inside its edges and clear of one another: where one would stand on an earlier one it
 * moves up or down by the least that is enough. As wide as letters are on a phone, so it holds everywhere.
 */
function keepApart(texts: readonly PlacedText[], width: number, height: number): PlacedText[] {
  const placed: PlacedText[] = []
  for (const text of texts) {
    const inside = { ...text, x: clamp(text, width) }
    const moved = tries
      .map((by) => ({ ...inside, y: inside.y + by }))
      .find(({ y }, index) => index === 0 ? free(inside, placed) : y > 12 && y < height && free({ ...inside, y }, placed))
    placed.push(moved ?? inside)
  }
  return placed
}

function free(text: PlacedText, others: readonly PlacedText[]): boolean {
  return others.every(
    (other) =>
      Math.abs(text.y - other.y) >= line ||
      start(text) + wide(text) + 3 <= start(other) ||
      start(other) + wide(other) + 3 <= start(text),
  )
}

function clamp(text: PlacedText, width: number): number {
  const from = start(text)
  return text.x + Math.max(0, 2 - from) - Math.max(0, from + wide(text) - (width - 2))
}

function start({ x, anchor, text }: PlacedText): number {
  return x - text.length * letter * { start: 0, middle: 0.5, end: 1 }[anchor]
}

function wide({ text }: PlacedText): number {
  return text.length * letter
}
