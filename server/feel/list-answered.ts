export { listAnswered }

import type { ServiceContext } from '../context.ts'
import { effects } from '../db/schema/index.ts'
import { complaintKey } from '#shared/vocabulary/complaints.ts'

/** What some published change can give, as complaints are written: `entry.steering.more`. An effect that mirrors gives both ways. */
async function listAnswered(ctx: Pick<ServiceContext, 'db'>): Promise<Set<string>> {
  const rows = await ctx.db
    .selectDistinct({ phase: effects.phase, quality: effects.quality, change: effects.change, mirrors: effects.mirrors })
    .from(effects)
  return new Set(
    rows.flatMap(({ phase, quality, change, mirrors }) => [
      complaintKey({ phase, quality, wants: change }),
      ...(mirrors ? [complaintKey({ phase, quality, wants: change === 'more' ? 'less' : 'more' })] : []),
    ]),
  )
}
