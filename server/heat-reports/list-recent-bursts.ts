export { listRecentBursts }
export type { ReportBurst }

import { sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { requirePermission } from '../people/permissions.ts'
import type { Direction } from '#shared/vocabulary/effect-words.ts'
import type { Verdict } from '#shared/vocabulary/verdicts.ts'

/** Many reports that say the same of one change within an hour. It may be a club night; it may be stuffing. */
interface ReportBurst {
  adjustable: string
  direction: Direction
  name: string
  way: string
  verdict: Verdict
  /** The most within any one hour. */
  reports: number
  lastAt: string
}

/** Five at once are more than chance brings; a burst in which one in five says otherwise is a club that argues. */
const bursts = { reports: 5, share: 0.8, withinDays: 7 }

/** The one-sided bursts of the last week among reports that count, the newest first. @throws ForbiddenError (403) for all but moderators */
async function listRecentBursts(ctx: ServiceContext): Promise<ReportBurst[]> {
  requirePermission(ctx.actor, 'report.oversee')
  const { rows } = await ctx.db.execute<{ adjustable: string; direction: Direction; name: string; way: string; verdict: Verdict; reports: number; lastAt: string }>(sql`
    with hours as (
      select adjustable, direction, verdict, changed_at,
        count(*) over (partition by adjustable, direction, verdict order by changed_at range between interval '1 hour' preceding and current row) as alike,
        count(*) over (partition by adjustable, direction order by changed_at range between interval '1 hour' preceding and current row) as everything
      from heat_reports
      where set_aside_by is null and changed_at > now() - make_interval(days => ${bursts.withinDays}::int)
    )
    select hours.adjustable, hours.direction, a.name, case hours.direction when 'up' then a.up_name else a.down_name end as way,
      hours.verdict, max(hours.alike)::int as reports,
      to_char(max(hours.changed_at) at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"') as "lastAt"
    from hours join adjustables a on a.key = hours.adjustable
    where hours.alike >= ${bursts.reports}::int and hours.alike >= ${bursts.share}::numeric * hours.everything
    group by hours.adjustable, hours.direction, hours.verdict, a.name, a.up_name, a.down_name
    order by max(hours.changed_at) desc
    limit 20
  `)
  return rows
}
