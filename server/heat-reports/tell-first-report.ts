export { hasHeatReports, tellFirstReport }

import { sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { heatReports } from '../db/schema/index.ts'

/** Whether the book has any heat report at all. */
async function hasHeatReports({ db }: Pick<ServiceContext, 'db'>): Promise<boolean> {
  return (await db.select({ id: heatReports.id }).from(heatReports).limit(1)).length > 0
}

/**
 * Empties every node's page cache when the first report has come or the last one gone: a page for visitors says whether
 * there are any. For all others the cache stays; counts stand only on pages that are never kept.
 */
async function tellFirstReport({ db }: Pick<ServiceContext, 'db'>): Promise<void> {
  const some = await db.select({ id: heatReports.id }).from(heatReports).limit(2)
  if (some.length <= 1) await db.execute(sql`select pg_notify('published', 'heat reports')`)
}
