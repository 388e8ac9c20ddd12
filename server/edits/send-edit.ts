export { sendEdit }

import { and, count, eq } from 'drizzle-orm'
import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import type { Transaction } from '../db/client.ts'
import { edits, members } from '../db/schema/index.ts'
import { ConflictError } from '../errors.ts'
import { parseInput } from '../people/parse-input.ts'
import { recordAudit } from '../records/audit.ts'
import { baseMovedError, mergeWithPublished } from './base-moved.ts'
import { changeEdit, requireState, requireVersion } from './change-edit.ts'
import { checkContent } from './check-content.ts'
import { editView } from './edit-view.ts'
import { countChanges } from './edition-content.ts'
import { SendInput, Summary } from './inputs.ts'
import { loadEdit } from './load-edit.ts'
import type { EditView } from './views.ts'

/** How many edits one member may have waiting at the review desk. */
const MOST_WAITING = 5

/**
 * Hands an edit in for review. It has to be whole by now. If another edition was published meanwhile, the two are put
 * together where they do not conflict (`merged: true`, and that is what the moderator sees).
 * @throws ValidationError (422) naming every field to mend; ConflictError `base_moved` with the places where both
 *   changed the same, or `too_many_waiting`
 */
async function sendEdit(
  ctx: ServiceContext,
  { id, ...input }: { id: string } & z.input<typeof SendInput>,
): Promise<EditView & { merged: boolean }> {
  const edit = await loadEdit(ctx, id, 'edit.send')
  const { version, summary: given } = parseInput(SendInput, input)
  requireState(edit, 'send')
  requireVersion(edit, version)
  await ctx.rateLimits.take('send', edit.authorId)
  const summary = Summary.safeParse(given ?? edit.summary)
  const besides = summary.success ? [] : [{ field: 'summary', message: summary.error.issues[0]!.message }]
  const moved = await mergeWithPublished(ctx, edit)
  if (moved !== null && !moved.mergeable) throw baseMovedError(moved)
  const { content } = await checkContent(ctx, moved?.merged ?? edit.content, besides)
  const baseEditionId = moved === null ? edit.baseEditionId : edit.publishedEditionId
  const changes = await countChanges(ctx, baseEditionId, content)
  await ctx.db.transaction(async (tx) => {
    await requireRoomAtTheDesk(tx, edit.authorId)
    const sent = await changeEdit(tx, { id, version }, 'send', {
      content,
      summary: summary.data!,
      state: 'in_review',
      sentAt: ctx.clock(),
      changes,
      baseEditionId,
    })
    await recordAudit({ ...ctx, db: tx }, {
      action: 'edit.send', subjectKind: 'edit', subjectId: id, details: { version: sent, mergedWith: moved?.edition ?? null },
    })
  })
  return { ...(await editView(ctx, id)), merged: moved !== null }
}

/** Counts under a lock of the writer's row, so that two edits sent at once cannot both take the last place. */
async function requireRoomAtTheDesk(tx: Transaction, authorId: string): Promise<void> {
  await tx.select({ id: members.id }).from(members).where(eq(members.id, authorId)).for('no key update')
  const [row] = await tx
    .select({ waiting: count() })
    .from(edits)
    .where(and(eq(edits.authorId, authorId), eq(edits.state, 'in_review')))
  if ((row?.waiting ?? 0) >= MOST_WAITING) {
    throw new ConflictError('too_many_waiting', 'Five of your edits wait for review already. Send this one when one of them is decided.')
  }
}
