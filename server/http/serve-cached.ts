export { answerFromMemory, cacheKey, serveCachedPages }

import type { Request, RequestHandler, Response } from 'express'
import type { App } from '../context.ts'
import { SESSION_COOKIES } from '../people/session-cookie.ts'
import type { CachedPage } from './page-cache.ts'
import { visitorPolicy } from './security-headers.ts'
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

/**
 * What tells two visitors' pages apart: the path and the chosen sheet. Undefined where a page is not the same for all:
 * with a session, or with a query (calculators compute from it).
 */
function cacheKey(req: Request): string | undefined {
  if (req.method !== 'GET' && req.method !== 'HEAD') return undefined
  if (req.originalUrl.includes('?')) return undefined
  const cookies = req.headers.cookie ?? ''
  if (SESSION_COOKIES.some((name) => cookies.includes(`${name}=`))) return undefined
  const sheet = /(?:^|;\s*)sheet=(day|night)(?:;|$)/.exec(cookies)?.[1] ?? ''
  return `${sheet} ${req.path}`
}

function answerFromMemory(req: Request, res: Response, page: CachedPage): void {
  const pinned = (req.headers.cookie ?? '').includes('sheet=')
  res.setHeader('Content-Type', page.contentType)
  res.setHeader('ETag', page.etag)
  res.setHeader('Vary', 'Accept-Encoding, Cookie')
  res.setHeader(
    'Cache-Control',
    pinned ? 'private, max-age=0' : 'public, max-age=0, s-maxage=300, stale-while-revalidate=86400',
  )
  if (isFresh(req, page.etag)) {
    res.status(304).end()
    return
  }
  const encoding = req.acceptsEncodings(['br', 'gzip', 'identity'])
  const body = encoding === 'br' ? page.brotli : encoding === 'gzip' ? page.gzip : page.identity
  if (encoding === 'br' || encoding === 'gzip') res.setHeader('Content-Encoding', encoding)
  res.setHeader('Content-Length', body.length)
  res.end(req.method === 'HEAD' ? undefined : body)
}

// Weak comparison (RFC 9110 §13.1.2): a cache on the way may have weakened our tag when it changed the encoding.
function isFresh(req: Request, etag: string): boolean {
  const asked = req.headers['if-none-match']
  if (asked === undefined) return false
  return asked.split(',').some((tag) => tag.trim().replace(/^W\//, '') === etag || tag.trim() === '*')
}
