export { listWantedGuides }

import { asc, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { wantedGuides } from '../db/schema/index.ts'
import type { WantedGuide } from './views.ts'

/** Guides that the book still lacks, of all chapters or of one. */
async function listWantedGuides(ctx: Pick<ServiceContext, 'db'>, chapter?: string): Promise<WantedGuide[]> {
  return ctx.db
    .select({ id: wantedGuides.id, chapter: wantedGuides.chapter, title: wantedGuides.title, why: wantedGuides.why })
    .from(wantedGuides)
    .where(chapter === undefined ? undefined : eq(wantedGuides.chapter, chapter))
    .orderBy(asc(wantedGuides.chapter), asc(wantedGuides.title))
}
