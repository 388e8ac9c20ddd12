export { askByFeel }
export type { FeelAnswer, FeelChange, FeelEvidence }

import type { ServiceContext } from '../context.ts'
import { listAdjustables, type AdjustableView } from '../effects/index.ts'
import type { FeelQuery } from '#shared/feel/feel-query.ts'
import { rankChanges, type RankedChange } from '#shared/feel/rank-changes.ts'
import { agreeing, reportCount, sureOf, type Sureness } from '#shared/feel/trust.ts'
import { oppositeOf } from '#shared/effects/with-opposites.ts'
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
      return [{
        ...change,
        words: own,
        sure: sureOf(change.reports),
        agree: agreeing(change.reports),
        reported: reportCount(change.reports),
        evidence: evidenceFor(change, evidence.get(change.adjustable) ?? []),
      }]
    }),
  }
}

/** The effects behind one change: those stated for its direction, and the mirrored ones that its terms count. */
function evidenceFor(change: RankedChange, rows: readonly EvidenceRow[]): FeelEvidence[] {
  return rows.flatMap((row): FeelEvidence[] => {
    const { effect } = row
    if (effect.direction === change.direction) return [{ ...row, change: effect.change, mirrored: false }]
    const counted = change.terms.some(
      ({ mirrored, phase, quality }) => mirrored && phase === effect.phase && quality === effect.quality,
    )
    if (!counted || oppositeOf[effect.direction] !== change.direction) return []
    return [{ ...row, change: effect.change === 'more' ? 'less' : 'more', mirrored: true }]
  })
}
