export { securityHeaders, visitorPolicy, signedInPolicy }

import type { RequestHandler } from 'express'
import helmet from 'helmet'

const shared = {
  'default-src': "'none'",
  'style-src': "'self'",
  'img-src': "'self'",
  'font-src': "'self'",
  'connect-src': "'self'",
  'manifest-src': "'self'",
  'form-action': "'self'",
  'frame-ancestors': "'none'",
  'base-uri': "'none'",
  'object-src': "'none'",
}

function policy(directives: Record<string, string>): string {
  return Object.entries(directives)
    .map(([name, value]) => `${name} ${value}`)
    .join('; ')
}

/** A page that is the same for every visitor may be cached, so it cannot carry a nonce; it holds no inline script. */
const visitorPolicy = policy({ ...shared, 'script-src': "'self'" })

function signedInPolicy(nonce: string): string {
  return policy({
    ...shared,
    'script-src': `'nonce-${nonce}' 'strict-dynamic'`,
    'style-src': `'self' 'nonce-${nonce}'`,
  })
}

/** Headers of every answer; pages replace the policy by their own. */
function securityHeaders(options: { https: boolean }): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: { 'default-src': ["'none'"], 'frame-ancestors': ["'none'"], 'base-uri': ["'none'"] },
    },
    strictTransportSecurity: options.https ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'strict-origin-when-cross-origin' },
    crossOriginResourcePolicy: { policy: 'same-origin' },
    xFrameOptions: { action: 'deny' },
  })
}
