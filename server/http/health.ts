export { health }

import { Router } from 'express'
import { sql } from 'drizzle-orm'
import type { App } from '../context.ts'

/** Signs of life: `/healthz` says that the process answers, `/readyz` and `/api/health` that it can do its work. */
function health(app: App, version: string): Router {
  const router = Router()
  router.get('/healthz', (_req, res) => {
    res.set('Cache-Control', 'no-store').json({ status: 'ok' })
  })
  router.get(['/readyz', '/api/health'], async (_req, res) => {
    res.set('Cache-Control', 'no-store')
    try {
      await app.db.execute(sql`select 1`)
      res.json({ status: 'ok', database: 'ok', version })
    } catch {
      res.status(503).set('Retry-After', '5').json({ status: 'degraded', database: 'away', version })
    }
  })
  return router
}
