export { createEdit }

import { and, eq, inArray } from 'drizzle-orm'
import type { z } from 'zod'
import type { ServiceContext, SignedIn } from '../context.ts'
import { chapters, editions, edits, guides, wantedGuides } from '../db/schema/index.ts'
import { NotFoundError } from '../errors.ts'
import { parseInput } from '../people/parse-input.ts'
import { requirePermission } from '../people/permissions.ts'
import { recordAudit } from '../records/audit.ts'
import { emptyGuideContent } from '#shared/schemas/guide-content.ts'
import { OPEN_EDIT_STATES } from '#shared/vocabulary/edit-states.ts'
import { editView } from './edit-view.ts'
import { CreateInput } from './inputs.ts'
import type { EditView } from './views.ts'

/**
 * Begins an edit: of a guide from its published edition, of a guide from one of its old editions, or of a new guide in
 * a chapter. Who already has an open edit of that guide gets it back unchanged (`created: false`), never a second one.
 */
async function createEdit(ctx: ServiceContext, input: z.input<typeof CreateInput>): Promise<{ edit: EditView; created: boolean }> {
  requirePermission(ctx.actor, 'edit.create')
  await ctx.rateLimits.take('write', ctx.actor.id)
  const start = parseInput(CreateInput, input)
  const { id, created } = 'chapter' in start
    ? { id: await beginNewGuide(ctx, ctx.actor, start), created: true }
    : await beginImprovement(ctx, ctx.actor, start)
  return { edit: await editView(ctx, id), created }
}

interface NewGuideStart {
  chapter: string
  wanted?: string | undefined
}

async function beginNewGuide(ctx: ServiceContext, actor: SignedIn, start: NewGuideStart): Promise<string> {
  const { chapter: letter, wanted } = start
  const [chapter] = await ctx.db.select({ letter: chapters.letter }).from(chapters).where(eq(chapters.letter, letter))
  if (chapter === undefined) throw new NotFoundError('chapter', letter)
  const wish = wanted === undefined ? null : await findWish(ctx, letter, wanted)
  const content = { ...emptyGuideContent(), title: wish?.title ?? '' }
  return insertDraft(ctx, { chapter: letter, authorId: actor.id, content, wantedId: wish?.id ?? null }).then((id) => id!)
}

/** Null too where somebody's guide has granted it meanwhile: then there is nothing to grant, and writing may begin all the same. */
async function findWish(ctx: ServiceContext, chapter: string, id: string) {
  const [wish] = await ctx.db
    .select({ id: wantedGuides.id, title: wantedGuides.title })
    .from(wantedGuides)
    .where(and(eq(wantedGuides.id, id), eq(wantedGuides.chapter, chapter)))
  return wish ?? null
}

async function beginImprovement(
  ctx: ServiceContext,
  actor: SignedIn,
  { guideSlug, restoreEdition }: { guideSlug: string; restoreEdition?: number | undefined },
): Promise<{ id: string; created: boolean }> {
  const [guide] = await ctx.db
    .select({ id: guides.id, editionId: editions.id, content: editions.content })
    .from(guides)
    .innerJoin(editions, eq(editions.id, guides.publishedEditionId))
    .where(eq(guides.slug, guideSlug))
  if (guide === undefined) throw new NotFoundError('guide', guideSlug)
  const old = restoreEdition === undefined ? null : await contentOfEdition(ctx, guide.id, guideSlug, restoreEdition)
  const draft = {
    guideId: guide.id,
    baseEditionId: guide.editionId,
    authorId: actor.id,
    content: old ?? guide.content,
    summary: restoreEdition === undefined ? '' : `Brings back edition ${restoreEdition}`,
  }
  // A unique index allows one open edit for each writer and guide. The loser of a race finds the winner's; if that was
  // closed in the same moment there is room again.
  for (;;) {
    const fresh = await insertDraft(ctx, draft)
    if (fresh !== undefined) return { id: fresh, created: true }
    const [open] = await ctx.db
      .select({ id: edits.id })
      .from(edits)
      .where(and(eq(edits.authorId, actor.id), eq(edits.guideId, guide.id), inArray(edits.state, [...OPEN_EDIT_STATES])))
    if (open !== undefined) return { id: open.id, created: false }
  }
}

async function contentOfEdition(ctx: ServiceContext, guideId: string, slug: string, number: number) {
  const [row] = await ctx.db
    .select({ content: editions.content })
    .from(editions)
    .where(and(eq(editions.guideId, guideId), eq(editions.number, number)))
  if (row === undefined) throw new NotFoundError('edition', `${slug} ${number}`)
  return row.content
}

async function insertDraft(ctx: ServiceContext, draft: typeof edits.$inferInsert): Promise<string | undefined> {
  return ctx.db.transaction(async (tx) => {
    const [row] = await tx.insert(edits).values(draft).onConflictDoNothing().returning({ id: edits.id })
    if (row !== undefined) await recordAudit({ ...ctx, db: tx }, { action: 'edit.create', subjectKind: 'edit', subjectId: row.id })
    return row?.id
  })
}
