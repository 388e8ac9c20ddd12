export { placeCallouts }
export type { Callout, ChapterGuide }

import { spotOf, type Spot } from './car-parts.ts'

interface ChapterGuide {
  mark: string
  title: string
  href: string
  /** Keys of the adjustables its effects are about. */
  adjustables: readonly string[]
}

/** A guide's name beside the drawing, with lines to the places on the car it is about. */
interface Callout extends ChapterGuide {
  spots: Spot[]
  x: number
  /** Above the car or below it. */
  above: boolean
  /** The title in lines that fit its share of the width. */
  lines: string[]
}

const LEFT = 20
const RIGHT = 1116
const LETTER = 8.2

/**
 * Spreads the guides that have a place on the car over the space above and below it, from rear to front, so that lines seldom
 * cross. Guides about no adjustable of the car are left out: the list beneath has them.
 */
function placeCallouts(guides: readonly ChapterGuide[]): Callout[] {
  const placed = guides
    .map((guide) => ({ ...guide, spots: spotsOf(guide) }))
    .filter((guide) => guide.spots.length > 0)
    .sort((one, other) => middle(one.spots, 'x') - middle(other.spots, 'x'))
  const above = placed.filter((_, at) => at % 2 === 0)
  const below = placed.filter((_, at) => at % 2 === 1)
  return [...spread(above, true), ...spread(below, false)]
}

function spotsOf(guide: ChapterGuide): Spot[] {
  const spots = guide.adjustables.flatMap((key) => spotOf(key) ?? [])
  return spots.filter((spot, at) => spots.findIndex((other) => other.x === spot.x && other.y === spot.y) === at)
}

function spread(guides: readonly (ChapterGuide & { spots: Spot[] })[], above: boolean): Callout[] {
  const share = (RIGHT - LEFT) / guides.length
  return guides.map((guide, at) => {
    const wish = middle(guide.spots, 'x') - 90
    const from = LEFT + at * share
    const lines = wrap(guide.title, Math.max(14, Math.floor((share - 60) / LETTER)))
    const width = 44 + Math.max(...lines.map((line) => line.length)) * LETTER
    return { ...guide, above, lines, x: Math.round(Math.min(Math.max(wish, from), Math.max(from, from + share - width))) }
  })
}

function middle(spots: readonly Spot[], axis: 'x' | 'y'): number {
  return spots.reduce((sum, spot) => sum + spot[axis], 0) / spots.length
}

/** Breaks a title between words; what does not fit two lines ends in an ellipsis. */
function wrap(title: string, width: number): string[] {
  const lines: string[] = []
  for (const word of title.split(' ')) {
    const last = lines.at(-1)
    if (last !== undefined && last.length + word.length < width) lines[lines.length - 1] = `${last} ${word}`
    else lines.push(word)
  }
  return lines.length <= 2 ? lines : [lines[0]!, `${lines[1]}…`]
}
