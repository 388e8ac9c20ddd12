export { withdrawEdit }

import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { parseInput } from '../people/parse-input.ts'
import { recordAudit } from '../records/audit.ts'
import { changeEdit, requireState } from './change-edit.ts'
import { editView } from './edit-view.ts'
import { VersionInput } from './inputs.ts'
import { loadEdit } from './load-edit.ts'
import type { EditView } from './views.ts'

/** The writer takes an edit back. Its words stay readable to them. */
async function withdrawEdit(ctx: ServiceContext, { id, ...input }: { id: string } & z.input<typeof VersionInput>): Promise<EditView> {
  const edit = await loadEdit(ctx, id, 'edit.withdraw')
  await ctx.rateLimits.take('write', edit.authorId)
  const { version } = parseInput(VersionInput, input)
  requireState(edit, 'withdraw')
  await ctx.db.transaction(async (tx) => {
    await changeEdit(tx, { id, version }, 'withdraw', { state: 'withdrawn' })
    await recordAudit({ ...ctx, db: tx }, { action: 'edit.withdraw', subjectKind: 'edit', subjectId: id })
  })
  return editView(ctx, id)
}
