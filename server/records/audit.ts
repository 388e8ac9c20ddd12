export { byThemself, recordAudit }
export type { AuditEntry }

import type { ServiceContext } from '../context.ts'
import { auditEntries } from '../db/schema/index.ts'

interface AuditEntry {
  /** What was done, `thing.deed`, such as `edit.approve`. */
  action: string
  subjectKind: string
  subjectId: string
  /** Further facts. Never a password, a token, an e-mail address or a session id: the record is read by others. */
  details?: Record<string, unknown>
  /** Who did it, where that is not the signed-in person: someone who has just proved who they are by a link or a password. */
  actorId?: string
}

/** Writes down who did what, in the caller's transaction: pass the context whose `db` is that transaction. */
async function recordAudit(ctx: Pick<ServiceContext, 'db' | 'actor'>, entry: AuditEntry): Promise<void> {
  await ctx.db.insert(auditEntries).values({
    actorId: entry.actorId ?? (ctx.actor.kind === 'member' ? ctx.actor.id : null),
    action: entry.action,
    subjectKind: entry.subjectKind,
    subjectId: entry.subjectId,
    details: entry.details ?? {},
  })
}

/** An entry about a member, made by that member: signing in, joining, setting a password. */
function byThemself(memberId: string): Pick<AuditEntry, 'actorId' | 'subjectId' | 'subjectKind'> {
  return { actorId: memberId, subjectKind: 'member', subjectId: memberId }
}
