export { createSessionStore, insertSession, renameSession }

import connectPgSimple from 'connect-pg-simple'
import { sql } from 'drizzle-orm'
import type { Request } from 'express'
import session, { type SessionData, type Store } from 'express-session'
import type { App } from '../context.ts'
import type { Member } from './find-member.ts'

/**
 * Sessions in PostgreSQL. Rows are only ever begun by `insertSession`: what express-session writes at the end of a
 * request changes a row that is there and never brings back one that was deleted meanwhile.
 */
function createSessionStore(app: Pick<App, 'connection' | 'log'>): Store {
  const PgStore = connectPgSimple(session)
  const { pool } = app.connection
  class SessionStore extends PgStore {
    override set(sid: string, data: SessionData, done?: (error?: unknown) => void): void {
      pool.query('update sessions set sess = $2, expire = to_timestamp($3) where sid = $1', [sid, JSON.stringify(data), endOf(data)]).then(
        () => done?.(),
        (error: unknown) => done?.(error),
      )
    }
  }
  return new SessionStore({
    pool,
    tableName: 'sessions',
    createTableIfMissing: false,
    // Tidied up with everything else, see server/maintenance/.
    pruneSessionInterval: false,
  })
}

/**
 * Writes the row that makes a session usable, if the member is still as they were when the password was compared. The
 * lock makes a reset or suspension under way come either before (nothing is written) or after (it ends this session).
 */
async function insertSession(app: Pick<App, 'db'>, req: Request, member: Member): Promise<boolean> {
  const inserted = await app.db.execute(sql`
    insert into sessions (sid, sess, expire)
    select ${req.sessionID}, ${JSON.stringify(req.session)}::json, to_timestamp(${endOf(req.session)}::float8) from members
    where id = ${member.id} and status = 'active' and password_hash = ${member.passwordHash}
    for share`)
  return inserted.rowCount === 1
}

/** Gives a session another id, if it is still there. */
async function renameSession(app: Pick<App, 'db'>, before: string, after: string): Promise<boolean> {
  const renamed = await app.db.execute(sql`update sessions set sid = ${after} where sid = ${before}`)
  return renamed.rowCount === 1
}

/** In seconds since 1970, as the table's other times are made. */
function endOf({ cookie }: Pick<SessionData, 'cookie'>): number {
  return Math.ceil((cookie.expires ?? new Date()).valueOf() / 1000)
}
