export { HEAT_REPORT_SHAPE, listReportRows }
export type { HeatReportView }

import { desc, eq, type SQL } from 'drizzle-orm'
import { alias } from 'drizzle-orm/pg-core'
import { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { adjustables, heatReports, members } from '../db/schema/index.ts'
import { BITES, CAR_CLASSES, SURFACES } from '#shared/vocabulary/conditions.ts'
import { DIRECTIONS } from '#shared/vocabulary/effect-words.ts'
import { VERDICTS } from '#shared/vocabulary/verdicts.ts'

/** A report as it is shown and answered. */
const HEAT_REPORT_SHAPE = z.object({
  id: z.uuid(),
  adjustable: z.string(),
  direction: z.enum(DIRECTIONS),
  name: z.string().describe('The adjustable’s name.'),
  way: z.string().describe('The direction in the adjustable’s own words.'),
  verdict: z.enum(VERDICTS),
  carClass: z.enum(CAR_CLASSES),
  surface: z.enum(SURFACES),
  bite: z.enum(BITES),
  note: z.string(),
  changedAt: z.iso.datetime(),
  member: z.object({ id: z.uuid(), name: z.string() }),
  setAside: z.object({ by: z.string(), why: z.string() }).nullable().describe('Who does not let it count, and why.'),
})
type HeatReportView = z.output<typeof HEAT_REPORT_SHAPE>

const setAsideBy = alias(members, 'set_aside_by_member')

/** Reports with their names, the newest first. */
async function listReportRows(
  ctx: Pick<ServiceContext, 'db'>,
  { where, limit, offset = 0 }: { where: SQL | undefined; limit: number; offset?: number },
): Promise<HeatReportView[]> {
  const rows = await ctx.db
    .select({
      report: heatReports,
      name: adjustables.name,
      up: adjustables.upName,
      down: adjustables.downName,
      member: { id: members.id, name: members.name },
      by: setAsideBy.name,
    })
    .from(heatReports)
    .innerJoin(adjustables, eq(adjustables.key, heatReports.adjustable))
    .innerJoin(members, eq(members.id, heatReports.memberId))
    .leftJoin(setAsideBy, eq(setAsideBy.id, heatReports.setAsideBy))
    .where(where)
    .orderBy(desc(heatReports.changedAt), desc(heatReports.id))
    .limit(limit)
    .offset(offset)
  return rows.map(({ report, name, up, down, member, by }) => {
    const { id, adjustable, direction, verdict, carClass, surface, bite, note, changedAt, setAsideWhy } = report
    return {
      id, adjustable, direction, name, verdict, carClass, surface, bite, note, member,
      way: direction === 'up' ? up : down,
      changedAt: changedAt.toISOString(),
      setAside: setAsideWhy === null ? null : { by: by ?? '', why: setAsideWhy },
    }
  })
}
