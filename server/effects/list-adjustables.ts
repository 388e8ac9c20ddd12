export { listAdjustables }

import type { ServiceContext } from '../context.ts'
import { adjustables } from '../db/schema/index.ts'
import { AXLES } from '#shared/vocabulary/axles.ts'
import { adjustableColumns, type AdjustableView } from './adjustable-view.ts'

/** Everything on the car that can be set, front to rear, then by name. */
async function listAdjustables(ctx: Pick<ServiceContext, 'db'>): Promise<AdjustableView[]> {
  const rows = await ctx.db.select(adjustableColumns).from(adjustables).orderBy(adjustables.name)
  return rows.sort((a, b) => AXLES.indexOf(a.axle) - AXLES.indexOf(b.axle))
}
