export { health, healthDescription }

import { Router } from 'express'
import { sql } from 'drizzle-orm'
import { z } from 'zod'
import type { App } from '../context.ts'
import type { ApiDescription } from './openapi/describe.ts'

const healthDescription: ApiDescription = {
  name: 'Health',
  about: 'Whether the server can do its work.',
  operations: {
    'GET /health': {
      id: 'getHealth',
      summary: 'Whether the server reaches its database.',
      answers: {
        200: { says: 'It does.', body: z.object({ status: z.literal('ok'), database: z.literal('ok'), version: z.string() }) },
        503: { says: 'It does not.', body: z.object({ status: z.literal('degraded'), database: z.literal('away'), version: z.string() }) },
      },
    },
  },
}

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
