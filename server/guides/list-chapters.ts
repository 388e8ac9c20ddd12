export { listChapters }
export type { ChapterEntry }

import { asc, sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { chapters } from '../db/schema/index.ts'

interface ChapterEntry {
  letter: string
  name: string
  about: string
  /** How many guides are published in it, and how many are wanted. */
  guides: number
  wanted: number
}

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
