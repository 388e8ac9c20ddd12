export { listEdits }
export type { EditList, EditListQuery }

import { and, asc, count, desc, eq, isNotNull, type SQL } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { edits } from '../db/schema/index.ts'
import { requirePermission, requireSignedIn } from '../people/permissions.ts'
import type { EditState } from '#shared/vocabulary/edit-states.ts'
import { entryOf, listEditRows } from './edit-row.ts'
import type { EditEntry } from './views.ts'
import { entriesAsHandedIn } from './words-handed-in.ts'

const EDITS_PER_PAGE = 50

interface EditListQuery {
  state?: EditState | undefined
  /** `everyone` is for moderators, and never shows what was not handed in: no drafts, and no rewriting that was not sent. @default 'mine' */
  whose?: 'mine' | 'everyone' | undefined
  page?: number | undefined
}

interface EditList {
  edits: EditEntry[]
  page: number
  pages: number
  total: number
}

/** One's own edits, newest first; or everyone's for a moderator, those that wait longest first. */
async function listEdits(ctx: ServiceContext, { state, whose = 'mine', page = 1 }: EditListQuery = {}): Promise<EditList> {
  requireSignedIn(ctx.actor, 'see your edits')
  if (whose === 'everyone') requirePermission(ctx.actor, 'queue.read')
  const scope: SQL | undefined = whose === 'everyone' ? isNotNull(edits.sentAt) : eq(edits.authorId, ctx.actor.id)
  const where = and(scope, state === undefined ? undefined : eq(edits.state, state))
  const order = whose === 'everyone' && state === 'in_review' ? [asc(edits.sentAt)] : [desc(edits.updatedAt)]
  const [rows, [totals]] = await Promise.all([
    listEditRows(ctx, { where, order: [...order, asc(edits.id)], limit: EDITS_PER_PAGE, offset: (page - 1) * EDITS_PER_PAGE }),
    ctx.db.select({ total: count() }).from(edits).where(where),
  ])
  const total = totals?.total ?? 0
  const shown = whose === 'mine' ? rows : await entriesAsHandedIn(ctx, rows)
  return { edits: shown.map(entryOf), page, pages: Math.max(1, Math.ceil(total / EDITS_PER_PAGE)), total }
}
