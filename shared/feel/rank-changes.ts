export { rankChanges }
export type { FeelAdjustable, FeelComplaint, FeelTerm, RankedChange, WeighedEffect }

import { withOpposites } from '../effects/with-opposites.ts'
import { noReports, reportCount, trustIn, type ReportCounts } from './trust.ts'
import { feelWeights } from './weights.ts'
import { qualities, type Quality } from '#shared/vocabulary/qualities.ts'
import type { Basis, Change, Direction } from '#shared/vocabulary/effect-words.ts'
import type { Phase } from '#shared/vocabulary/phases.ts'

/** What the car does wrong: where, and which way the driver wants it. */
interface FeelComplaint {
  phase: Phase
  quality: Quality
  wants: Change
}

/** Published effects that fit the reader, alike ones added together: `weight` is the sum of strength × fit. */
interface WeighedEffect {
  adjustable: string
  direction: Direction
  phase: Phase
  quality: Quality
  change: Change
  basis: Basis
  mirrors: boolean
  weight: number
}

interface FeelAdjustable {
  key: string
  minutes: number
}

/** One term of a score. `value` is weight × trust, positive for help and for cost, negative for help that hurts. */
interface FeelTerm {
  kind: 'help' | 'cost'
  phase: Phase
  quality: Quality
  change: Change
  basis: Basis
  mirrored: boolean
  weight: number
  trust: number
  value: number
}

interface RankedChange {
  adjustable: string
  direction: Direction
  score: number
  help: number
  cost: number
  /** Mean trust of the effects that help, each by its weight. */
  trust: number
  minutes: number
  reports: ReportCounts
  terms: FeelTerm[]
}

/**
 * The changes that help with the complaints, best first: score = help − 0.35 × cost (weights.ts). An effect
 * that mirrors counts the other way round for the opposite direction, unless that direction has an effect of
 * its own here for the same part of the lap and quality. Left out: what does more harm than good to the
 * complaints themselves, and what every member who tried it found worse. Equal scores: fewer minutes first,
 * then the key in alphabetical order, then up before down.
 * @param reports heat reports that fit the reader, by `adjustable direction`
 */
function rankChanges(
  complaints: readonly FeelComplaint[],
  effects: readonly WeighedEffect[],
  adjustables: readonly FeelAdjustable[],
  reports: ReadonlyMap<string, ReportCounts>,
): RankedChange[] {
  const minutesOf = new Map(adjustables.map(({ key, minutes }) => [key, minutes]))
  const changes = new Map<string, RankedChange>()
  for (const { effect, direction, change, mirrored } of withOpposites(effects)) {
    const minutes = minutesOf.get(effect.adjustable)
    const kind = kindOf(complaints, effect, change)
    if (minutes === undefined || kind === undefined) continue
    const key = `${effect.adjustable} ${direction}`
    const counts = reports.get(key) ?? noReports
    const ranked = changes.get(key) ?? begin(effect.adjustable, direction, minutes, counts)
    changes.set(key, ranked)
    const trust = trustIn(effect.basis, counts)
    const { phase, quality, basis, weight } = effect
    const sign = kind === 'hurt' ? -1 : 1
    ranked.terms.push({
      kind: kind === 'cost' ? 'cost' : 'help',
      phase, quality, change, basis, mirrored, weight, trust,
      value: sign * weight * trust,
    })
  }
  return [...changes.values()].map(summed).filter(isWorthTrying).sort(better)
}

/** Whether moving a quality this way helps a complaint, makes it worse, costs something else, or is neither. */
function kindOf(
  complaints: readonly FeelComplaint[],
  { phase, quality }: Pick<WeighedEffect, 'phase' | 'quality'>,
  change: Change,
): 'help' | 'hurt' | 'cost' | undefined {
  const complaint = complaints.find((each) => each.phase === phase && each.quality === quality)
  if (complaint !== undefined) return complaint.wants === change ? 'help' : 'hurt'
  const { wanted } = qualities[quality]
  return wanted === 'neither' || wanted === change ? undefined : 'cost'
}

function begin(adjustable: string, direction: Direction, minutes: number, reports: ReportCounts): RankedChange {
  return { adjustable, direction, minutes, reports, score: 0, help: 0, cost: 0, trust: 0, terms: [] }
}

function summed(change: RankedChange): RankedChange {
  const total = (kind: FeelTerm['kind']) =>
    change.terms.filter((term) => term.kind === kind).reduce((sum, { value }) => sum + value, 0)
  const helping = change.terms.filter(({ kind, value }) => kind === 'help' && value > 0)
  const weight = helping.reduce((sum, term) => sum + term.weight, 0)
  const help = total('help')
  const cost = total('cost')
  return {
    ...change,
    help,
    cost,
    score: help - feelWeights.cost * cost,
    trust: weight === 0 ? 0 : helping.reduce((sum, { value }) => sum + value, 0) / weight,
    terms: [...change.terms].sort((a, b) => Math.abs(b.value) - Math.abs(a.value)),
  }
}

function isWorthTrying({ help, reports }: RankedChange): boolean {
  const onlyWorse = reportCount(reports) > 0 && reports.worse === reportCount(reports)
  return help > 0 && !onlyWorse
}

function better(a: RankedChange, b: RankedChange): number {
  return (
    rounded(b.score) - rounded(a.score) ||
    a.minutes - b.minutes ||
    (a.adjustable < b.adjustable ? -1 : a.adjustable > b.adjustable ? 1 : 0) ||
    (a.direction === b.direction ? 0 : a.direction === 'up' ? -1 : 1)
  )
}

/** The same sum in another order can differ in its last bit; to a driver that is a tie. */
function rounded(score: number): number {
  return Math.round(score * 1e9)
}
