export { mergeEdit }

import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { parseInput } from '../people/parse-input.ts'
import { baseMovedError, mergeWithPublished } from './base-moved.ts'
import { changeEdit, requireState, requireVersion } from './change-edit.ts'
import { editView } from './edit-view.ts'
import { MergeInput } from './inputs.ts'
import { loadEdit } from './load-edit.ts'
import { summaryToKeep } from './summary-to-keep.ts'
import type { EditView } from './views.ts'

/**
 * The writer has settled what both sides changed: the text becomes theirs, standing on the edition they settled it with.
 * @param input.baseEdition number of the published edition they looked at
 * @throws ConflictError `base_moved` when yet another edition was published meanwhile
 */
async function mergeEdit(ctx: ServiceContext, { id, ...input }: { id: string } & z.input<typeof MergeInput>): Promise<EditView> {
  const edit = await loadEdit(ctx, id, 'edit.save')
  await ctx.rateLimits.take('write', edit.authorId)
  const { version, baseEdition, content, summary } = parseInput(MergeInput, input)
  requireState(edit, 'save')
  requireVersion(edit, version)
  if (edit.publishedEdition !== baseEdition) {
    const moved = await mergeWithPublished(ctx, edit)
    if (moved !== null) throw baseMovedError(moved)
  }
  await changeEdit(ctx.db, { id, version }, 'save', {
    content,
    changes: null,
    baseEditionId: edit.publishedEditionId,
    ...(summary === undefined ? {} : summaryToKeep(edit, summary)),
  })
  return editView(ctx, id)
}
