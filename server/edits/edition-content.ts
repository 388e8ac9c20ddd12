export { contentOf, countChanges }

import { eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { editions } from '../db/schema/index.ts'
import { compareGuides, type ChangeSizes } from '#shared/editing/compare-guides.ts'
import { emptyGuideContent, type GuideDraft } from '#shared/schemas/guide-content.ts'

async function contentOf(ctx: Pick<ServiceContext, 'db'>, editionId: string): Promise<GuideDraft> {
  const [row] = await ctx.db.select({ content: editions.content }).from(editions).where(eq(editions.id, editionId))
  return row!.content
}

/** How much a text changes against the edition it stands on; against an empty page for a new guide. */
async function countChanges(ctx: Pick<ServiceContext, 'db'>, baseEditionId: string | null, content: GuideDraft): Promise<ChangeSizes> {
  const base = baseEditionId === null ? emptyGuideContent() : await contentOf(ctx, baseEditionId)
  return compareGuides(base, content).counts
}
