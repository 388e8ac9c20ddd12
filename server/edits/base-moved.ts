export { baseMovedError, mergeWithPublished }

import type { ServiceContext } from '../context.ts'
import { ConflictError, type AppError } from '../errors.ts'
import { mergeGuides } from '#shared/editing/merge-guides.ts'
import { GuideDraft } from '#shared/schemas/guide-content.ts'
import type { EditRow } from './edit-row.ts'
import { contentOf } from './edition-content.ts'
import type { BaseMoved } from './views.ts'

/** Joins an edit with the edition that was published since it began; null when none was. */
async function mergeWithPublished(ctx: Pick<ServiceContext, 'db'>, edit: EditRow): Promise<BaseMoved | null> {
  const { baseEditionId, publishedEditionId, publishedEdition } = edit
  if (baseEditionId === null || publishedEditionId === null || publishedEdition === null) return null
  if (baseEditionId === publishedEditionId) return null
  const [base, theirs] = await Promise.all([contentOf(ctx, baseEditionId), contentOf(ctx, publishedEditionId)])
  const { merged, conflicts } = mergeGuides(base, edit.content, theirs)
  // Two texts that each fit can be too long together; then only a person can say what to leave out.
  const tooLong = (GuideDraft.safeParse(merged).error?.issues ?? []).map((issue) => ({
    field: issue.path.join('.'), label: issue.message, base: '', mine: '', theirs: '',
  }))
  return { edition: publishedEdition, mergeable: conflicts.length + tooLong.length === 0, merged, conflicts: [...conflicts, ...tooLong] }
}

/** 409 `base_moved_mergeable` where the two fit together and only have to be looked at, `base_moved` where a person has to choose. */
function baseMovedError(moved: BaseMoved): AppError {
  return moved.mergeable
    ? new ConflictError(
        'base_moved_mergeable',
        `Edition ${moved.edition} was published since this edit began. The two fit together: put them in one and look at the result.`,
        { edition: moved.edition },
      )
    : new ConflictError(
        'base_moved',
        `Edition ${moved.edition} was published since this edit began, and it changes the same places. Choose what to keep in each.`,
        { edition: moved.edition, conflicts: moved.conflicts },
      )
}
