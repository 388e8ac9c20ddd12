export { listSitemapEntries }

import { asc, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { chapters, editions, guides } from '../db/schema/index.ts'
import { PHASES } from '#shared/vocabulary/phases.ts'

interface SitemapEntry {
  path: string
  /** Null where nothing says when the page last changed. */
  changedAt: Date | null
}

/** Every page that search engines may know of. */
async function listSitemapEntries(ctx: Pick<ServiceContext, 'db' | 'calculators'>): Promise<SitemapEntry[]> {
  const shelves = await ctx.db.select({ letter: chapters.letter }).from(chapters).orderBy(asc(chapters.letter))
  const published = await ctx.db
    .select({ slug: guides.slug, changedAt: editions.publishedAt })
    .from(guides)
    .innerJoin(editions, eq(editions.id, guides.publishedEditionId))
    .orderBy(asc(guides.chapter), asc(guides.number))
  const standing = [
    '/', '/chapters', ...shelves.map(({ letter }) => `/chapters/${letter}`), '/glossary',
    ...PHASES.map((phase) => `/lap/${phase}`),
    '/about/approval', '/about/sure', '/calculators', ...[...ctx.calculators.keys()].map((slug) => `/calculators/${slug}`),
  ]
  return [
    ...standing.map((path) => ({ path, changedAt: null })),
    ...published.map(({ slug, changedAt }) => ({ path: `/guides/${slug}`, changedAt })),
  ]
}
