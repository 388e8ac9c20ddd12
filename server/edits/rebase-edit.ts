export { rebaseEdit }

import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { ForbiddenError } from '../errors.ts'
import { parseInput } from '../people/parse-input.ts'
import { can, requirePermission } from '../people/permissions.ts'
import { recordAudit } from '../records/audit.ts'
import { isOpenEditState } from '#shared/vocabulary/edit-states.ts'
import { baseMovedError, mergeWithPublished } from './base-moved.ts'
import { changeEdit, requireVersion, wrongState } from './change-edit.ts'
import { editView } from './edit-view.ts'
import { countChanges } from './edition-content.ts'
import { VersionInput } from './inputs.ts'
import { loadEdit } from './load-edit.ts'
import type { EditView } from './views.ts'

/**
 * Puts an edit and the edition published since into one, as a new version to be looked at: nothing is published by it.
 * For the writer at any time, for a moderator while it waits for review. Does nothing when there is nothing to join.
 * @throws ConflictError `base_moved` when both changed the same places
 */
async function rebaseEdit(ctx: ServiceContext, { id, ...input }: { id: string } & z.input<typeof VersionInput>): Promise<EditView> {
  const edit = await loadEdit(ctx, id, 'edit.read')
  const { actor } = ctx
  requirePermission(actor, 'edit.read', edit)
  const isWriter = can(actor, 'edit.save', edit)
  if (!isWriter && !can(actor, 'edit.decide', edit)) {
    throw new ForbiddenError('Its writer or a moderator can bring this edit up to date.')
  }
  await ctx.rateLimits.take('write', actor.id)
  const { version } = parseInput(VersionInput, input)
  if (isWriter ? !isOpenEditState(edit.state) : edit.state !== 'in_review') throw wrongState(edit.state)
  requireVersion(edit, version)
  const moved = await mergeWithPublished(ctx, edit)
  if (moved === null) return editView(ctx, id)
  if (!moved.mergeable) throw baseMovedError(moved)
  const changes = edit.state === 'in_review' ? await countChanges(ctx, edit.publishedEditionId, moved.merged) : null
  await ctx.db.transaction(async (tx) => {
    await changeEdit(tx, { id, version }, [edit.state], { content: moved.merged, changes, baseEditionId: edit.publishedEditionId })
    await recordAudit({ ...ctx, db: tx }, {
      action: 'edit.rebase', subjectKind: 'edit', subjectId: id, details: { mergedWith: moved.edition },
    })
  })
  return editView(ctx, id)
}
