export { endSessionsOf }

import { and, eq, ne } from 'drizzle-orm'
import type { Database, Transaction } from '../db/client.ts'
import { sessions } from '../db/schema/index.ts'

/**
 * Ends a member's sessions by deleting their rows: the next request with one of those cookies is a visitor's.
 * @param options.except session id to keep
 * @returns how many ended
 */
async function endSessionsOf(
  db: Database | Transaction,
  memberId: string,
  options: { except?: string } = {},
): Promise<number> {
  const ended = await db
    .delete(sessions)
    .where(and(eq(sessions.memberId, memberId), options.except === undefined ? undefined : ne(sessions.sid, options.except)))
  return ended.rowCount ?? 0
}
