export { renewRenderings }

import { and, asc, eq, gt, lt, sql } from 'drizzle-orm'
import type { App } from '../context.ts'
import { editions } from '../db/schema/index.ts'
import { RENDERER_VERSION } from '../rendering/index.ts'

/**
 * Renders again every edition that an older renderer made, one after the other, and then has the page caches emptied. An
 * edition that cannot be rendered keeps its old HTML and is named in the log.
 */
async function renewRenderings(app: Pick<App, 'db' | 'renderer' | 'log'>): Promise<{ renewed: number; failed: number }> {
  let renewed = 0
  let failed = 0
  let after = '00000000-0000-0000-0000-000000000000'
  for (;;) {
    const [edition] = await app.db
      .select({ id: editions.id, body: sql<string>`${editions.content} ->> 'body'` })
      .from(editions)
      .where(and(lt(editions.rendererVersion, RENDERER_VERSION), gt(editions.id, after)))
      .orderBy(asc(editions.id))
      .limit(1)
    if (edition === undefined) break
    after = edition.id
    try {
      const { html, parts, rendererVersion } = await app.renderer.render(edition.body)
      await app.db
        .update(editions)
        .set({ html, parts, rendererVersion })
        .where(and(eq(editions.id, edition.id), lt(editions.rendererVersion, rendererVersion)))
      renewed += 1
    } catch (error) {
      failed += 1
      app.log.warn({ err: error, editionId: edition.id }, 'an edition could not be rendered again')
    }
  }
  if (renewed > 0) await app.db.execute(sql`select pg_notify('published', '')`)
  return { renewed, failed }
}
