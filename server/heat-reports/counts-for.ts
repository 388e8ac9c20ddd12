export { countsFor }

import type { ServiceContext } from '../context.ts'
import { changeKey, countReports } from '../feel/count-reports.ts'
import type { FeelConditions } from '#shared/feel/fit.ts'
import { noReports, type ReportCounts } from '#shared/feel/trust.ts'
import type { ReportableChange } from '#shared/heat-reports/report-address.ts'

/** How many reports on a change count, under these conditions; conditions that are left out are not asked. */
async function countsFor(ctx: Pick<ServiceContext, 'db'>, change: ReportableChange, conditions: FeelConditions = {}): Promise<ReportCounts> {
  const counts = await countReports(ctx, conditions, { adjustable: change.adjustable })
  return counts.get(changeKey(change)) ?? noReports
}
