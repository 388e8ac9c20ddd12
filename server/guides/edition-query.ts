export { findEdition, findMoved }
export type { EditionRow }

import { and, eq, sql, type SQL } from 'drizzle-orm'
import { alias } from 'drizzle-orm/pg-core'
import type { ServiceContext } from '../context.ts'
import { chapters, editions, guides, members, slugRedirects } from '../db/schema/index.ts'
import { SLUG } from './slug.ts'
import type { GuideView, Moved } from './views.ts'

/** Who wrote the editions of a guide up to this one, most editions first. */
const contributors = sql<GuideView['contributors']>`(
  select json_agg(json_build_object('id', w.id, 'name', w.name, 'editions', w.editions) order by w.editions desc, w.name)
  from (
    select m.id, m.name, count(*)::int as editions from editions e join members m on m.id = e.author_id
    where e.guide_id = ${guides.id} and e.number <= ${editions.number} group by m.id
  ) w)`

const authors = alias(members, 'authors')
const approvers = alias(members, 'approvers')

type EditionRow = NonNullable<Awaited<ReturnType<typeof findEdition>>>

/**
 * One edition with its guide and its people, in one statement; the published one unless a number is given. The statement has a
 * name, so that PostgreSQL plans it once a connection: planning takes four times as long as finding the row.
 */
async function findEdition(ctx: Pick<ServiceContext, 'db'>, which: { slug: string; number?: number }) {
  if (!SLUG.test(which.slug)) return null
  const edition: SQL = which.number === undefined
    ? eq(editions.id, guides.publishedEditionId)
    : and(eq(editions.guideId, guides.id), eq(editions.number, which.number))!
  const [row] = await ctx.db
    .select({
      guideId: guides.id,
      slug: guides.slug,
      number: guides.number,
      chapter: { letter: chapters.letter, name: chapters.name },
      editionId: editions.id,
      edition: editions.number,
      content: editions.content,
      html: editions.html,
      parts: editions.parts,
      summary: editions.summary,
      publishedAt: editions.publishedAt,
      author: { id: authors.id, name: authors.name },
      approver: { id: approvers.id, name: approvers.name },
      publishedEditionId: guides.publishedEditionId,
      editions: sql<number>`(select count(*)::int from editions e where e.guide_id = ${guides.id})`,
      publishedEdition: sql<number>`(select e.number from editions e where e.id = ${guides.publishedEditionId})`,
      contributors,
      firstPublishedAt: sql<Date>`(select min(e.published_at) from editions e where e.guide_id = ${guides.id})`.mapWith(editions.publishedAt),
    })
    .from(guides)
    .innerJoin(editions, edition)
    .innerJoin(chapters, eq(chapters.letter, guides.chapter))
    .innerJoin(authors, eq(authors.id, editions.authorId))
    .innerJoin(approvers, eq(approvers.id, editions.approverId))
    .where(eq(guides.slug, which.slug))
    .prepare(which.number === undefined ? 'published_edition' : 'edition_by_number')
    .execute()
  return row ?? null
}

/** The present address of a guide that once stood under `slug`. */
async function findMoved(ctx: Pick<ServiceContext, 'db'>, slug: string): Promise<Moved | null> {
  if (!SLUG.test(slug)) return null
  const [row] = await ctx.db
    .select({ movedTo: guides.slug })
    .from(slugRedirects)
    .innerJoin(guides, eq(guides.id, slugRedirects.guideId))
    .where(eq(slugRedirects.slug, slug))
  return row ?? null
}
