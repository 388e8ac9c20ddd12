export { staticFiles }

import { existsSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { Router } from 'express'
import sirv from 'sirv'

const built = fileURLToPath(new URL('../../dist/client', import.meta.url))
const YEAR = 365 * 24 * 60 * 60

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
      // A file without a hash in its name may change under the same name.
      setHeaders: (res, path) => {
        if (!path.startsWith('/assets/')) res.setHeader('Cache-Control', 'public, max-age=3600')
      },
    }),
  )
  return router
}
