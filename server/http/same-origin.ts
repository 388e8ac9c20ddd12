export { refuseCrossSite }

import type { RequestHandler } from 'express'
import { ForbiddenError } from '../errors.ts'

/**
 * Refuses state-changing requests that another site caused. Browsers say where a request comes from in Sec-Fetch-Site
 * and Origin and no page can forge either; a request with neither comes from a program, which carries no one's cookie.
 * Together with SameSite=Lax cookies this is the whole protection against cross-site request forgery.
 */
function refuseCrossSite(origin: string): RequestHandler {
  return (req, _res, next) => {
    if (req.method === 'GET' || req.method === 'HEAD' || req.method === 'OPTIONS') {
      next()
      return
    }
    const site = req.get('sec-fetch-site')
    const from = req.get('origin')
    const sameSite = site === undefined || site === 'same-origin' || site === 'none'
    const sameOrigin = from === undefined || from === origin || isOwnHost(from, req.get('host'))
    if (sameSite && sameOrigin) {
      next()
      return
    }
    throw new ForbiddenError('That request came from another site, so it was not carried out. Try again from here.')
  }
}

// On a phone in the pits the club's machine is reached by address rather than by name.
function isOwnHost(from: string, host: string | undefined): boolean {
  return host !== undefined && URL.canParse(from) && new URL(from).host === host
}
