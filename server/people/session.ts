export { actorFromSession, endSession, renewSession, sessionMiddleware, startSession }

import connectPgSimple from 'connect-pg-simple'
import { eq } from 'drizzle-orm'
import type { Request, RequestHandler, Response } from 'express'
import session from 'express-session'
import { visitor, type Actor, type App } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { describeDevice } from './device.ts'
import type { MemberRole } from '#shared/vocabulary/roles.ts'

declare module 'express-session' {
  interface SessionData {
    memberId: string
    /** When the password was given, in milliseconds. */
    startedAt: number
    /** What the person is shown in the list of their sessions. */
    device: string
  }
}

const MINUTE = 60_000
const HOUR = 60 * MINUTE
const DAY = 24 * HOUR

/**
 * How long a session lasts without a request, and in all. 30 days in all are NIST's for members. Moderators and admins
 * can do more harm, so theirs is a race day; two hours idle and not less, since whoever reviews at the track puts the
 * phone away to race in between and must not lose a half-written reason by it.
 */
const LIFETIMES: Record<MemberRole, { idle: number; absolute: number }> = {
  member: { idle: 7 * DAY, absolute: 30 * DAY },
  moderator: { idle: 2 * HOUR, absolute: 12 * HOUR },
  admin: { idle: 2 * HOUR, absolute: 12 * HOUR },
}

/** Browsers refuse a `__Host-` cookie that is not Secure, or is meant for another path or domain. */
function cookieName(app: Pick<App, 'config'>): string {
  return app.config.secureCookies ? '__Host-cc' : 'cc'
}

/**
 * Sessions in PostgreSQL, by a cookie that only who has signed in ever gets. A session is written once, when it starts;
 * later requests only move its end on, so that a request under way cannot bring back a session that was ended meanwhile.
 */
function sessionMiddleware(app: App): RequestHandler {
  const Store = connectPgSimple(session)
  return session({
    name: cookieName(app),
    secret: app.config.sessionSecret,
    store: new Store({
      pool: app.connection.pool,
      tableName: 'sessions',
      createTableIfMissing: false,
      errorLog: (...what: unknown[]) => app.log.error({ what }, 'sessions could not be tidied up'),
    }),
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: { path: '/', httpOnly: true, sameSite: 'lax', secure: app.config.secureCookies, maxAge: LIFETIMES.member.idle },
  })
}

/**
 * Who is asking. Role and status are read anew for each request, so that whoever is suspended or gets another role is
 * met as such at once, whatever their session says.
 */
async function actorFromSession(app: App, req: Request): Promise<Actor> {
  const { memberId, startedAt } = req.session
  if (memberId === undefined) return visitor
  const [member] = await app.db
    .select({
      id: members.id,
      name: members.name,
      role: members.role,
      status: members.status,
      emailVerifiedAt: members.emailVerifiedAt,
    })
    .from(members)
    .where(eq(members.id, memberId))
  const age = app.clock().getTime() - (startedAt ?? 0)
  if (member === undefined || member.status !== 'active' || age > LIFETIMES[member.role].absolute) {
    await destroy(req)
    return visitor
  }
  return {
    kind: 'member',
    id: member.id,
    name: member.name,
    role: member.role,
    verified: member.emailVerifiedAt !== null,
    sessionId: req.sessionID,
  }
}

/** Begins a session under a new id, so that an id planted before signing in is worth nothing afterwards. */
async function startSession(app: App, req: Request, member: { id: string; role: MemberRole }): Promise<void> {
  await regenerate(req)
  req.session.memberId = member.id
  req.session.startedAt = app.clock().getTime()
  req.session.device = describeDevice(req.get('user-agent'))
  req.session.cookie.maxAge = LIFETIMES[member.role].idle
  // Before the answer: a browser that follows a redirect is often faster than the end of this request.
  await save(req)
}

/** Goes on with this session under a new id. */
async function renewSession(req: Request): Promise<void> {
  const { memberId, startedAt, device, cookie } = req.session
  const idle = cookie.originalMaxAge
  await regenerate(req)
  Object.assign(req.session, { memberId, startedAt, device })
  req.session.cookie.maxAge = idle ?? LIFETIMES.member.idle
  await save(req)
}

/** Deletes the session and its cookie, and has the browser forget pages it kept for this person. */
async function endSession(app: App, req: Request, res: Response): Promise<void> {
  await destroy(req)
  res.clearCookie(cookieName(app), { path: '/', httpOnly: true, sameSite: 'lax', secure: app.config.secureCookies })
  // Not "storage": what the reader keeps on this device without signing in (the sheet, their car) stays theirs.
  res.setHeader('Clear-Site-Data', '"cache"')
}

function regenerate(req: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    req.sessionStore.regenerate(req, (error: unknown) => (error ? reject(error as Error) : resolve()))
  })
}

function save(req: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    req.session.save((error: unknown) => (error ? reject(error as Error) : resolve()))
  })
}

function destroy(req: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    req.session.destroy((error: unknown) => (error ? reject(error as Error) : resolve()))
  })
}
