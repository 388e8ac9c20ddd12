export { inShortOf, markOf, titleOf }

import { sql, type SQL } from 'drizzle-orm'
import type { PgColumn } from 'drizzle-orm/pg-core'

/** The title alone, so that a list does not carry every guide's whole text. */
function titleOf(content: PgColumn): SQL<string> {
  return sql<string>`${content} ->> 'title'`
}

function inShortOf(content: PgColumn): SQL<string> {
  return sql<string>`${content} ->> 'inShort'`
}

/** A guide's mark such as B2: chapter letter and a number that never changes. */
function markOf(guide: { chapter: string; number: number }): string {
  return `${guide.chapter}${guide.number}`
}
