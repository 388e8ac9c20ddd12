export { askByFeel }
export type { FeelAnswer, FeelChange, FeelEvidence }

import type { ServiceContext } from '../context.ts'
import { listAdjustables, type AdjustableView } from '../effects/index.ts'
import type { FeelQuery } from '#shared/feel/feel-query.ts'
import { rankChanges, type RankedChange } from '#shared/feel/rank-changes.ts'
import { agreeing, reportCount, sureOf, type Sureness } from '#shared/feel/trust.ts'
import type { Effect } from '#shared/schemas/effect.ts'
import type { Change } from '#shared/vocabulary/effect-words.ts'
import { countReports } from './count-reports.ts'
import { listEvidence, type EvidenceRow } from './list-evidence.ts'
import { weighEffects } from './weigh-effects.ts'

/** A published effect as it counts for the change: read the other way round where `mirrored`. */
type FeelEvidence = EvidenceRow & { change: Change; mirrored: boolean }

type FeelChange = RankedChange & {
  words: AdjustableView
  sure: Sureness
  agree: number
  reported: number
  evidence: FeelEvidence[]
  /** All that the guides say of the adjustable and that fits, for its lap line: what costs and helps nothing is in it too. */
  effects: Effect[]
  /** Where to read on: the guide about the adjustable, else the one whose effect weighs most here. */
  guide: string | null
}

interface FeelAnswer {
  query: FeelQuery
  changes: FeelChange[]
  /** How many more there are than `changes`, which ends where nobody reads on. */
  more: number
}

/** Nobody tries more than that between two heats. */
const LISTED = 20

/**
 * From what the car does wrong to what to try, best first. Without a complaint there is nothing to answer, and no
 * change is listed.
 */
async function askByFeel(ctx: Pick<ServiceContext, 'db'>, query: FeelQuery): Promise<FeelAnswer> {
  if (query.complaints.length === 0) return { query, changes: [], more: 0 }
  const [effects, adjustables, reports] = await Promise.all([weighEffects(ctx, query), listAdjustables(ctx), countReports(ctx, query)])
  const ranked = rankChanges(query.complaints, effects, adjustables, reports)
  const listed = ranked.slice(0, LISTED)
  const evidence = await listEvidence(ctx, [...new Set(listed.map(({ adjustable }) => adjustable))], query)
  const words = new Map(adjustables.map((adjustable) => [adjustable.key, adjustable]))
  return {
    query,
    more: ranked.length - listed.length,
    changes: listed.flatMap((change) => {
      const own = words.get(change.adjustable)
      if (own === undefined) return []
      const told = evidenceFor(change, evidence.get(change.adjustable) ?? [])
      return [{
        ...change,
        words: own,
        guide: own.guide ?? told[0]?.guide.slug ?? null,
        sure: sureOf(change.reports),
        agree: agreeing(change.reports),
        reported: reportCount(change.reports),
        evidence: told,
        effects: (evidence.get(change.adjustable) ?? []).map(({ effect }) => effect),
      }]
    }),
  }
}

/** The effects behind the terms of one change, as they count there. */
function evidenceFor(change: RankedChange, rows: readonly EvidenceRow[]): FeelEvidence[] {
  return rows.flatMap((row): FeelEvidence[] => {
    const { effect } = row
    const mirrored = effect.direction !== change.direction
    if (mirrored && !effect.mirrors) return []
    const does: Change = mirrored ? (effect.change === 'more' ? 'less' : 'more') : effect.change
    const counted = change.terms.some(
      (term) => term.mirrored === mirrored && term.phase === effect.phase && term.quality === effect.quality && term.change === does,
    )
    return counted ? [{ ...row, change: does, mirrored }] : []
  })
}
