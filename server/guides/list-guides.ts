export { listGuides }

import { and, asc, count, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { editions, guides } from '../db/schema/index.ts'
import { inShortOf, markOf, titleOf } from './edition-columns.ts'
import type { GuideEntry } from './views.ts'

const GUIDES_PER_PAGE = 50

interface GuideList {
  guides: GuideEntry[]
  page: number
  pages: number
  total: number
}

/** The published guides by their marks, a page at a time; of one chapter when its letter is given. */
async function listGuides(
  ctx: Pick<ServiceContext, 'db'>,
  { chapter, page = 1 }: { chapter?: string; page?: number } = {},
): Promise<GuideList> {
  const onShelf = and(chapter === undefined ? undefined : eq(guides.chapter, chapter), eq(editions.id, guides.publishedEditionId))
  const [rows, [totals]] = await Promise.all([
    ctx.db
      .select({
        slug: guides.slug,
        chapter: guides.chapter,
        number: guides.number,
        title: titleOf(editions.content),
        inShort: inShortOf(editions.content),
        edition: editions.number,
      })
      .from(guides)
      .innerJoin(editions, onShelf)
      .orderBy(asc(guides.chapter), asc(guides.number))
      .limit(GUIDES_PER_PAGE)
      .offset((page - 1) * GUIDES_PER_PAGE),
    ctx.db.select({ total: count() }).from(guides).innerJoin(editions, onShelf),
  ])
  const total = totals?.total ?? 0
  const entries = rows.map(({ number, ...row }) => ({ ...row, mark: markOf({ chapter: row.chapter, number }) }))
  return { guides: entries, page, pages: Math.max(1, Math.ceil(total / GUIDES_PER_PAGE)), total }
}
