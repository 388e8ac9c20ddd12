export { idempotent }

import { createHash } from 'node:crypto'
import { and, eq, isNull, sql } from 'drizzle-orm'
import type { Request, RequestHandler, Response } from 'express'
import type { App } from '../context.ts'
import { idempotencyKeys } from '../db/schema/index.ts'
import { AppError, ConflictError, ValidationError } from '../errors.ts'

const KEPT = sql`interval '24 hours'`
// Longer than a request may take (30 seconds), so that whoever made a claim this old has stopped without an answer.
const GIVEN_UP_AFTER = sql`interval '60 seconds'`

/**
 * Makes a write route act once for one `Idempotency-Key` (draft-ietf-httpapi-idempotency-key-header): the same request
 * again gets the stored answer, another request under the same key 422, one that is still running 409. A claim whose
 * server was killed before it answered is taken over by one of the next requests after a minute. Keys belong to a
 * member and are kept for 24 hours. The header is optional: forms are guarded by the version they carry.
 */
function idempotent(app: App): RequestHandler {
  return async (req, res, next) => {
    const key = req.get('idempotency-key')
    const { actor } = req.ctx
    if (key === undefined || actor.kind === 'visitor') {
      next()
      return
    }
    if (!/^[\x21-\x7e]{8,200}$/.test(key)) {
      throw new ValidationError('The Idempotency-Key has to be 8 to 200 printable characters.')
    }
    const requestHash = hashOf(req)
    const mine = and(eq(idempotencyKeys.memberId, actor.id), eq(idempotencyKeys.key, key))
    await app.db.delete(idempotencyKeys).where(and(mine, sql`${idempotencyKeys.createdAt} < now() - ${KEPT}`))
    // Of any number of requests that ask at the same time one changes the row; the others then find it young again.
    const takeOver = async () => {
      const taken = await app.db
        .update(idempotencyKeys)
        .set({ createdAt: sql`now()` })
        .where(
          and(
            mine,
            eq(idempotencyKeys.requestHash, requestHash),
            isNull(idempotencyKeys.status),
            sql`${idempotencyKeys.createdAt} < now() - ${GIVEN_UP_AFTER}`,
          ),
        )
      return taken.rowCount === 1
    }
    const claimed = await app.db
      .insert(idempotencyKeys)
      .values({ memberId: actor.id, key, requestHash })
      .onConflictDoNothing()
      .returning({ key: idempotencyKeys.key })
    if (claimed.length === 0 && !(await takeOver())) {
      const [earlier] = await app.db.select().from(idempotencyKeys).where(mine)
      if (earlier !== undefined && earlier.requestHash !== requestHash) {
        throw new AppError('idempotency_key_reused', 422, 'That Idempotency-Key was used for another request.')
      }
      if (earlier?.status == null) {
        throw new ConflictError('still_running', 'The same request is still being carried out. Ask again in a moment.')
      }
      res.status(earlier.status).set(earlier.headers ?? {}).json(earlier.body)
      return
    }
    const unclaim = () => app.db.delete(idempotencyKeys).where(and(mine, isNull(idempotencyKeys.status)))
    const store = async (status: number, body: unknown) => {
      // An answer that may turn out differently next time is not kept, so that trying again can succeed.
      if (status >= 500 || status === 429) {
        await unclaim()
        return
      }
      const etag = res.getHeader('etag')
      const headers: Record<string, string> = typeof etag === 'string' ? { ETag: etag } : {}
      await app.db.update(idempotencyKeys).set({ status, body, headers }).where(mine)
    }
    keepAnswer(res, async (status, body) => {
      try {
        await store(status, body)
      } catch (error) {
        req.ctx.log.error({ err: error }, 'an answer could not be kept')
        // Asking again has to be possible; a claim without an answer would refuse it for a minute.
        await unclaim()
      }
    })
    next()
  }
}

function hashOf(req: Request): string {
  return createHash('sha256')
    .update(JSON.stringify([req.method, req.originalUrl, req.get('if-match') ?? '', req.body ?? null]))
    .digest('hex')
}

/** Holds the answer back until it is stored, so that a repeated request after a crash finds it. */
function keepAnswer(res: Response, store: (status: number, body: unknown) => Promise<void>): void {
  const send = res.send.bind(res)
  res.send = (text: unknown) => {
    res.send = send
    const body: unknown = typeof text === 'string' ? JSON.parse(text) : null
    store(res.statusCode, body).then(
      () => send(text),
      () => send(text),
    )
    return res
  }
}
