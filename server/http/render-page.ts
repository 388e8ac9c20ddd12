export { ERROR_PAGE, renderBookPage, renderPages }

import { randomBytes } from 'node:crypto'
import type { Request, RequestHandler, Response } from 'express'
import { renderPage } from 'vike/server'
import type { ServiceContext } from '../context.ts'
import { countWaitingEdits } from '../edits/count-waiting.ts'
import { can } from '../people/permissions.ts'
import type { FormState, PageReader } from './page-context.ts'
import { answerFromMemory, cacheKey } from './serve-cached.ts'
import { signedInPolicy, visitorPolicy } from './security-headers.ts'
import { sheetOf } from './sheet.ts'
import { isVisitorPage } from './visitor-pages.ts'

/** Answers every address that nothing before has answered: as a page of the book, or as its error page. */
function renderPages(): RequestHandler {
  return async (req, res) => {
    // Vike would answer a page's whole data under this address, however it is spelt; no page of ours is routed in the browser.
    if (/\.pageContext\.json$/i.test(decodeURIComponent(req.path))) {
      await renderBookPage(req, res, { url: ERROR_PAGE, status: 404 })
      return
    }
    await renderBookPage(req, res, {})
  }
}

/** An address that no page has, so that Vike answers it with the book's error page. */
const ERROR_PAGE = '/404'

interface RenderOptions {
  /** The page to show; the request's own address when left out. */
  url?: string
  status?: number
  form?: FormState
}

/** Renders one page for this request and sends it, with the policy and cache headers that fit its reader. */
async function renderBookPage(req: Request, res: Response, options: RenderOptions): Promise<void> {
  const { ctx } = req
  const generation = ctx.pageCache.generation()
  const sheet = sheetOf(req)
  const reader = await pageReader(ctx)
  const forEveryone = reader === null && options.form === undefined
  const cspNonce = forEveryone ? undefined : randomBytes(16).toString('base64url')
  const pageContext = await renderPage({
    urlOriginal: options.url ?? req.originalUrl,
    headersOriginal: req.headers,
    ...(cspNonce === undefined ? {} : { cspNonce }),
    ctx,
    reader,
    form: options.form ?? null,
    formStatus: options.status,
    sheet,
    club: ctx.config.clubName,
    requestId: ctx.requestId,
    origin: ctx.config.origin,
    query: Object.fromEntries(Object.entries(req.query).filter((pair): pair is [string, string] => typeof pair[1] === 'string')),
  })
  const { httpResponse } = pageContext
  // A page that is not there, or not for this reader, is an answer and no failure.
  if (pageContext.errorWhileRendering && httpResponse.statusCode >= 500) {
    ctx.log.error({ err: pageContext.errorWhileRendering as unknown, path: req.path }, 'page failed')
  } else if (pageContext.errorWhileRendering) {
    ctx.log.info({ status: httpResponse.statusCode, path: req.path }, 'page refused')
  }
  const asAsked = httpResponse.statusCode === 200 || options.url === ERROR_PAGE
  const status = options.status !== undefined && asAsked ? options.status : httpResponse.statusCode
  for (const [name, value] of httpResponse.headers) {
    if (!/^content-security-policy$|^cache-control$/i.test(name)) res.setHeader(name, value)
  }
  res.status(status)
  res.setHeader('Content-Security-Policy', cspNonce === undefined ? visitorPolicy : signedInPolicy(cspNonce))
  if (ctx.config.liveReload) res.removeHeader('Content-Security-Policy')
  const key = cacheKey(req)
  if (status === 200 && forEveryone && key !== undefined && isVisitorPage(req.path) && !ctx.config.liveReload) {
    const html = httpResponse.body
    const page = await ctx.pageCache.put(key, generation, { contentType: 'text/html; charset=utf-8', html })
    answerFromMemory(req, res, page)
    return
  }
  res.setHeader('Cache-Control', 'private, no-store')
  if (req.method === 'HEAD') res.end()
  else res.send(httpResponse.body)
}

async function pageReader(ctx: ServiceContext): Promise<PageReader | null> {
  const { actor } = ctx
  if (actor.kind === 'visitor') return null
  const waiting = can(actor, 'queue.read') ? await countWaitingEdits(ctx) : 0
  return { id: actor.id, name: actor.name, role: actor.role, verified: actor.verified, waiting }
}
