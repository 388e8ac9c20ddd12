export { letHeatReportCount, setAsideHeatReport }

import { eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { heatReports as reports } from '../db/schema/index.ts'
import { ForbiddenError, NotFoundError } from '../errors.ts'
import { parseInput } from '../people/parse-input.ts'
import { can, requirePermission } from '../people/permissions.ts'
import { recordAudit } from '../records/audit.ts'
import { ReportId, SetAsideInput } from './inputs.ts'
import { listReportRows, type HeatReportView } from './report-rows.ts'

/**
 * Does not let a report count, with a reason that its writer reads too. It goes into the record.
 * @throws ForbiddenError (403) also for one's own, NotFoundError (404), ValidationError (422)
 */
async function setAsideHeatReport(ctx: ServiceContext, input: unknown): Promise<HeatReportView> {
  requirePermission(ctx.actor, 'report.oversee')
  const { id, reason } = parseInput(SetAsideInput, input)
  return decide(ctx, id, { setAsideBy: ctx.actor.id, setAsideWhy: reason }, 'heat_report.set_aside')
}

/** Lets a report count again that was set aside. It goes into the record. @throws as setAsideHeatReport */
async function letHeatReportCount(ctx: ServiceContext, input: unknown): Promise<HeatReportView> {
  requirePermission(ctx.actor, 'report.oversee')
  const { id } = parseInput(ReportId, input)
  return decide(ctx, id, { setAsideBy: null, setAsideWhy: null }, 'heat_report.let_count')
}

async function decide(
  ctx: ServiceContext,
  id: string,
  change: { setAsideBy: string | null; setAsideWhy: string | null },
  action: string,
): Promise<HeatReportView> {
  return ctx.db.transaction(async (db) => {
    const [report] = await db.select().from(reports).where(eq(reports.id, id)).for('update')
    if (report === undefined) throw new NotFoundError('report', id)
    if (!can(ctx.actor, 'report.set_aside', report)) {
      throw new ForbiddenError('Nobody decides on their own report: another moderator does. You can take it back on your page.')
    }
    if (report.setAsideWhy !== change.setAsideWhy) {
      await db.update(reports).set(change).where(eq(reports.id, id))
      const { adjustable, direction, verdict, memberId } = report
      const details = { adjustable, direction, verdict, memberId, reason: change.setAsideWhy ?? report.setAsideWhy }
      await recordAudit({ ...ctx, db }, { action, subjectKind: 'heat_report', subjectId: id, details })
    }
    const [view] = await listReportRows({ db }, { where: eq(reports.id, id), limit: 1 })
    return view!
  })
}
