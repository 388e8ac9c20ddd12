export { saveHeatReport }

import { eq, isNull, sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { heatReports as reports } from '../db/schema/index.ts'
import { findAdjustables } from '../effects/index.ts'
import { ConflictError, ValidationError } from '../errors.ts'
import { parseInput } from '../people/parse-input.ts'
import { requirePermission } from '../people/permissions.ts'
import { HeatReportInput } from './inputs.ts'
import { listReportRows, type HeatReportView } from './report-rows.ts'
import { tellFirstReport } from './tell-first-report.ts'

/**
 * Says how a change went. A member has one report for each change and condition: a second replaces the first.
 * @throws ValidationError (422), TooManyRequestsError (429); ConflictError `set_aside` (409) where a moderator does not let
 *   the earlier one count, since writing it anew would undo that
 */
async function saveHeatReport(ctx: ServiceContext, input: unknown): Promise<{ report: HeatReportView; created: boolean }> {
  const { actor } = ctx
  requirePermission(actor, 'report.save')
  const report = parseInput(HeatReportInput, input ?? {})
  await ctx.rateLimits.take('heat_report', actor.id)
  return ctx.db.transaction(async (db) => {
    const [known] = await findAdjustables({ db }, [report.adjustable])
    if (known === undefined) {
      const message = `Change: there is no adjustable “${report.adjustable}”. Choose one from the list.`
      throw new ValidationError(message, [{ field: 'adjustable', message }])
    }
    const [saved] = await db
      .insert(reports)
      .values({ ...report, memberId: actor.id })
      .onConflictDoUpdate({
        target: [reports.memberId, reports.adjustable, reports.direction, reports.carClass, reports.surface, reports.bite],
        set: { verdict: report.verdict, note: report.note, changedAt: sql`now()` },
        setWhere: isNull(reports.setAsideBy),
      })
      // A row that the statement has just made was changed by no transaction before.
      .returning({ id: reports.id, created: sql<boolean>`xmax = 0` })
    if (saved === undefined) {
      throw new ConflictError('set_aside', 'A moderator has set your report on this aside; the reason stands on your page. It stays as it is.')
    }
    if (saved.created) await tellFirstReport({ db })
    const [view] = await listReportRows({ db }, { where: eq(reports.id, saved.id), limit: 1 })
    return { report: view!, created: saved.created }
  })
}
