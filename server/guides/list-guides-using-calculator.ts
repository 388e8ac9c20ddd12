export { listGuidesUsingCalculator }

import { asc, eq, or, sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { editions, guides } from '../db/schema/index.ts'
import { inShortOf, markOf, titleOf } from './edition-columns.ts'
import type { GuideEntry } from './views.ts'

/** The published guides whose text holds this calculator or an example worked with it, by their marks. */
async function listGuidesUsingCalculator(ctx: Pick<ServiceContext, 'db'>, slug: string): Promise<GuideEntry[]> {
  const holds = (kind: 'calculator' | 'worked') => sql`${editions.parts} @> ${JSON.stringify([{ kind, slug }])}::jsonb`
  const rows = await ctx.db
    .select({
      slug: guides.slug,
      chapter: guides.chapter,
      number: guides.number,
      title: titleOf(editions.content),
      inShort: inShortOf(editions.content),
      edition: editions.number,
    })
    .from(guides)
    .innerJoin(editions, eq(editions.id, guides.publishedEditionId))
    .where(or(holds('calculator'), holds('worked')))
    .orderBy(asc(guides.chapter), asc(guides.number))
  return rows.map(({ number, ...row }) => ({ ...row, mark: markOf({ chapter: row.chapter, number }) }))
}
