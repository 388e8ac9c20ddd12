export { findAdjustables }

import { inArray } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { adjustables } from '../db/schema/index.ts'
import { adjustableColumns, type AdjustableView } from './adjustable-view.ts'

/** The adjustables with these keys, in the order of their names; keys that nobody knows are left out. */
async function findAdjustables(ctx: Pick<ServiceContext, 'db'>, keys: Iterable<string>): Promise<AdjustableView[]> {
  const wanted = [...new Set(keys)]
  if (wanted.length === 0) return []
  return ctx.db.select(adjustableColumns).from(adjustables).where(inArray(adjustables.key, wanted)).orderBy(adjustables.name)
}
