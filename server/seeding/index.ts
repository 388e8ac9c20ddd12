export { seedDatabase }

import { sql } from 'drizzle-orm'
import { loadCalculators } from '../calculators/index.ts'
import { connectDatabase, type Database } from '../db/client.ts'
import { adjustables, chapters, firstLooks, glossaryTerms, guides, members, wantedGuides } from '../db/schema/index.ts'
import { loadRenderVocabulary } from '../guides/render-vocabulary.ts'
import { seedGuide } from '../guides/index.ts'
import { createGuideRenderer } from '../rendering/index.ts'
import { complaintKey, complaints } from '#shared/vocabulary/complaints.ts'
import { readContent, type BookContent, type GuideFile } from './read-content.ts'
import { seedDemoCars } from './demo-cars.ts'
import { seedDeskEdit } from './desk-edit.ts'

/**
 * Fills the database with the book in `content/`. Idempotent: what is already there is left as it is, so that words
 * which members have improved since are never put back.
 * @param options.demo also puts one edit on the review desk, so that a demonstration has something to decide, and gives
 *   two members their cars
 * @returns how many guides were new
 */
async function seedDatabase(url: string, options: { demo: boolean }): Promise<{ guides: number }> {
  const content = await readContent()
  const connection = connectDatabase(url, { max: 2, statementTimeout: 60_000 })
  const calculators = await loadCalculators()
  const renderer = createGuideRenderer({
    vocabulary: () => loadRenderVocabulary(connection.db, calculators),
    // A slow machine that is still installing things must not fail its first start over a time-out.
    timeoutMs: 30_000,
  })
  try {
    await seedShelves(connection.db, content)
    const authors = await seedMembers(connection.db, content)
    let created = 0
    for (const guide of await newGuides(connection.db, content.guides)) {
      const { author, approver, ...rest } = guide
      const outcome = await seedGuide({ db: connection.db, renderer }, {
        ...rest,
        authorId: idOf(authors, author, guide.slug),
        approverId: idOf(authors, approver, guide.slug),
      })
      if (outcome.created) created += 1
    }
    if (options.demo && created > 0) {
      await seedDeskEdit(connection.db, authors)
      await seedDemoCars(connection.db, authors)
    }
    return { guides: created }
  } finally {
    await renderer.close()
    await connection.close()
  }
}

async function newGuides(db: Database, files: GuideFile[]): Promise<GuideFile[]> {
  const known = new Set((await db.select({ slug: guides.slug }).from(guides)).map(({ slug }) => slug))
  return files.filter(({ slug }) => !known.has(slug))
}

function idOf(ids: Map<string, string>, key: string, slug: string): string {
  const id = ids.get(key)
  if (id === undefined) throw new Error(`content/guides/${slug}.md: “${key}” is nobody in content/members.yaml`)
  return id
}

async function seedShelves(db: Database, content: BookContent): Promise<void> {
  await db.insert(chapters).values(content.chapters).onConflictDoNothing()
  await db
    .insert(adjustables)
    .values(
      content.adjustables.map(({ up, down, guide, ...rest }) => ({ ...rest, upName: up, downName: down, guideSlug: guide })),
    )
    .onConflictDoNothing()
  await db.insert(glossaryTerms).values(content.glossary).onConflictDoNothing()
  await seedFirstLooks(db, content.firstLooks)
  // Only into a new book: a wish that is missing later was granted, and must not come back at the next start.
  const [guide] = await db.select({ id: guides.id }).from(guides).limit(1)
  if (guide === undefined) await db.insert(wantedGuides).values(content.wanted).onConflictDoNothing()
}

/** Only for complaints that have none yet: what moderators changed stays as they left it. */
async function seedFirstLooks(db: Database, looks: BookContent['firstLooks']): Promise<void> {
  const known = await db.selectDistinct({ phase: firstLooks.phase, quality: firstLooks.quality, wants: firstLooks.wants }).from(firstLooks)
  const rows = complaints
    .filter((complaint) => !known.some((each) => complaintKey(each) === complaintKey(complaint)))
    .flatMap((complaint) => {
      const { phase, quality, wants } = complaint
      return (looks[complaintKey(complaint)] ?? []).map((says, position) => ({ phase, quality, wants, position, says }))
    })
  if (rows.length > 0) await db.insert(firstLooks).values(rows).onConflictDoNothing()
}

/** The writers of the book, named but without a way to sign in. */
async function seedMembers(db: Database, content: BookContent): Promise<Map<string, string>> {
  const rows = content.members.map(({ key, name, role, about }) => ({ key, name, role, about }))
  await db.insert(members).values(rows).onConflictDoNothing()
  const all = await db.select({ id: members.id, key: members.key }).from(members).where(sql`${members.key} is not null`)
  return new Map(all.map(({ id, key }) => [key!, id]))
}
