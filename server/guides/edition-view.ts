export { editionView }

import { and, asc, count, desc, eq, lte } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { editions, members } from '../db/schema/index.ts'
import { effectRow, findAdjustables } from '../effects/index.ts'
import type { Effect } from '#shared/schemas/effect.ts'
import { markOf } from './edition-columns.ts'
import type { EditionRow } from './edition-query.ts'
import { headingsOf } from './headings.ts'
import type { GuideView } from './views.ts'

/** Puts an edition together for its page: two more statements. */
async function editionView(ctx: Pick<ServiceContext, 'db'>, row: EditionRow, effects: readonly Effect[]): Promise<GuideView> {
  const named = row.parts.flatMap((part) => (part.kind === 'effects' ? [part.adjustable] : []))
  const adjustables = await findAdjustables(ctx, [...effects.map((effect) => effect.adjustable), ...named])
  const byKey = new Map(adjustables.map((adjustable) => [adjustable.key, adjustable]))
  return {
    ...row.content,
    id: row.guideId,
    slug: row.slug,
    mark: markOf({ chapter: row.chapter.letter, number: row.number }),
    number: row.number,
    chapter: row.chapter,
    html: row.html,
    parts: row.parts,
    headings: headingsOf(row.html),
    effects: effects.map((effect) => effectRow(effect, byKey.get(effect.adjustable))),
    adjustables,
    edition: row.edition,
    editions: row.editions,
    summary: row.summary,
    author: row.author,
    approver: row.approver,
    contributors: await listContributors(ctx, row.guideId, row.edition),
    publishedAt: row.publishedAt.toISOString(),
    firstPublishedAt: row.firstPublishedAt.toISOString(),
  }
}

/** Who wrote the editions of a guide up to `upTo`, most editions first. */
async function listContributors(ctx: Pick<ServiceContext, 'db'>, guideId: string, upTo: number): Promise<GuideView['contributors']> {
  const written = count(editions.id)
  return ctx.db
    .select({ id: members.id, name: members.name, editions: written })
    .from(editions)
    .innerJoin(members, eq(members.id, editions.authorId))
    .where(and(eq(editions.guideId, guideId), lte(editions.number, upTo)))
    .groupBy(members.id, members.name)
    .orderBy(desc(written), asc(members.name))
}
