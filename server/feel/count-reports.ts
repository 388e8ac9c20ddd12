export { changeKey, countReports }

import { and, eq, sql, type Column } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { heatReportTallies as tallies } from '../db/schema/index.ts'
import type { FeelConditions } from '#shared/feel/fit.ts'
import type { ReportCounts } from '#shared/feel/trust.ts'

/** How many heat reports fit the reader, by change; a change without any is left out. */
async function countReports(
  ctx: Pick<ServiceContext, 'db'>,
  { carClass, surface, bite }: FeelConditions,
  only?: { adjustable: string },
): Promise<Map<string, ReportCounts>> {
  const total = (column: Column) => sql<number>`sum(${column})::int`
  const rows = await ctx.db
    .select({
      adjustable: tallies.adjustable,
      direction: tallies.direction,
      helped: total(tallies.helped),
      same: total(tallies.same),
      worse: total(tallies.worse),
    })
    .from(tallies)
    .where(
      and(
        only && eq(tallies.adjustable, only.adjustable),
        carClass && eq(tallies.carClass, carClass),
        surface && eq(tallies.surface, surface),
        bite && eq(tallies.bite, bite),
      ),
    )
    .groupBy(tallies.adjustable, tallies.direction)
  return new Map(rows.map(({ adjustable, direction, ...counts }) => [changeKey({ adjustable, direction }), counts]))
}

/** A change as `rankChanges` looks it up. */
function changeKey({ adjustable, direction }: { adjustable: string; direction: string }): string {
  return `${adjustable} ${direction}`
}
