export { buildLapRows, effectMark }
export type { AdjustableWords, LapCell, LapEffect, LapGroundNote, LapRow, LapMark }

import { CAR_CLASSES, bites, carClasses, surfaces, type Bite, type CarClass, type Surface } from '../vocabulary/conditions.ts'
import { strengths, type Basis, type Change, type Direction, type Strength } from '../vocabulary/effect-words.ts'
import { PHASES, type Phase } from '../vocabulary/phases.ts'
import { QUALITIES, qualities, type Quality } from '../vocabulary/qualities.ts'
import { stepWords } from './step-words.ts'
import { withOpposites } from './with-opposites.ts'

/** An effect as the lap line needs it; a row of the database or of a guide's content fits. */
interface LapEffect {
  adjustable: string
  direction: Direction
  phase: Phase
  quality: Quality
  change: Change
  strength: Strength
  surfaces: readonly Surface[]
  bites: readonly Bite[]
  carClasses: readonly CarClass[]
  mirrors: boolean
  basis: Basis
  note: string
}

/** What the lap line has to know of an adjustable. */
interface AdjustableWords {
  key: string
  name: string
  unit: string
  up: string
  down: string
  smallStep: number
}

/** Where an effect holds, when it does not hold everywhere, and why. */
interface LapGroundNote {
  surface: Surface | null
  /** “A lot on loose”; empty when it holds everywhere. */
  place: string
  /** The writer's reason; empty when there is none. */
  note: string
  /** Both, for where there is room. */
  words: string
}

/** One quality at one part of the lap. `split` when the guide says both more and less under the same conditions. */
interface LapMark {
  quality: Quality
  end: 'front' | 'rear' | 'whole'
  change: Change | 'split'
  strength: Strength
  /** “Clearly less steering”, in the parts that a table sets bold and plain. */
  degree: string
  name: string
  grounds: LapGroundNote[]
}

interface LapCell {
  phase: Phase
  /** At most two, the one a driver feels most first. */
  lead: LapMark[]
  /** The others, for a line of words. */
  rest: LapMark[]
}

/** One change: an adjustable moved one small step in one direction. */
interface LapRow {
  key: string
  adjustable: string
  direction: Direction
  /** “Front diff fluid”, also where `name` leaves it out. */
  part: string
  /** “Thicker” in a table about one adjustable, “Front diff fluid: thicker” otherwise. */
  name: string
  /** “2,000 cSt at a time”; empty for an adjustable that is not known. */
  size: string
  /** Everything in it is the opposite of the other direction. */
  mirrored: boolean
  bases: Basis[]
  cells: LapCell[]
}

const LEADS = 2

/**
 * The rows of an effects table, in the order in which the effects name their adjustables, `up` before `down`. Every row has all six cells: that nothing
 * changes is knowledge too.
 */
function buildLapRows(effects: readonly LapEffect[], adjustables: readonly AdjustableWords[]): LapRow[] {
  const keys = [...new Set(effects.map((effect) => effect.adjustable))]
  const alone = keys.length === 1
  return keys.flatMap((key) => {
    const words = adjustables.find((adjustable) => adjustable.key === key)
    const own = effects.filter((effect) => effect.adjustable === key)
    return (['up', 'down'] as const).flatMap((direction) => {
      const row = buildRow(own, direction, words, key, alone)
      return row === null ? [] : [row]
    })
  })
}

function buildRow(
  effects: readonly LapEffect[],
  direction: Direction,
  words: AdjustableWords | undefined,
  key: string,
  alone: boolean,
): LapRow | null {
  const moved = withOpposites(effects).filter((each) => each.direction === direction)
  // What a note explains holds the way it was written.
  const all = moved.map(({ effect, change, mirrored }) => (mirrored ? { ...effect, direction, change, note: '' } : effect))
  if (all.length === 0) return null
  const way = words === undefined ? direction : words[direction]
  return {
    key: `${key}-${direction}`,
    adjustable: key,
    direction,
    part: words?.name ?? key,
    name: alone ? capital(way) : `${words?.name ?? key}: ${way}`,
    size: words === undefined ? '' : stepWords(words),
    mirrored: moved.every(({ mirrored }) => mirrored),
    bases: [...new Set(all.map((effect) => effect.basis))],
    cells: PHASES.map((phase) => buildCell(phase, all.filter((effect) => effect.phase === phase))),
  }
}

