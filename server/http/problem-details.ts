export { apiErrors, sendProblem, toAppError }

import type { ErrorRequestHandler, Request, Response } from 'express'
import { AppError, isAppError } from '../errors.ts'
import type { Problem } from './problem.ts'

/** Answers with `application/problem+json` (RFC 9457). `errors` names each field at fault. */
function sendProblem(req: Request, res: Response, error: AppError): void {
  const { retryAfter, ...details } = error.details
  if (typeof retryAfter === 'number') res.setHeader('Retry-After', String(retryAfter))
  res
    .status(error.status)
    .type('application/problem+json')
    .setHeader('Cache-Control', 'no-store')
    .send(
      JSON.stringify({
        ...details,
        type: `urn:camber-and-clay:problem:${error.code}`,
        title: error.message,
        status: error.status,
        code: error.code,
        instance: `urn:uuid:${req.id}`,
        ...(error.fields.length > 0 ? { errors: error.fields } : {}),
      } satisfies Problem),
    )
}

/** Express error handler for everything under /api. */
const apiErrors: ErrorRequestHandler = (error: unknown, req, res, next) => {
  if (res.headersSent) {
    next(error)
    return
  }
  const known = toAppError(error)
  if (known.status >= 500) req.ctx?.log.error({ err: error, path: req.path }, 'request failed')
  sendProblem(req, res, known)
}

/**
 * What to tell the person about any thrown thing: our own errors as they are, the body parser's in our words, and
 * everything else as a bare 500 so that nothing of the inside leaks.
 */
function toAppError(error: unknown): AppError {
  if (isAppError(error)) return error
  const parserError = error as { type?: string; status?: number; code?: string }
  switch (parserError.type) {
    case 'entity.too.large':
      return new AppError('too_large', 413, 'That is more than one request may carry. Send less.')
    case 'entity.parse.failed':
      return new AppError('not_json', 400, 'The body is not valid JSON.')
    case 'encoding.unsupported':
    case 'charset.unsupported':
      return new AppError('unsupported_encoding', 415, 'Send UTF-8 text.')
    case 'request.aborted':
      return new AppError('aborted', 400, 'The request broke off.')
    case 'parameters.too.many':
      return new AppError('too_large', 413, 'That form has too many fields.')
  }
  if (error instanceof URIError || parserError.status === 400) {
    return new AppError('bad_request', 400, 'That address or request cannot be read.')
  }
  if (isDatabaseAway(error)) {
    return new AppError('database_away', 503, 'The book cannot be reached just now. Try again in a minute.', {
      details: { retryAfter: 10 },
    })
  }
  return new AppError('internal', 500, 'Something broke on our side. Nothing you typed was changed.', { cause: error })
}

// Connection refused, shutting down, starting up, too many connections; also what pg says while it waits for a connection.
const awayCodes = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', '57P01', '57P02', '57P03', '53300', '08006', '08001'])

function isDatabaseAway(error: unknown): boolean {
  for (let e = error; typeof e === 'object' && e !== null; e = (e as { cause?: unknown }).cause) {
    const { code, message } = e as { code?: unknown; message?: unknown }
    if (typeof code === 'string' && awayCodes.has(code)) return true
    if (typeof message === 'string' && /Connection terminated|timeout exceeded when trying to connect/.test(message)) return true
  }
  return false
}
