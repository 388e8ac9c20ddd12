export { getHistory }
export type { GuideHistory, HistoryLayer }

import { and, count, desc, eq, gt, lte } from 'drizzle-orm'
import { alias } from 'drizzle-orm/pg-core'
import type { ServiceContext } from '../context.ts'
import { chapters, editions, edits, guides, members, reviews } from '../db/schema/index.ts'
import { NotFoundError } from '../errors.ts'
import { noChanges, type ChangeSizes } from '#shared/editing/compare-guides.ts'
import { markOf, titleOf } from './edition-columns.ts'
import { findMoved } from './edition-query.ts'
import { SLUG } from './slug.ts'
import type { ChapterName, Moved, Person } from './views.ts'

const EDITIONS_PER_PAGE = 20

type HistoryLayer =
  | {
      kind: 'edition'
      number: number
      summary: string
      author: Person
      approver: Person
      publishedAt: string
      /** Against the edition before it; the first against an empty page. */
      changes: ChangeSizes
    }
  /** An edit that was never laid. It names no writer. */
  | { kind: 'declined'; summary: string; reason: string; declinedBy: Person; at: string }

interface GuideHistory {
  slug: string
  mark: string
  title: string
  chapter: ChapterName
  publishedEdition: number
  editions: number
  page: number
  pages: number
  /** Newest first. */
  layers: HistoryLayer[]
}

/** How a guide came about, twenty editions at a time, with the edits declined in between. @throws NotFoundError */
async function getHistory(
  ctx: Pick<ServiceContext, 'db'>,
  { slug, page = 1 }: { slug: string; page?: number },
): Promise<GuideHistory | Moved> {
  const guide = await findGuide(ctx, slug)
  if (guide === null) {
    const moved = await findMoved(ctx, slug)
    if (moved !== null) return moved
    throw new NotFoundError('guide', slug)
  }
  const pages = Math.max(1, Math.ceil(guide.editions / EDITIONS_PER_PAGE))
  const shown = await listEditions(ctx, guide.id, (page - 1) * EDITIONS_PER_PAGE, EDITIONS_PER_PAGE)
  const laid = shown.map((row): HistoryLayer => ({
    kind: 'edition',
    number: row.number,
    summary: row.summary,
    author: row.author,
    approver: row.approver,
    publishedAt: row.publishedAt.toISOString(),
    changes: { ...noChanges, ...row.changes },
  }))
  const newest = page === 1 ? null : (await listEditions(ctx, guide.id, (page - 1) * EDITIONS_PER_PAGE - 1, 1))[0]?.publishedAt ?? null
  const declined = shown.length === 0 ? [] : await listDeclined(ctx, guide.id, shown.at(-1)!.publishedAt, newest)
  return {
    slug,
    mark: markOf({ chapter: guide.chapter.letter, number: guide.number }),
    title: guide.title,
    chapter: guide.chapter,
    publishedEdition: guide.publishedEdition,
    editions: guide.editions,
    page,
    pages,
    layers: [...laid, ...declined].sort((a, b) => timeOf(b).localeCompare(timeOf(a))),
  }
}

function timeOf(layer: HistoryLayer): string {
  return layer.kind === 'edition' ? layer.publishedAt : layer.at
}

async function findGuide(ctx: Pick<ServiceContext, 'db'>, slug: string) {
  if (!SLUG.test(slug)) return null
  const all = alias(editions, 'all_editions')
  const [row] = await ctx.db
    .select({
      id: guides.id,
      number: guides.number,
      chapter: { letter: chapters.letter, name: chapters.name },
      title: titleOf(editions.content),
      publishedEdition: editions.number,
      editions: count(all.id),
    })
    .from(guides)
    .innerJoin(chapters, eq(chapters.letter, guides.chapter))
    .innerJoin(editions, eq(editions.id, guides.publishedEditionId))
    .innerJoin(all, eq(all.guideId, guides.id))
    .where(eq(guides.slug, slug))
    .groupBy(guides.id, chapters.letter, editions.id)
  return row ?? null
}

async function listEditions(ctx: Pick<ServiceContext, 'db'>, guideId: string, offset: number, limit: number) {
  const authors = alias(members, 'authors')
  const approvers = alias(members, 'approvers')
  return ctx.db
    .select({
      number: editions.number,
      summary: editions.summary,
      changes: editions.changes,
      publishedAt: editions.publishedAt,
      author: { id: authors.id, name: authors.name },
      approver: { id: approvers.id, name: approvers.name },
    })
    .from(editions)
    .innerJoin(authors, eq(authors.id, editions.authorId))
    .innerJoin(approvers, eq(approvers.id, editions.approverId))
    .where(eq(editions.guideId, guideId))
    .orderBy(desc(editions.number))
    .limit(limit)
    .offset(offset)
}

async function listDeclined(ctx: Pick<ServiceContext, 'db'>, guideId: string, after: Date, until: Date | null): Promise<HistoryLayer[]> {
  const rows = await ctx.db
    .select({
      summary: edits.summary,
      reason: reviews.reason,
      declinedBy: { id: members.id, name: members.name },
      at: reviews.decidedAt,
    })
    .from(reviews)
    .innerJoin(edits, eq(edits.id, reviews.editId))
    .innerJoin(members, eq(members.id, reviews.reviewerId))
    .where(
      and(
        eq(edits.guideId, guideId),
        eq(reviews.decision, 'decline'),
        gt(reviews.decidedAt, after),
        until === null ? undefined : lte(reviews.decidedAt, until),
      ),
    )
    .orderBy(desc(reviews.decidedAt))
    .limit(50)
  return rows.map(({ at, ...row }) => ({ kind: 'declined', ...row, at: at.toISOString() }))
}
