export { listFreshInk }

import { desc, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { editions, guides, members } from '../db/schema/index.ts'
import { noChanges } from '#shared/editing/compare-guides.ts'
import { markOf, titleOf } from './edition-columns.ts'
import type { FreshInkEntry } from './views.ts'

/** The guides that were published last, newest first, each with what its newest edition changed. */
async function listFreshInk(ctx: Pick<ServiceContext, 'db'>, { limit = 6 }: { limit?: number } = {}): Promise<FreshInkEntry[]> {
  const rows = await ctx.db
    .select({
      slug: guides.slug,
      chapter: guides.chapter,
      number: guides.number,
      edition: editions.number,
      summary: editions.summary,
      title: titleOf(editions.content),
      changes: editions.changes,
      author: { id: members.id, name: members.name },
      publishedAt: editions.publishedAt,
    })
    .from(guides)
    .innerJoin(editions, eq(editions.id, guides.publishedEditionId))
    .innerJoin(members, eq(members.id, editions.authorId))
    .orderBy(desc(editions.publishedAt), guides.chapter, guides.number)
    .limit(limit)
  return rows.map((row) => ({
    slug: row.slug,
    mark: markOf(row),
    title: row.title,
    edition: row.edition,
    summary: row.summary,
    author: row.author,
    publishedAt: row.publishedAt.toISOString(),
    changes: { ...noChanges, ...row.changes },
  }))
}
