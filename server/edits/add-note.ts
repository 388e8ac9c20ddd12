export { addNote }

import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { editNotes } from '../db/schema/index.ts'
import { parseInput } from '../people/parse-input.ts'
import { requirePermission } from '../people/permissions.ts'
import { isOpenEditState } from '#shared/vocabulary/edit-states.ts'
import { wrongState } from './change-edit.ts'
import { editView } from './edit-view.ts'
import { NoteInput } from './inputs.ts'
import { loadEdit } from './load-edit.ts'
import type { EditView } from './views.ts'

/** Writer and moderators talk about an edit. A note changes neither text nor version. */
async function addNote(ctx: ServiceContext, { id, ...input }: { id: string } & z.input<typeof NoteInput>): Promise<EditView> {
  const edit = await loadEdit(ctx, id, 'edit.note')
  const { actor } = ctx
  requirePermission(actor, 'edit.note', edit)
  await ctx.rateLimits.take('write', actor.id)
  const { text } = parseInput(NoteInput, input)
  if (!isOpenEditState(edit.state)) throw wrongState(edit.state)
  await ctx.db.insert(editNotes).values({ editId: id, authorId: actor.id, text })
  return editView(ctx, id)
}
