export { listChapters }
export type { ChapterEntry }

import { asc, sql } from 'drizzle-orm'
import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { chapters } from '../db/schema/index.ts'
import type { ChapterAnswer } from './answers.ts'

type ChapterEntry = z.infer<typeof ChapterAnswer>

async function listChapters(ctx: Pick<ServiceContext, 'db'>): Promise<ChapterEntry[]> {
  return ctx.db
    .select({
      letter: chapters.letter,
      name: chapters.name,
      about: chapters.about,
      guides: sql<number>`(select count(*)::int from guides g where g.chapter = ${chapters.letter} and g.published_edition_id is not null)`,
      wanted: sql<number>`(select count(*)::int from wanted_guides w where w.chapter = ${chapters.letter})`,
    })
    .from(chapters)
    .orderBy(asc(chapters.letter))
}
