export { editView, viewOf }

import { asc, count, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { editNotes, editions, guides, members, reviews } from '../db/schema/index.ts'
import { can } from '../people/permissions.ts'
import { canChangeState, isOpenEditState } from '#shared/vocabulary/edit-states.ts'
import { mergeWithPublished } from './base-moved.ts'
import { entryOf, type EditRow } from './edit-row.ts'
import { loadEdit } from './load-edit.ts'
import type { EditView } from './views.ts'

/** The edit as the person who asks may see it. @throws NotFoundError when it is hidden from them */
async function editView(ctx: ServiceContext, id: string): Promise<EditView> {
  return viewOf(ctx, await loadEdit(ctx, id, 'edit.read'))
}

async function viewOf(ctx: ServiceContext, row: EditRow): Promise<EditView> {
  const [notes, decisions, published, [approved], moved] = await Promise.all([
    listNotes(ctx, row.id),
    listReviews(ctx, row.id),
    findPublished(ctx, row.id),
    ctx.db.select({ edits: count() }).from(editions).where(eq(editions.authorId, row.authorId)),
    isOpenEditState(row.state) ? mergeWithPublished(ctx, row) : null,
  ])
  const open = isOpenEditState(row.state)
  const may = (right: 'edit.save' | 'edit.send' | 'edit.withdraw' | 'edit.decide' | 'edit.note') => can(ctx.actor, right, row)
  const maySave = may('edit.save') && canChangeState(row.state, 'save')
  return {
    ...entryOf(row),
    content: row.content,
    author: { id: row.author.id, name: row.author.name, approvedEdits: approved?.edits ?? 0 },
    notes,
    reviews: decisions,
    baseMoved: moved,
    published,
    may: {
      save: maySave,
      send: may('edit.send') && canChangeState(row.state, 'send'),
      withdraw: may('edit.withdraw') && canChangeState(row.state, 'withdraw'),
      decide: may('edit.decide') && canChangeState(row.state, 'approve'),
      note: may('edit.note') && open,
      rebase: moved?.mergeable === true && ((may('edit.save') && open) || (may('edit.decide') && row.state === 'in_review')),
      merge: moved !== null && maySave,
    },
  }
}

async function listNotes(ctx: ServiceContext, editId: string): Promise<EditView['notes']> {
  const rows = await ctx.db
    .select({ id: editNotes.id, author: { id: members.id, name: members.name }, text: editNotes.text, createdAt: editNotes.createdAt })
    .from(editNotes)
    .innerJoin(members, eq(members.id, editNotes.authorId))
    .where(eq(editNotes.editId, editId))
    .orderBy(asc(editNotes.createdAt), asc(editNotes.id))
  return rows.map((row) => ({ ...row, createdAt: row.createdAt.toISOString() }))
}

async function listReviews(ctx: ServiceContext, editId: string): Promise<EditView['reviews']> {
  const rows = await ctx.db
    .select({
      decision: reviews.decision,
      reason: reviews.reason,
      reviewer: { id: members.id, name: members.name },
      version: reviews.editVersion,
      decidedAt: reviews.decidedAt,
    })
    .from(reviews)
    .innerJoin(members, eq(members.id, reviews.reviewerId))
    .where(eq(reviews.editId, editId))
    .orderBy(asc(reviews.decidedAt))
  return rows.map((row) => ({ ...row, decidedAt: row.decidedAt.toISOString() }))
}

async function findPublished(ctx: ServiceContext, editId: string): Promise<EditView['published']> {
  const [row] = await ctx.db
    .select({ slug: guides.slug, edition: editions.number })
    .from(editions)
    .innerJoin(guides, eq(guides.id, editions.guideId))
    .where(eq(editions.editId, editId))
  return row ?? null
}
