export { answerFromMemory, cacheKey, serveCachedPages }

import type { Request, RequestHandler, Response } from 'express'
import type { App } from '../context.ts'
import { SESSION_COOKIES } from '../people/session-cookie.ts'
import type { CachedPage } from './page-cache.ts'
import { visitorPolicy } from './security-headers.ts'
import { sheetOf } from './sheet.ts'
import { isVisitorPage } from './visitor-pages.ts'

/** Answers published pages for visitors from memory, before session, parsers and router. */
function serveCachedPages(app: App): RequestHandler {
  return (req, res, next) => {
    const key = isVisitorPage(req.path) ? cacheKey(req) : undefined
    const page = key === undefined ? undefined : app.pageCache.get(key)
    if (page === undefined) {
      next()
      return
    }
    res.setHeader('Content-Security-Policy', visitorPolicy)
    answerFromMemory(req, res, page)
  }
}

// Other spellings of the same address (%64roop, a doubled slash) are answered too, but one page is kept under one key.
const CANONICAL = /^\/(?:[A-Za-z0-9-]+(?:\/[A-Za-z0-9-]+)*)?$/

/**
 * What tells two visitors' pages apart: the path and the chosen sheet. Undefined where a page is not the same for all: with a
 * session, or with a query (calculators compute from it).
 */
function cacheKey(req: Request): string | undefined {
  if (req.method !== 'GET' && req.method !== 'HEAD') return undefined
  if (req.originalUrl.includes('?') || !CANONICAL.test(req.path)) return undefined
  const cookies = req.headers.cookie ?? ''
  if (SESSION_COOKIES.some((name) => cookies.includes(`${name}=`))) return undefined
  return `${sheetOf(req) ?? ''} ${req.path}`
}

type Encoding = 'br' | 'gzip' | 'identity'

function answerFromMemory(req: Request, res: Response, page: CachedPage): void {
  const encoding = (req.acceptsEncodings(['br', 'gzip', 'identity']) || 'identity') as Encoding
  res.setHeader('Content-Type', page.contentType)
  res.setHeader('ETag', tagOf(page, encoding))
  res.setHeader('Vary', 'Accept-Encoding, Cookie')
  res.setHeader(
    'Cache-Control',
    sheetOf(req) === null ? 'public, max-age=0, s-maxage=300, stale-while-revalidate=86400' : 'private, max-age=0',
  )
  if (isFresh(req, page)) {
    res.status(304).end()
    return
  }
  const body = { br: page.brotli, gzip: page.gzip, identity: page.identity }[encoding]
  if (encoding !== 'identity') res.setHeader('Content-Encoding', encoding)
  res.setHeader('Content-Length', body.length)
  res.end(req.method === 'HEAD' ? undefined : body)
}

// Each encoding is a representation of its own and carries a tag of its own (RFC 9110 §8.8.3.3).
function tagOf(page: CachedPage, encoding: Encoding): string {
  return encoding === 'identity' ? `"${page.hash}"` : `"${page.hash}-${encoding}"`
}

// Weak comparison (RFC 9110 §13.1.2): a cache on the way may have weakened our tag. Whichever encoding the reader holds, the
// page is the same.
function isFresh(req: Request, page: CachedPage): boolean {
  const asked = req.headers['if-none-match']
  if (asked === undefined) return false
  const known = new Set((['br', 'gzip', 'identity'] as const).map((encoding) => tagOf(page, encoding)))
  return asked.split(',').some((tag) => tag.trim() === '*' || known.has(tag.trim().replace(/^W\//, '')))
}
