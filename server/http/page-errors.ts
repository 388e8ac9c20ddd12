export { pageErrors }

import type { ErrorRequestHandler, Request, Response } from 'express'
import type { AppError } from '../errors.ts'
import { toAppError } from './problem-details.ts'
import { ERROR_PAGE, renderBookPage } from './render-page.ts'

/**
 * Express error handler for everything that a person looks at. Shows the book's error page; when even that cannot be
 * rendered (the database is away, say), a page that needs nothing but this file.
 */
const pageErrors: ErrorRequestHandler = async (error: unknown, req, res, next) => {
  if (res.headersSent) {
    next(error)
    return
  }
  const known = toAppError(error)
  if (known.status >= 500) req.ctx?.log.error({ err: error, path: req.path }, 'request failed')
  if (known.status === 401) {
    res.redirect(303, `/sign-in?next=${encodeURIComponent(req.get('sec-fetch-site') === 'same-origin' ? backTo(req) : '/')}`)
    return
  }
  if (known.status >= 500 || req.ctx === undefined) {
    barePage(req, res, known)
    return
  }
  try {
    await renderBookPage(req, res, {
      url: ERROR_PAGE,
      status: known.status,
      form: { values: {}, problems: known.fields, message: known.message },
    })
  } catch {
    barePage(req, res, known)
  }
}

function backTo(req: Request): string {
  const referer = req.get('referer')
  return referer !== undefined && URL.canParse(referer) ? new URL(referer).pathname : '/'
}

function barePage(req: Request, res: Response, error: AppError): void {
  const { retryAfter } = error.details
  if (typeof retryAfter === 'number') res.setHeader('Retry-After', String(retryAfter))
  const title = error.status === 503 ? 'The book cannot be reached just now' : 'Something broke on our side'
  res
    .status(error.status)
    .set('Cache-Control', 'no-store')
    .type('html')
    .send(
      `<!doctype html><html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">` +
        `<title>${title} · Camber &amp; Clay</title></head><body><h1>${title}</h1>` +
        `<p>Try again in a minute. What you typed is still in your browser: go back to find it.</p>` +
        `<p>If it stays like this, tell your club this number: <b>${req.id}</b></p>` +
        `<p><a href="/">Back to the lap</a></p></body></html>`,
    )
}
