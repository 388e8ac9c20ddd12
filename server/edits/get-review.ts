export { getReview }
export type { ReviewView }

import { eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { editions } from '../db/schema/index.ts'
import { findAdjustables, type AdjustableView } from '../effects/index.ts'
import { isAppError, type FieldProblem } from '../errors.ts'
import { requirePermission } from '../people/permissions.ts'
import { compareGuides, type GuideComparison } from '#shared/editing/compare-guides.ts'
import type { EffectDraft } from '#shared/schemas/effect.ts'
import { emptyGuideContent, type GuideDraft } from '#shared/schemas/guide-content.ts'
import { viewOf } from './edit-view.ts'
import { loadEdit } from './load-edit.ts'
import { previewOf } from './preview-guide.ts'
import type { EditView, Preview } from './views.ts'

interface ReviewView extends Omit<EditView, 'changes'> {
  /** What the edit started from; an empty guide for a new one. */
  base: GuideDraft
  changes: GuideComparison<EffectDraft>
  /** As it would be published; null when the body cannot be rendered, and then `refused` says why. */
  proposed: Preview | null
  refused: FieldProblem[]
  /** HTML of the edition it started from; null for a new guide. */
  baseHtml: string | null
  /** Everything that the effects before or after speak of. */
  adjustables: AdjustableView[]
}

/** An edit with all that one needs to decide on it: what changed, and how it would look. */
async function getReview(ctx: ServiceContext, id: string): Promise<ReviewView> {
  const row = await loadEdit(ctx, id, 'edit.read')
  const { actor } = ctx
  requirePermission(actor, 'edit.read', row)
  const [edition] = row.baseEditionId === null
    ? []
    : await ctx.db.select({ content: editions.content, html: editions.html }).from(editions).where(eq(editions.id, row.baseEditionId))
  const base = edition?.content ?? emptyGuideContent()
  const [view, laidOut, adjustables] = await Promise.all([
    viewOf(ctx, row),
    previewOf(ctx, row.content, actor.id).catch((error: unknown) => {
      if (isAppError(error) && error.status < 500) return error.fields
      throw error
    }),
    findAdjustables(ctx, [...base.effects, ...row.content.effects].map((effect) => effect.adjustable)),
  ])
  const refused = Array.isArray(laidOut) ? laidOut : []
  return {
    ...view,
    base,
    changes: compareGuides(base, row.content),
    proposed: Array.isArray(laidOut) ? null : laidOut,
    refused,
    baseHtml: edition?.html ?? null,
    adjustables,
  }
}
