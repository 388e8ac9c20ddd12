export { changeRole, changeStatus, endMemberSessions }

import { and, eq, isNotNull } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import type { Transaction } from '../db/client.ts'
import { members } from '../db/schema/index.ts'
import { ConflictError } from '../errors.ts'
import { recordAudit } from '../records/audit.ts'
import { endSessionsOf } from './end-sessions.ts'
import { memberById, type Member } from './find-member.ts'
import { ChangeRole, ChangeStatus, EndSessions } from './inputs.ts'
import { parseInput } from './parse-input.ts'
import { requirePermission } from './permissions.ts'

/**
 * Gives a member another role. Their sessions end, so that they go on with a new session id and the lifetime of the new
 * role.
 * @throws ForbiddenError (403), ValidationError (422), NotFoundError (404), ConflictError `last_admin` (409)
 */
async function changeRole(ctx: ServiceContext, input: unknown): Promise<Member> {
  requirePermission(ctx.actor, 'member.change_role')
  const { memberId, role } = parseInput(ChangeRole, input)
  return changeMember(ctx, memberId, 'member.change_role', { role })
}

/**
 * Suspends a member, who can then neither sign in nor go on, or lets them in again.
 * @throws as changeRole
 */
async function changeStatus(ctx: ServiceContext, input: unknown): Promise<Member> {
  requirePermission(ctx.actor, 'member.suspend')
  const { memberId, status } = parseInput(ChangeStatus, input)
  return changeMember(ctx, memberId, 'member.change_status', { status })
}

/** Signs a member out everywhere. @throws ForbiddenError (403), NotFoundError (404) */
async function endMemberSessions(ctx: ServiceContext, input: unknown): Promise<number> {
  requirePermission(ctx.actor, 'member.suspend')
  const { memberId } = parseInput(EndSessions, input)
  const member = await memberById(ctx.db, memberId)
  const count = await endSessionsOf(ctx.db, member.id)
  await recordAudit(ctx, { action: 'session.end_all', subjectKind: 'member', subjectId: member.id, details: { count } })
  return count
}

async function changeMember(
  ctx: ServiceContext,
  memberId: string,
  action: string,
  change: Partial<Pick<Member, 'role' | 'status'>>,
): Promise<Member> {
  return ctx.db.transaction(async (tx) => {
    const admins = await lockAdmins(tx)
    const before = await memberById(tx, memberId)
    const after = { ...before, ...change }
    if (after.role === before.role && after.status === before.status) return before
    const staysAdmin = after.role === 'admin' && after.status === 'active'
    if (!staysAdmin && admins.length === 1 && admins[0] === memberId) {
      throw new ConflictError('last_admin', 'Nobody else looks after the book. Make another member admin first.')
    }
    await tx.update(members).set(change).where(eq(members.id, memberId))
    await endSessionsOf(tx, memberId)
    await recordAudit(
      { ...ctx, db: tx },
      {
        action,
        subjectKind: 'member',
        subjectId: memberId,
        details: { before: { role: before.role, status: before.status }, after: { role: after.role, status: after.status } },
      },
    )
    return after
  })
}

// Those who can act: an admin who has not yet used the first link cannot. Two admins who step down at the same time would otherwise each see the other still there.
async function lockAdmins(tx: Transaction): Promise<string[]> {
  const rows = await tx
    .select({ id: members.id })
    .from(members)
    .where(and(eq(members.role, 'admin'), eq(members.status, 'active'), isNotNull(members.emailVerifiedAt)))
    .orderBy(members.id)
    .for('update')
  return rows.map((row) => row.id)
}
