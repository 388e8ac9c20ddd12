export { listLatestHeatReports, listOwnHeatReports, ownReportOn }

import { and, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { heatReports as reports } from '../db/schema/index.ts'
import { requirePermission } from '../people/permissions.ts'
import type { FeelConditions } from '#shared/feel/fit.ts'
import type { ReportableChange } from '#shared/heat-reports/report-address.ts'
import { listReportRows, type HeatReportView } from './report-rows.ts'

const OWN_AT_MOST = 500
const PAGE_SIZE = 50

/** One's own reports, the newest first; those set aside say why. @throws SignInRequiredError (401) */
async function listOwnHeatReports(ctx: ServiceContext): Promise<HeatReportView[]> {
  const { actor } = ctx
  requirePermission(actor, 'report.own')
  return listReportRows(ctx, { where: eq(reports.memberId, actor.id), limit: OWN_AT_MOST })
}

/** What one said earlier on this change under these conditions; undefined while any of them is open. */
async function ownReportOn(ctx: ServiceContext, change: ReportableChange, { carClass, surface, bite }: FeelConditions): Promise<HeatReportView | undefined> {
  const { actor } = ctx
  requirePermission(actor, 'report.own')
  if (carClass === undefined || surface === undefined || bite === undefined) return undefined
  const where = and(
    eq(reports.memberId, actor.id), eq(reports.adjustable, change.adjustable), eq(reports.direction, change.direction),
    eq(reports.carClass, carClass), eq(reports.surface, surface), eq(reports.bite, bite),
  )
  return (await listReportRows(ctx, { where, limit: 1 }))[0]
}

/** Everyone's reports for moderators, fifty a page, the newest first. @throws ForbiddenError (403) */
async function listLatestHeatReports(
  ctx: ServiceContext,
  { change, page = 1 }: { change?: ReportableChange | undefined; page?: number } = {},
): Promise<{ reports: HeatReportView[]; page: number; pages: number; total: number }> {
  requirePermission(ctx.actor, 'report.oversee')
  const where = change && and(eq(reports.adjustable, change.adjustable), eq(reports.direction, change.direction))
  const total = await ctx.db.$count(reports, where)
  const pages = Math.max(1, Math.ceil(total / PAGE_SIZE))
  const shown = Math.min(Math.max(1, Math.trunc(page) || 1), pages)
  return { reports: await listReportRows(ctx, { where, limit: PAGE_SIZE, offset: (shown - 1) * PAGE_SIZE }), page: shown, pages, total }
}
