export { staticFiles }

import { existsSync } from 'node:fs'
import type { ServerResponse } from 'node:http'
import { fileURLToPath } from 'node:url'
import { Router } from 'express'
import sirv from 'sirv'

const built = fileURLToPath(new URL('../../dist/client', import.meta.url))
const YEAR = 365 * 24 * 60 * 60

/** Of the headers of every answer, those that say something about a script, a stylesheet or a font. */
const FOR_ANY_FILE = ['x-content-type-options', 'cross-origin-resource-policy', 'strict-transport-security', 'vary']

/** Built assets, already compressed. Names carry a hash of the content, so a browser may keep them for a year. */
function staticFiles(): Router {
  const router = Router()
  if (!existsSync(built)) return router
  router.use(
    sirv(built, {
      brotli: true,
      gzip: true,
      etag: true,
      extensions: [],
      maxAge: YEAR,
      immutable: true,
      setHeaders: (res, path) => {
        // A file without a hash in its name may change under the same name.
        if (!path.startsWith('/assets/')) res.setHeader('Cache-Control', 'public, max-age=3600')
        if (/\.(js|css|woff2)$/.test(path)) dropDocumentHeaders(res)
      },
    }),
  )
  return router
}

/** The files of a first view would carry 4 kB of them. A picture keeps them, for an SVG can be opened as a document. */
function dropDocumentHeaders(res: ServerResponse): void {
  for (const name of res.getHeaderNames()) if (!FOR_ANY_FILE.includes(name)) res.removeHeader(name)
}
