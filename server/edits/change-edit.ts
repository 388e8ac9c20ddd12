export { changeEdit, requireState, requireVersion, wrongState }

import { and, eq, inArray, sql } from 'drizzle-orm'
import type { Database, Transaction } from '../db/client.ts'
import { edits } from '../db/schema/index.ts'
import { ConflictError, NotFoundError, PreconditionFailedError, type AppError } from '../errors.ts'
import { EDIT_STATES, canChangeState, type EditAction, type EditState } from '#shared/vocabulary/edit-states.ts'

type Change = Partial<Pick<typeof edits.$inferInsert, 'content' | 'summary' | 'state' | 'baseEditionId' | 'sentAt' | 'changes'>>

/**
 * The one statement by which an edit changes: only if it still is the version that was seen, in a state that allows the
 * action. Whoever comes second changes nothing and is told why.
 * @returns the new version
 * @throws ConflictError `wrong_state` (409) or PreconditionFailedError (412)
 */
async function changeEdit(
  db: Database | Transaction,
  edit: { id: string; version: number },
  action: EditAction | readonly EditState[],
  change: Change,
): Promise<number> {
  const states = typeof action === 'string' ? EDIT_STATES.filter((state) => canChangeState(state, action)) : [...action]
  const [changed] = await db
    .update(edits)
    .set({ ...change, version: sql`${edits.version} + 1`, updatedAt: sql`now()` })
    .where(and(eq(edits.id, edit.id), eq(edits.version, edit.version), inArray(edits.state, states)))
    .returning({ version: edits.version })
  if (changed !== undefined) return changed.version
  const [now] = await db.select({ state: edits.state, version: edits.version }).from(edits).where(eq(edits.id, edit.id))
  if (now === undefined) throw new NotFoundError('edit', edit.id)
  throw states.includes(now.state) ? staleEdit(now.version) : wrongState(now.state)
}

function requireState(edit: { state: EditState }, action: EditAction): void {
  if (!canChangeState(edit.state, action)) throw wrongState(edit.state)
}

/** @throws PreconditionFailedError with the version it has now */
function requireVersion(edit: { version: number }, seen: number): void {
  if (edit.version !== seen) throw staleEdit(edit.version)
}

function staleEdit(version: number): AppError {
  return new PreconditionFailedError(
    'This edit was changed since you opened it. Look at it again before you go on; what you typed here is not lost.',
    { version },
  )
}

const because: Record<EditState, string> = {
  draft: 'This edit is still a draft, so there is nothing to decide yet.',
  in_review: 'This edit is waiting for review. It can be changed once a moderator has asked for changes.',
  changes_asked: 'This edit is back with its writer, who was asked for changes.',
  approved: 'This edit was approved and stands in the book. Begin a new one to change it further.',
  declined: 'This edit was declined. Begin a new one.',
  withdrawn: 'This edit was withdrawn. Begin a new one.',
}

function wrongState(state: EditState): AppError {
  return new ConflictError('wrong_state', because[state], { state })
}
