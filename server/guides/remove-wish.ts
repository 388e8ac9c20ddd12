export { removeWish }

import { eq, or, sql } from 'drizzle-orm'
import type { Transaction } from '../db/client.ts'
import { wantedGuides } from '../db/schema/index.ts'

/** A new guide is what somebody wanted: the wish it was begun from, or one with the same title, leaves the list. */
async function removeWish(tx: Transaction, { wantedId, title }: { wantedId: string | null; title: string }): Promise<void> {
  const sameTitle = sql`lower(${wantedGuides.title}) = lower(${title})`
  await tx.delete(wantedGuides).where(wantedId === null ? sameTitle : or(eq(wantedGuides.id, wantedId), sameTitle))
}
