export { requestContext, requestId }

import { randomUUID } from 'node:crypto'
import type { RequestHandler } from 'express'
import type { App, ServiceContext } from '../context.ts'
import { actorFromSession } from '../people/session.ts'

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- Express types its request by this namespace
  namespace Express {
    interface Request {
      id: string
      ctx: ServiceContext
    }
  }
}

/** Gives every request an id that a person can quote. An id from outside is never believed. */
function requestId(): RequestHandler {
  return (req, res, next) => {
    req.id = randomUUID()
    res.setHeader('X-Request-Id', req.id)
    next()
  }
}

/** Puts `req.ctx` on the request: the app, who is asking, and from where. Needs the session. */
function requestContext(app: App): RequestHandler {
  return async (req, _res, next) => {
    req.ctx = {
      ...app,
      log: app.log.child({ requestId: req.id }),
      actor: await actorFromSession(app, req),
      requestId: req.id,
      address: networkOf(req.ip ?? ''),
    }
    next()
  }
}

/** The /64 of an IPv6 address, since one household holds a whole /64; an IPv4 address as it is. */
function networkOf(address: string): string {
  const plain = address.replace(/^::ffff:(?=\d+\.)/, '')
  if (!plain.includes(':')) return plain
  const [head = '', tail = ''] = plain.split('::')
  const left = head === '' ? [] : head.split(':')
  const right = tail === '' ? [] : tail.split(':')
  const zeros = Array<string>(Math.max(0, 8 - left.length - right.length)).fill('0')
  return [...left, ...(plain.includes('::') ? zeros : []), ...right].slice(0, 4).join(':') + '::/64'
}
