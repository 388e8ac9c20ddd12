export { actorFromSession, endSession, renewSession, sessionMiddleware, startSession }

import { eq } from 'drizzle-orm'
import type { Request, RequestHandler, Response } from 'express'
import session from 'express-session'
import { visitor, type Actor, type App } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { AppError, SignInRequiredError } from '../errors.ts'
import { describeDevice } from './device.ts'
import type { Member } from './find-member.ts'
import { SESSION_COOKIES, sessionCookieName } from './session-cookie.ts'
import { createSessionStore, insertSession, renameSession } from './session-store.ts'
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

/**
 * Sessions in PostgreSQL, by a cookie that only who has signed in ever gets. A session is written once, when it starts;
 * later requests only move its end on, so that a request under way cannot bring back a session that was ended meanwhile.
 * Reading without the cookie needs no session: none is looked for and none begins.
 */
function sessionMiddleware(app: App): RequestHandler {
  const withSession = session({
    name: sessionCookieName(app.config.secureCookies),
    secret: app.config.sessionSecret,
    store: createSessionStore(app),
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: { path: '/', httpOnly: true, sameSite: 'lax', secure: app.config.secureCookies, maxAge: LIFETIMES.member.idle },
  })
  return (req, res, next) => {
    const reads = req.method === 'GET' || req.method === 'HEAD'
    const cookies = req.headers.cookie ?? ''
    if (reads && !SESSION_COOKIES.some((name) => cookies.includes(`${name}=`))) next()
    else withSession(req, res, next)
  }
}

/**
 * Who is asking. Role and status are read anew for each request, so that whoever is suspended or gets another role is
 * met as such at once, whatever their session says.
 */
async function actorFromSession(app: App, req: Request): Promise<Actor> {
  // Requests without a cookie that only read have none, nor has `OPTIONS *`, which is for no path.
  const session = req.session as Request['session'] | undefined
  if (session?.memberId === undefined) return visitor
  const { memberId, startedAt } = session
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

/**
 * Begins a session under a new id, so that an id planted before signing in is worth nothing afterwards.
 * @param member as they were when the password was compared
 * @throws AppError `sign_in_failed` (401) when the password was changed or the member suspended since then
 */
async function startSession(app: App, req: Request, member: Member): Promise<void> {
  await regenerate(req)
  req.session.memberId = member.id
  req.session.startedAt = app.clock().getTime()
  req.session.device = describeDevice(req.get('user-agent'))
  req.session.cookie.maxAge = LIFETIMES[member.role].idle
  // Before the answer: a browser that follows a redirect is often faster than the end of this request.
  if (await insertSession(app, req, member)) return
  await destroy(req)
  throw new AppError('sign_in_failed', 401, 'Your password or your membership changed at this very moment. Sign in again.')
}

/**
 * Goes on with this session under a new id.
 * @throws SignInRequiredError (401) when it was ended meanwhile
 */
async function renewSession(app: App, req: Request): Promise<void> {
  const { memberId, startedAt, device, cookie } = req.session
  const idle = cookie.originalMaxAge
  const before = req.sessionID
  req.sessionStore.generate(req)
  Object.assign(req.session, { memberId, startedAt, device })
  req.session.cookie.maxAge = idle ?? LIFETIMES.member.idle
  if (await renameSession(app, before, req.sessionID)) return
  await destroy(req)
  throw new SignInRequiredError('go on')
}

/** Deletes the session and its cookie, and has the browser forget pages it kept for this person. */
async function endSession(app: App, req: Request, res: Response): Promise<void> {
  await destroy(req)
  res.clearCookie(sessionCookieName(app.config.secureCookies), { path: '/', httpOnly: true, sameSite: 'lax', secure: app.config.secureCookies })
  // Not "storage": what the reader keeps on this device without signing in (the sheet, their car) stays theirs.
  res.setHeader('Clear-Site-Data', '"cache"')
}

function regenerate(req: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    req.sessionStore.regenerate(req, (error: unknown) => (error ? reject(error as Error) : resolve()))
  })
}

function destroy(req: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    req.session.destroy((error: unknown) => (error ? reject(error as Error) : resolve()))
  })
}
