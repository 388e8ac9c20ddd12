export { getChapter }
export type { ChapterView }

import { asc, eq, sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { adjustables, chapters, editions, effects, guides } from '../db/schema/index.ts'
import { NotFoundError } from '../errors.ts'
import { PHASES } from '#shared/vocabulary/phases.ts'
import { inShortOf, markOf, titleOf } from './edition-columns.ts'
import { listWantedGuides } from './list-wanted-guides.ts'
import type { GuideCard, Reach, WantedGuide } from './views.ts'

interface ChapterView {
  letter: string
  name: string
  about: string
  guides: GuideCard[]
  wanted: WantedGuide[]
}

/** A chapter with its guides, where on the lap each one acts, and what it still lacks. @throws NotFoundError */
async function getChapter(ctx: Pick<ServiceContext, 'db'>, letter: string): Promise<ChapterView> {
  const [chapter] = /^[A-Z]$/.test(letter) ? await ctx.db.select().from(chapters).where(eq(chapters.letter, letter)) : []
  if (chapter === undefined) throw new NotFoundError('chapter', letter)
  const [cards, wanted] = await Promise.all([listCards(ctx, letter), listWantedGuides(ctx, letter)])
  return { ...chapter, guides: cards, wanted }
}

async function listCards(ctx: Pick<ServiceContext, 'db'>, letter: string): Promise<GuideCard[]> {
  const rows = await ctx.db
    .select({
      id: guides.id,
      slug: guides.slug,
      chapter: guides.chapter,
      number: guides.number,
      title: titleOf(editions.content),
      inShort: inShortOf(editions.content),
      edition: editions.number,
    })
    .from(guides)
    .innerJoin(editions, eq(editions.id, guides.publishedEditionId))
    .where(eq(guides.chapter, letter))
    .orderBy(asc(guides.number))
  const acting = await ctx.db
    .select({
      guideId: effects.guideId,
      phase: effects.phase,
      strength: sql<1 | 2 | 3>`max(${effects.strength})`,
      minutes: sql<number>`min(${adjustables.minutes})`,
    })
    .from(effects)
    .innerJoin(guides, eq(guides.id, effects.guideId))
    .innerJoin(adjustables, eq(adjustables.key, effects.adjustable))
    .where(eq(guides.chapter, letter))
    .groupBy(effects.guideId, effects.phase)
  return rows.map(({ id, number, ...row }) => {
    const own = acting.filter((effect) => effect.guideId === id)
    const reach = Object.fromEntries(PHASES.map((phase) => [phase, own.find((effect) => effect.phase === phase)?.strength ?? 0]))
    return {
      ...row,
      mark: markOf({ chapter: row.chapter, number }),
      reach: reach as Reach,
      minutes: own.length === 0 ? null : Math.min(...own.map((effect) => effect.minutes)),
    }
  })
}
