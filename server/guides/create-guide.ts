export { createGuide }

import { eq, max, or, sql } from 'drizzle-orm'
import type { Transaction } from '../db/client.ts'
import { chapters, guides, slugRedirects } from '../db/schema/index.ts'
import { NotFoundError } from '../errors.ts'
import { markOf } from './edition-columns.ts'
import { nextFreeSlug, slugFromTitle } from './slug-from-title.ts'

// Any number of our own: held while an address is chosen, because two chapters could want the same one at once.
const SLUG_LOCK = 4_207_002

interface NewGuide {
  chapter: string
  title: string
  /** Fixed by the book a new installation starts with; otherwise the next in the chapter. */
  number?: number
  slug?: string
}

/**
 * Puts a guide on its shelf, still without an edition. Must run in a transaction: the chapter's row is locked until its
 * end, so that two new guides at once get two numbers.
 * @throws NotFoundError when there is no such chapter
 */
async function createGuide(tx: Transaction, guide: NewGuide): Promise<{ guideId: string; slug: string; mark: string }> {
  const [chapter] = await tx.select({ letter: chapters.letter }).from(chapters).where(eq(chapters.letter, guide.chapter)).for('update')
  if (chapter === undefined) throw new NotFoundError('chapter', guide.chapter)
  const number = guide.number ?? (await nextNumber(tx, guide.chapter))
  const slug = guide.slug ?? (await freeSlug(tx, slugFromTitle(guide.title)))
  const [row] = await tx.insert(guides).values({ chapter: guide.chapter, number, slug }).returning({ id: guides.id })
  return { guideId: row!.id, slug, mark: markOf({ chapter: guide.chapter, number }) }
}

async function nextNumber(tx: Transaction, chapter: string): Promise<number> {
  const [row] = await tx.select({ last: max(guides.number) }).from(guides).where(eq(guides.chapter, chapter))
  return (row?.last ?? 0) + 1
}

/** An address that no guide has or had. */
async function freeSlug(tx: Transaction, slug: string): Promise<string> {
  await tx.execute(sql`select pg_advisory_xact_lock(${SLUG_LOCK})`)
  const alike = (column: typeof guides.slug | typeof slugRedirects.slug) => or(eq(column, slug), sql`${column} ~ ${`^${slug}-[0-9]+$`}`)
  const used = await tx.select({ slug: guides.slug }).from(guides).where(alike(guides.slug))
  const old = await tx.select({ slug: slugRedirects.slug }).from(slugRedirects).where(alike(slugRedirects.slug))
  return nextFreeSlug(slug, new Set([...used, ...old].map((row) => row.slug)))
}
