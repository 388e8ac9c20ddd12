export { endOtherSessions, endOwnSession, listOwnSessions }
export type { OwnSession }

import { and, eq, sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { sessions } from '../db/schema/index.ts'
import { NotFoundError } from '../errors.ts'
import { byThemself, recordAudit } from '../records/audit.ts'
import { endSessionsOf } from './end-sessions.ts'
import { requireSignedIn } from './permissions.ts'

interface OwnSession {
  /** SHA-256 of the session id: enough to name a session, useless as a cookie. */
  handle: string
  device: string
  startedAt: string
  lastSeenAt: string
  isThisOne: boolean
}

const handleOf = sql<string>`encode(sha256(convert_to(${sessions.sid}, 'UTF8')), 'hex')`

/** Where the person is signed in, the one they are looking at first. */
async function listOwnSessions(ctx: ServiceContext): Promise<OwnSession[]> {
  const { actor } = ctx
  requireSignedIn(actor, 'see where you are signed in')
  const rows = await ctx.db
    .select({
      handle: handleOf,
      device: sql<string>`coalesce(${sessions.sess} ->> 'device', '')`,
      startedAt: sql<number>`(${sessions.sess} ->> 'startedAt')::float8`,
      // `expire` is moved on with each request, by the idle time that the cookie carries.
      lastSeenAt: sql<number>`extract(epoch from ${sessions.expire}::timestamptz)::float8 * 1000
        - (${sessions.sess} -> 'cookie' ->> 'originalMaxAge')::float8`,
      isThisOne: sql<boolean>`${sessions.sid} = ${actor.sessionId}`,
    })
    .from(sessions)
    .where(and(eq(sessions.memberId, actor.id), sql`${sessions.expire} > now()`))
    .orderBy(sql`${sessions.sid} = ${actor.sessionId} desc, ${sessions.expire} desc`)
  return rows.map((row) => ({
    ...row,
    startedAt: new Date(row.startedAt).toISOString(),
    lastSeenAt: new Date(row.lastSeenAt).toISOString(),
  }))
}

/** @throws NotFoundError (404) for a session that is not the person's own */
async function endOwnSession(ctx: ServiceContext, handle: string): Promise<void> {
  const { actor } = ctx
  requireSignedIn(actor, 'end a session')
  const ended = await ctx.db.delete(sessions).where(and(eq(sessions.memberId, actor.id), eq(handleOf, handle)))
  if (ended.rowCount === 0) throw new NotFoundError('session', handle.slice(0, 8))
  await recordAudit(ctx, { action: 'session.end', ...byThemself(actor.id) })
}

/** Signs the person out everywhere else; the caller renews the session of this browser. */
async function endOtherSessions(ctx: ServiceContext): Promise<number> {
  const { actor } = ctx
  requireSignedIn(actor, 'sign out everywhere')
  const count = await endSessionsOf(ctx.db, actor.id, { except: actor.sessionId })
  await recordAudit(ctx, { action: 'session.end_others', ...byThemself(actor.id), details: { count } })
  return count
}
