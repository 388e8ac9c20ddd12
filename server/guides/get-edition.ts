export { getEdition }
export type { EditionView }

import type { ServiceContext } from '../context.ts'
import { NotFoundError } from '../errors.ts'
import { findEdition, findMoved } from './edition-query.ts'
import { editionView } from './edition-view.ts'
import type { GuideView, Moved } from './views.ts'

type EditionView = GuideView & { isPublished: boolean; publishedEdition: number }

/**
 * Any edition of a guide as it was published, with the effects it stated then.
 * @throws NotFoundError
 */
async function getEdition(
  ctx: Pick<ServiceContext, 'db'>,
  which: { slug: string; number: number },
): Promise<EditionView | Moved> {
  const row = isEditionNumber(which.number) ? await findEdition(ctx, which) : null
  if (row === null) {
    const moved = await findMoved(ctx, which.slug)
    if (moved !== null) return moved
    throw new NotFoundError('edition', `${which.slug} ${which.number}`)
  }
  const view = await editionView(ctx, row, row.content.effects)
  return { ...view, isPublished: row.editionId === row.publishedEditionId, publishedEdition: row.publishedEdition }
}

// What does not fit PostgreSQL's integer is no edition either.
function isEditionNumber(number: number): boolean {
  return Number.isInteger(number) && number >= 1 && number <= 2_147_483_647
}
