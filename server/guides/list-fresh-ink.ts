export { listFreshInk }

import { and, desc, eq, sql } from 'drizzle-orm'
import { alias } from 'drizzle-orm/pg-core'
import type { ServiceContext } from '../context.ts'
import { editions, guides, members } from '../db/schema/index.ts'
import { compareGuides } from '#shared/editing/compare-guides.ts'
import { emptyGuideContent } from '#shared/schemas/guide-content.ts'
import { markOf } from './edition-columns.ts'
import type { FreshInkEntry } from './views.ts'

const previous = alias(editions, 'previous')

/** The guides that were published last, newest first, each with what its newest edition changed. */
async function listFreshInk(ctx: Pick<ServiceContext, 'db'>, { limit = 6 }: { limit?: number } = {}): Promise<FreshInkEntry[]> {
  const rows = await ctx.db
    .select({
      slug: guides.slug,
      chapter: guides.chapter,
      number: guides.number,
      edition: editions.number,
      summary: editions.summary,
      content: editions.content,
      before: previous.content,
      author: { id: members.id, name: members.name },
      publishedAt: editions.publishedAt,
    })
    .from(guides)
    .innerJoin(editions, eq(editions.id, guides.publishedEditionId))
    .innerJoin(members, eq(members.id, editions.authorId))
    .leftJoin(previous, and(eq(previous.guideId, guides.id), eq(previous.number, sql`${editions.number} - 1`)))
    .orderBy(desc(editions.publishedAt), guides.chapter, guides.number)
    .limit(limit)
  return rows.map((row) => ({
    slug: row.slug,
    mark: markOf(row),
    title: row.content.title,
    edition: row.edition,
    summary: row.summary,
    author: row.author,
    publishedAt: row.publishedAt.toISOString(),
    changes: compareGuides(row.before ?? emptyGuideContent(), row.content).counts,
  }))
}
