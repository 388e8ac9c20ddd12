export { publishEdition }

import { desc, eq } from 'drizzle-orm'
import type { Transaction } from '../db/client.ts'
import { editions, effects, guides } from '../db/schema/index.ts'
import { NotFoundError } from '../errors.ts'
import type { RenderResult } from '../rendering/index.ts'
import { compareGuides } from '#shared/editing/compare-guides.ts'
import { emptyGuideContent, type GuideContent } from '#shared/schemas/guide-content.ts'

interface NewEdition {
  guideId: string
  content: GuideContent
  /** The body as it was rendered before the transaction began. */
  rendering: Pick<RenderResult, 'html' | 'parts' | 'rendererVersion'>
  authorId: string
  approverId: string
  /** The edit it came from; null for the book a new installation starts with. */
  editId: string | null
  summary: string
  publishedAt?: Date
}

/**
 * Publishes one state of a guide: the next edition, the pointer to it and the effects it states, all or nothing. Must run
 * in a transaction; the guide's row is locked until its end. A trigger tells every node's page cache at commit.
 */
async function publishEdition(tx: Transaction, edition: NewEdition): Promise<{ editionId: string; number: number }> {
  const { guideId, content, rendering } = edition
  const [guide] = await tx.select({ id: guides.id }).from(guides).where(eq(guides.id, guideId)).for('update')
  if (guide === undefined) throw new NotFoundError('guide', guideId)
  const [last] = await tx
    .select({ number: editions.number, content: editions.content })
    .from(editions)
    .where(eq(editions.guideId, guideId))
    .orderBy(desc(editions.number))
    .limit(1)
  const number = (last?.number ?? 0) + 1
  const [row] = await tx
    .insert(editions)
    .values({
      guideId,
      number,
      content,
      html: rendering.html,
      parts: rendering.parts,
      rendererVersion: rendering.rendererVersion,
      authorId: edition.authorId,
      approverId: edition.approverId,
      editId: edition.editId,
      summary: edition.summary,
      changes: compareGuides(last?.content ?? emptyGuideContent(), content).counts,
      ...(edition.publishedAt === undefined ? {} : { publishedAt: edition.publishedAt }),
    })
    .returning({ id: editions.id })
  const editionId = row!.id
  await tx.update(guides).set({ publishedEditionId: editionId }).where(eq(guides.id, guideId))
  await tx.delete(effects).where(eq(effects.guideId, guideId))
  if (content.effects.length > 0) {
    await tx.insert(effects).values(content.effects.map((effect, position) => ({ ...effect, guideId, editionId, position })))
  }
  return { editionId, number }
}
