export { saveEdit }

import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { parseInput } from '../people/parse-input.ts'
import { changeEdit, requireState } from './change-edit.ts'
import { editView } from './edit-view.ts'
import { SaveInput } from './inputs.ts'
import { loadEdit } from './load-edit.ts'
import { summaryToKeep } from './summary-to-keep.ts'
import type { EditView } from './views.ts'

/**
 * Keeps what was typed, as it was typed: a draft may be unfinished, and over the limits that a guide has. Only what could
 * not be kept at all is refused.
 * @throws PreconditionFailedError (412) when it was saved elsewhere since `version`, with the version it has now
 */
async function saveEdit(ctx: ServiceContext, { id, ...input }: { id: string } & z.input<typeof SaveInput>): Promise<EditView> {
  const edit = await loadEdit(ctx, id, 'edit.save')
  await ctx.rateLimits.take('write', edit.authorId)
  const { version, content, summary } = parseInput(SaveInput, input)
  requireState(edit, 'save')
  await changeEdit(ctx.db, { id, version }, 'save', { content, changes: null, ...summaryToKeep(edit, summary) })
  return editView(ctx, id)
}
