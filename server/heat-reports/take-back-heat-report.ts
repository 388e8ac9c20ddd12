export { takeBackHeatReport }

import { and, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { heatReports as reports } from '../db/schema/index.ts'
import { ConflictError, NotFoundError } from '../errors.ts'
import { isUuid } from '../http/uuid.ts'
import { requirePermission } from '../people/permissions.ts'
import { tellFirstReport } from './tell-first-report.ts'

/**
 * Deletes one of one's own reports for good. Another's is not there, for whoever asks.
 * @throws NotFoundError (404); ConflictError `set_aside` (409), since a new report in its place would count
 */
async function takeBackHeatReport(ctx: ServiceContext, { id }: { id: string }): Promise<void> {
  const { actor } = ctx
  requirePermission(actor, 'report.own')
  if (!isUuid(id)) throw new NotFoundError('report', id)
  await ctx.db.transaction(async (db) => {
    const [report] = await db
      .select({ setAsideBy: reports.setAsideBy })
      .from(reports)
      .where(and(eq(reports.id, id), eq(reports.memberId, actor.id)))
      .for('update')
    if (report === undefined) throw new NotFoundError('report', id)
    if (report.setAsideBy !== null) throw new ConflictError('set_aside', 'A moderator has set this report aside. It does not count, and it stays as it is.')
    await db.delete(reports).where(eq(reports.id, id))
    await tellFirstReport({ db })
  })
}
