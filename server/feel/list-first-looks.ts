export { listFirstLooks }

import { and, asc, eq, or } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { firstLooks } from '../db/schema/index.ts'
import type { FeelComplaint } from '#shared/feel/rank-changes.ts'

/** What to look at before anything is changed, for these complaints in their order; what two of them share stands once. */
async function listFirstLooks(ctx: Pick<ServiceContext, 'db'>, complaints: readonly FeelComplaint[]): Promise<{ says: string }[]> {
  if (complaints.length === 0) return []
  const rows = await ctx.db
    .select({ phase: firstLooks.phase, quality: firstLooks.quality, wants: firstLooks.wants, says: firstLooks.says })
    .from(firstLooks)
    .where(
      or(
        ...complaints.map(({ phase, quality, wants }) =>
          and(eq(firstLooks.phase, phase), eq(firstLooks.quality, quality), eq(firstLooks.wants, wants)),
        ),
      ),
    )
    .orderBy(asc(firstLooks.position))
  const inOrder = complaints.flatMap((complaint) =>
    rows.filter(({ phase, quality, wants }) => phase === complaint.phase && quality === complaint.quality && wants === complaint.wants),
  )
  return [...new Set(inOrder.map(({ says }) => says))].map((says) => ({ says }))
}
