export { getGuide }

import type { ServiceContext } from '../context.ts'
import { NotFoundError } from '../errors.ts'
import { findEdition, findMoved } from './edition-query.ts'
import { editionView } from './edition-view.ts'
import type { GuideView, Moved } from './views.ts'

/**
 * The published edition of a guide.
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
  return editionView(ctx, row)
}
