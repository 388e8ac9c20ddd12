export { BASES, DIRECTIONS, CHANGES, STRENGTHS, bases, strengths, describeEffect }
export type { Basis, Change, Direction, Strength }

import { phases, type Phase } from './phases.ts'
import { qualities, type Quality } from './qualities.ts'

/** Along the adjustable's own axis: its first-named direction is up, its second is down. */
const DIRECTIONS = ['up', 'down'] as const
type Direction = (typeof DIRECTIONS)[number]

const CHANGES = ['more', 'less'] as const
type Change = (typeof CHANGES)[number]

const STRENGTHS = [1, 2, 3] as const
type Strength = (typeof STRENGTHS)[number]

/** Degrees of effect in words: never percentages of feel. */
const strengths: Record<Strength, string> = { 1: 'a touch', 2: 'clearly', 3: 'a lot' }

const BASES = ['physics', 'common_practice', 'reported'] as const
type Basis = (typeof BASES)[number]

const bases: Record<Basis, string> = {
  physics: 'Physics',
  common_practice: 'Common practice',
  reported: 'Reported by members',
}

/**
 * One effect in plain words, for example “a touch more steering at corner entry: turns in harder”.
 */
function describeEffect(effect: { phase: Phase; quality: Quality; change: Change; strength: Strength }): string {
  const quality = qualities[effect.quality]
  const where = effect.phase === 'middle' ? 'in mid-corner' : placeWords[effect.phase]
  return `${strengths[effect.strength]} ${effect.change} ${quality.name} ${where}: ${quality[effect.change]}`
}

const placeWords: Record<Exclude<Phase, 'middle'>, string> = {
  entry: `at ${phases.entry.name.toLowerCase()}`,
  exit: `at ${phases.exit.name.toLowerCase()}`,
  straight: 'on the straight',
  bumps: 'over bumps',
  jumps: 'over jumps',
}
