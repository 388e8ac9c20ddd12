export { compareEditions }
export type { EditionComparison }

import { eq, inArray, and } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { chapters, editions, guides, members } from '../db/schema/index.ts'
import { findAdjustables, type AdjustableView } from '../effects/index.ts'
import { NotFoundError } from '../errors.ts'
import { compareGuides, type GuideComparison } from '#shared/editing/compare-guides.ts'
import { markOf } from './edition-columns.ts'
import { findMoved } from './edition-query.ts'
import { SLUG } from './slug.ts'
import type { ChapterName, EditionName, Moved } from './views.ts'

interface EditionComparison {
  slug: string
  mark: string
  title: string
  chapter: ChapterName
  from: EditionName
  to: EditionName
  changes: GuideComparison
  /** Everything that the effects of either edition speak of. */
  adjustables: AdjustableView[]
}

/** Two editions of a guide side by side, in the order in which they are asked for. @throws NotFoundError */
async function compareEditions(
  ctx: Pick<ServiceContext, 'db'>,
  { slug, from, to }: { slug: string; from: number; to: number },
): Promise<EditionComparison | Moved> {
  const numbers = [from, to].filter((number) => Number.isInteger(number) && number >= 1 && number <= 2_147_483_647)
  const rows = SLUG.test(slug) && numbers.length === 2
    ? await ctx.db
        .select({
          chapter: { letter: chapters.letter, name: chapters.name },
          mark: guides.number,
          number: editions.number,
          summary: editions.summary,
          content: editions.content,
          author: { id: members.id, name: members.name },
          publishedAt: editions.publishedAt,
        })
        .from(editions)
        .innerJoin(guides, eq(guides.id, editions.guideId))
        .innerJoin(chapters, eq(chapters.letter, guides.chapter))
        .innerJoin(members, eq(members.id, editions.authorId))
        .where(and(eq(guides.slug, slug), inArray(editions.number, numbers)))
    : []
  const [before, after] = [from, to].map((number) => rows.find((row) => row.number === number))
  if (before === undefined || after === undefined) {
    const moved = await findMoved(ctx, slug)
    if (moved !== null) return moved
    throw new NotFoundError('pair of editions', `${slug} ${from} and ${to}`)
  }
  const nameOf = ({ number, summary, author, publishedAt }: typeof before): EditionName => ({
    number, summary, author, publishedAt: publishedAt.toISOString(),
  })
  return {
    slug,
    mark: markOf({ chapter: after.chapter.letter, number: after.mark }),
    title: after.content.title,
    chapter: after.chapter,
    from: nameOf(before),
    to: nameOf(after),
    changes: compareGuides(before.content, after.content),
    adjustables: await findAdjustables(ctx, [...before.content.effects, ...after.content.effects].map((effect) => effect.adjustable)),
  }
}
