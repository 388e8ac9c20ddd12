export { getGuide }

import { asc, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { effects } from '../db/schema/index.ts'
import { effectColumns } from '../effects/effect-columns.ts'
import { NotFoundError } from '../errors.ts'
import { findEdition, findMoved } from './edition-query.ts'
import { editionView } from './edition-view.ts'
import type { GuideView, Moved } from './views.ts'

/**
 * The published edition of a guide, with its effects as they stand in the effects table: what by feel counts, a reader sees.
 * Three statements.
 * @returns `movedTo` when the guide has another address now
 * @throws NotFoundError
 */
async function getGuide(ctx: Pick<ServiceContext, 'db'>, slug: string): Promise<GuideView | Moved> {
  const row = await findEdition(ctx, { slug })
  if (row === null) {
    const moved = await findMoved(ctx, slug)
    if (moved !== null) return moved
    throw new NotFoundError('guide', slug)
  }
  const rows = await ctx.db.select(effectColumns).from(effects).where(eq(effects.guideId, row.guideId)).orderBy(asc(effects.position))
  return editionView(ctx, row, rows)
}
