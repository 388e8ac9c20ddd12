export { countWaitingEdits }

import { count, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { edits } from '../db/schema/index.ts'

/** How many edits wait at the review desk. */
async function countWaitingEdits(ctx: Pick<ServiceContext, 'db'>): Promise<number> {
  const [row] = await ctx.db.select({ waiting: count() }).from(edits).where(eq(edits.state, 'in_review'))
  return row?.waiting ?? 0
}
