export { entryOf, findEdit, listEditRows }
export type { EditRow }

import { eq, sql, type SQL } from 'drizzle-orm'
import { alias } from 'drizzle-orm/pg-core'
import type { ServiceContext } from '../context.ts'
import { chapters, editions, edits, guides, members, reviews } from '../db/schema/index.ts'
import { markOf, titleOf } from '../guides/edition-columns.ts'
import { isUuid } from '../http/uuid.ts'
import type { EditEntry } from './views.ts'

const authors = alias(members, 'authors')
const published = alias(editions, 'published')
const bases = alias(editions, 'bases')

type EditRow = Awaited<ReturnType<typeof selectEdits>>[number]
type ListedRow = Omit<EditRow, 'content'>

/** An edit with its text and the guide, editions and people it belongs to; null when there is none with this id. */
async function findEdit(ctx: Pick<ServiceContext, 'db'>, id: string): Promise<EditRow | null> {
  if (!isUuid(id)) return null
  const [row] = await selectEdits(ctx, { text: true }).where(eq(edits.id, id))
  return row ?? null
}

/** Edits without their text, so that a list stays light. */
async function listEditRows(
  ctx: Pick<ServiceContext, 'db'>,
  { where, order, limit, offset }: { where: SQL | undefined; order: SQL[]; limit: number; offset: number },
): Promise<ListedRow[]> {
  return selectEdits(ctx, { text: false }).where(where).orderBy(...order).limit(limit).offset(offset)
}

/** Of an edit that is back with its writer: what it was given back with. */
const lastAsked = sql<EditEntry['asked']>`(
  select json_build_object('reason', ${reviews.reason}, 'reviewer', json_build_object('id', ${members.id}, 'name', ${members.name}))
  from ${reviews} join ${members} on ${members.id} = ${reviews.reviewerId}
  where ${reviews.editId} = ${edits.id} and ${reviews.decision} = 'ask' and ${edits.state} = 'changes_asked'
  order by ${reviews.decidedAt} desc limit 1)`

function selectEdits(ctx: Pick<ServiceContext, 'db'>, { text }: { text: boolean }) {
  return ctx.db
    .select({
      id: edits.id,
      version: edits.version,
      state: edits.state,
      content: (text ? edits.content : sql`null`) as typeof edits.content,
      title: titleOf(edits.content),
      summary: edits.summary,
      createdAt: edits.createdAt,
      updatedAt: edits.updatedAt,
      sentAt: edits.sentAt,
      changes: edits.changes,
      wantedId: edits.wantedId,
      asked: lastAsked,
      authorId: edits.authorId,
      author: { id: authors.id, name: authors.name, email: authors.email },
      guideId: edits.guideId,
      guideSlug: guides.slug,
      guideNumber: guides.number,
      guideTitle: sql<string | null>`${published.content} ->> 'title'`,
      baseEditionId: edits.baseEditionId,
      baseEdition: bases.number,
      publishedEditionId: guides.publishedEditionId,
      publishedEdition: published.number,
      chapter: { letter: chapters.letter, name: chapters.name },
    })
    .from(edits)
    .innerJoin(authors, eq(authors.id, edits.authorId))
    .leftJoin(guides, eq(guides.id, edits.guideId))
    .leftJoin(published, eq(published.id, guides.publishedEditionId))
    .leftJoin(bases, eq(bases.id, edits.baseEditionId))
    .innerJoin(chapters, eq(chapters.letter, sql`coalesce(${guides.chapter}, ${edits.chapter})`))
    .$dynamic()
}

function entryOf(row: ListedRow): EditEntry {
  return {
    id: row.id,
    version: row.version,
    state: row.state,
    title: row.title,
    guide: row.guideSlug === null
      ? null
      : { slug: row.guideSlug, mark: markOf({ chapter: row.chapter.letter, number: row.guideNumber! }), title: row.guideTitle ?? '' },
    chapter: row.chapter,
    author: { id: row.author.id, name: row.author.name },
    summary: row.summary,
    baseEdition: row.baseEdition,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
    sentAt: row.sentAt?.toISOString() ?? null,
    changes: row.changes,
    asked: row.asked,
  }
}
