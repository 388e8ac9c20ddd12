export { approveEdit }

import { eq } from 'drizzle-orm'
import type { z } from 'zod'
import type { ServiceContext, SignedIn } from '../context.ts'
import type { Transaction } from '../db/client.ts'
import { constraintBroken } from '../db/pg-errors.ts'
import { guides, reviews } from '../db/schema/index.ts'
import { ConflictError } from '../errors.ts'
import { createGuide, publishEdition, removeWish } from '../guides/index.ts'
import { queueMail } from '../mail/outbox.ts'
import { parseInput } from '../people/parse-input.ts'
import { requirePermission } from '../people/permissions.ts'
import { recordAudit } from '../records/audit.ts'
import { baseMovedError, mergeWithPublished } from './base-moved.ts'
import { changeEdit, requireState, requireVersion } from './change-edit.ts'
import { checkContent, type CheckedContent } from './check-content.ts'
import type { EditRow } from './edit-row.ts'
import { editView } from './edit-view.ts'
import { DecisionInput } from './inputs.ts'
import { loadEdit } from './load-edit.ts'
import { approvedMail } from './mails.ts'
import type { EditView } from './views.ts'

interface Approval {
  edit: EditView
  slug: string
  edition: number
}

/**
 * Publishes exactly the version that the moderator looked at, as the next edition: all of it in one transaction, or
 * nothing. Text that nobody looked at is never published, so an edit whose base has moved is refused here, even where it
 * could be merged.
 * @param input.version the version that was reviewed
 * @throws ConflictError `wrong_state` when someone decided already, `base_moved_mergeable` or `base_moved`;
 *   PreconditionFailedError (412) when the edit was changed since; ValidationError when it cannot be published as it is
 */
async function approveEdit(ctx: ServiceContext, { id, ...input }: { id: string } & z.input<typeof DecisionInput>): Promise<Approval> {
  const edit = await loadEdit(ctx, id, 'edit.decide')
  const { actor } = ctx
  requirePermission(actor, 'edit.decide', edit)
  await ctx.rateLimits.take('write', actor.id)
  const { version, note } = parseInput(DecisionInput, input)
  requireState(edit, 'approve')
  requireVersion(edit, version)
  await requireCurrentBase(ctx, edit)
  const checked = await checkContent(ctx, edit.content)
  try {
    const outcome = await ctx.db.transaction((tx) => publish(ctx, tx, { edit, actor, checked, note }))
    // The other nodes hear of it; this one's next answer must have it already.
    ctx.pageCache.clear()
    return { edit: await editView(ctx, id), ...outcome }
  } catch (error) {
    if (error instanceof BaseMovedMeanwhile) {
      // The edition that came in between may be this very edit, approved by someone else.
      const now = await loadEdit(ctx, id, 'edit.decide')
      requireState(now, 'approve')
      await requireCurrentBase(ctx, now)
    }
    if (constraintBroken(error, 'editions_edit', 'editions_number', 'reviews_once_a_version')) {
      throw new ConflictError('wrong_state', 'Someone else decided on this edit just now.')
    }
    if (constraintBroken(error, 'guides_mark', 'guides_slug_unique')) {
      throw new ConflictError('place_taken', 'Another guide took the same place in the book just now. Approve once more.')
    }
    if (constraintBroken(error, 'effects_adjustable_adjustables_key_fk')) {
      throw new ConflictError('adjustable_gone', 'One of its effects speaks of something that was taken off the list just now.')
    }
    throw error
  }
}

class BaseMovedMeanwhile extends Error {}

interface Decision {
  edit: EditRow
  actor: SignedIn
  checked: CheckedContent
  note: string
}

async function publish(ctx: ServiceContext, tx: Transaction, { edit, actor, checked, note }: Decision) {
  if (edit.guideId !== null) {
    const [guide] = await tx.select({ published: guides.publishedEditionId }).from(guides).where(eq(guides.id, edit.guideId)).for('update')
    if (guide?.published !== edit.baseEditionId) throw new BaseMovedMeanwhile()
  }
  await changeEdit(tx, edit, 'approve', { state: 'approved' })
  const { guideId, slug } = edit.guideId === null
    ? await createGuide(tx, { chapter: edit.chapter.letter, title: checked.content.title })
    : { guideId: edit.guideId, slug: edit.guideSlug! }
  const { number } = await publishEdition(tx, {
    guideId,
    content: checked.content,
    rendering: checked.rendering,
    authorId: edit.authorId,
    approverId: actor.id,
    editId: edit.id,
    summary: edit.summary,
    publishedAt: ctx.clock(),
  })
  if (edit.guideId === null) await removeWish(tx, { wantedId: edit.wantedId, title: checked.content.title })
  await tx.insert(reviews).values({
    editId: edit.id, editVersion: edit.version, reviewerId: actor.id, decision: 'approve', reason: note, decidedAt: ctx.clock(),
  })
  await recordAudit({ ...ctx, db: tx }, {
    action: 'edit.approve', subjectKind: 'edit', subjectId: edit.id, details: { version: edit.version, guide: slug, edition: number },
  })
  if (edit.author.email !== null) {
    const { email: to, name } = edit.author
    await queueMail(tx, approvedMail({ config: ctx.config, to, name, title: checked.content.title, moderator: actor.name, slug, edition: number, note }))
  }
  return { slug, edition: number }
}

/** @throws ConflictError when another edition was published since the edit began */
async function requireCurrentBase(ctx: ServiceContext, edit: EditRow): Promise<void> {
  const moved = await mergeWithPublished(ctx, edit)
  if (moved !== null) throw baseMovedError(moved)
}