function buildCell(phase: Phase, effects: readonly LapEffect[]): LapCell {
  const marks = QUALITIES.flatMap((quality) => {
    const about = effects.filter((effect) => effect.quality === quality)
    return about.length === 0 ? [] : buildMarks(quality, about)
  }).sort((one, other) => other.strength - one.strength)
  return { phase, lead: marks.slice(0, LEADS), rest: marks.slice(LEADS) }
}

/** One mark for a quality, or two when it goes either way depending on the ground. */
function buildMarks(quality: Quality, effects: readonly LapEffect[]): LapMark[] {
  const anywhere = effects.filter((effect) => !isConditional(effect))
  const changes = new Set(anywhere.map((effect) => effect.change))
  if (changes.size > 1) return [mark(quality, 'split', strongest(anywhere), effects.flatMap((effect) => groundNotes(effect)))]
  return (['more', 'less'] as const).flatMap((change) => {
    const same = effects.filter((effect) => effect.change === change)
    if (same.length === 0) return []
    const general = same.filter((effect) => !isConditional(effect))
    const base = general.length > 0 ? strongest(general) : strongest(same)
    const grounds = same.flatMap((effect) => groundNotes(effect, general.length > 0 ? base : undefined))
    return [mark(quality, change, base, grounds)]
  })
}

function mark(quality: Quality, change: LapMark['change'], base: LapEffect, grounds: LapGroundNote[]): LapMark {
  const { name, end } = qualities[quality]
  const degree = change === 'split' ? 'Split:' : `${capital(strengths[base.strength])} ${change}`
  return { quality, end, change, strength: base.strength, degree, name, grounds }
}

/** One effect by itself, as pins and words; its conditions stand in `grounds`. */
function effectMark(effect: LapEffect): LapMark {
  return mark(effect.quality, effect.change, effect, groundNotes(effect))
}

function isConditional(effect: LapEffect): boolean {
  return effect.surfaces.length + effect.bites.length + effect.carClasses.length > 0
}

function strongest(effects: readonly LapEffect[]): LapEffect {
  return effects.reduce((best, effect) => (effect.strength > best.strength ? effect : best))
}

/** Where it holds, how much there if that differs from what holds everywhere, and the writer's note. */
function groundNotes(effect: LapEffect, everywhere?: LapEffect): LapGroundNote[] {
  const { note } = effect
  if (!isConditional(effect)) return note === '' ? [] : [{ surface: null, place: '', note, words: note }]
  const much = everywhere && everywhere.strength !== effect.strength ? strengths[effect.strength] : ''
  const grounds = [
    ...effect.surfaces.map((surface) => surfaces[surface].toLowerCase()),
    ...effect.bites.map((bite) => bites[bite].toLowerCase()),
  ]
  const on = grounds.length > 0 ? `on ${joinWords(grounds)}` : ''
  const place = capital([much, on, classWords(effect.carClasses)].filter((words) => words !== '').join(' '))
  return [{ surface: effect.surfaces[0] ?? null, place, note, words: note === '' ? place : `${place}: ${note}` }]
}

/** “for 1/8 truggy”; a long list is told by what it leaves out. */
function classWords(named: readonly CarClass[]): string {
  if (named.length === 0) return ''
  const others = CAR_CLASSES.filter((carClass) => !named.includes(carClass))
  if (others.length === 0) return 'for every class'
  if (named.length > others.length) return `for all but ${joinWords(others.map((carClass) => carClasses[carClass]))}`
  return `for ${joinWords(named.map((carClass) => carClasses[carClass]))}`
}

function joinWords(words: readonly string[]): string {
  return words.length < 2 ? (words[0] ?? '') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`
}

function capital(text: string): string {
  return text.slice(0, 1).toUpperCase() + text.slice(1)
}
