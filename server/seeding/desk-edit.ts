export { seedDeskEdit }

import { eq } from 'drizzle-orm'
import type { Database } from '../db/client.ts'
import { editions, edits, guides } from '../db/schema/index.ts'
import { compareGuides } from '#shared/editing/compare-guides.ts'

/** The guide whose demonstration edit waits at the review desk. */
const SLUG = 'droop'

/** Puts one small, real edit on the review desk of a demonstration, written by a member of the invented club. */
async function seedDeskEdit(db: Database, authors: Map<string, string>): Promise<void> {
  const [published] = await db
    .select({ guideId: guides.id, editionId: editions.id, content: editions.content, authorId: editions.authorId })
    .from(guides)
    .innerJoin(editions, eq(editions.id, guides.publishedEditionId))
    .where(eq(guides.slug, SLUG))
  const writers = ['tomasz', 'priya'].map((key) => authors.get(key)).filter((id) => id !== undefined)
  const authorId = writers.find((id) => id !== published?.authorId)
  if (published === undefined || authorId === undefined) return
  const content = {
    ...published.content,
    bench: { ...published.content.bench, takes: 'About 5 minutes an axle with a hex driver and a ruler, 10 the first time. Ride height comes first.' },
    body: `${published.content.body.trimEnd()}\n\nMeasure with the body off and the battery in: the car sags by the weight it races with, and droop is counted from there. :basis[Two of us measured a millimetre of difference between an empty car and one ready to race.]{kind=reported}\n`,
  }
  await db.insert(edits).values({
    guideId: published.guideId,
    baseEditionId: published.editionId,
    authorId,
    content,
    summary: 'Says to measure droop with the battery in, and how long it takes',
    changes: compareGuides(published.content, content).counts,
    state: 'in_review',
    sentAt: new Date(),
  })
}
