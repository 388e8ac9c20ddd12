export { agreeing, noReports, reportCount, sureOf, trustIn }
export type { ReportCounts, Sureness }

import { feelWeights, sureThresholds } from './weights.ts'
import { wilsonLowerBound } from './wilson.ts'
import type { Basis } from '#shared/vocabulary/effect-words.ts'

/** Heat reports on one change that fit the reader's conditions. */
interface ReportCounts {
  helped: number
  same: number
  worse: number
}
type Sureness = 'settled' | 'leaning' | 'split' | 'thin'

const noReports: ReportCounts = { helped: 0, same: 0, worse: 0 }

function reportCount({ helped, same, worse }: ReportCounts): number {
  return helped + same + worse
}

/** How many agree with the guide; no difference is half of each. */
function agreeing({ helped, same }: ReportCounts): number {
  return helped + same / 2
}

/**
 * How far to trust an effect, between 0 and 1: what its basis is worth to begin with, moved by the reports
 * towards the least that they make likely. (n·W + 10·prior) / (n + 10).
 */
function trustIn(basis: Basis, reports: ReportCounts): number {
  const { prior, priorReports, z } = feelWeights
  const n = reportCount(reports)
  return (n * wilsonLowerBound(agreeing(reports), n, z) + priorReports * prior[basis]) / (n + priorReports)
}

/** The word for how sure the club is of a change. */
function sureOf(reports: ReportCounts): Sureness {
  const { settled, leaning } = sureThresholds
  const n = reportCount(reports)
  if (n < leaning.reports) return 'thin'
  const share = agreeing(reports) / n
  if (n >= settled.reports && share >= settled.share) return 'settled'
  return share >= leaning.share ? 'leaning' : 'split'
}
