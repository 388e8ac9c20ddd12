export { createApp }
export type { RunningApp }

import { createServer, type AddressInfo } from 'node:net'
import express, { Router, type Express } from 'express'
import pino from 'pino'
import { calculatorRoutes, describeCalculators, loadCalculators } from './calculators/index.ts'
import { carsApi, carsDescription, carsForms } from './cars/index.ts'
import type { Config } from './config.ts'
import type { App } from './context.ts'
import { connectDatabase } from './db/client.ts'
import { editsApi, editsDescription, editsForms } from './edits/index.ts'
import { NotFoundError } from './errors.ts'
import { feelApi, feelDescription } from './feel/index.ts'
import { guidesApi, guidesDescription } from './guides/index.ts'
import { heatReportsApi, heatReportsDescription, heatReportsForms } from './heat-reports/index.ts'
import { formBodies, jsonBodies } from './http/body-parsers.ts'
import { discovery } from './http/discovery.ts'
import { health, healthDescription } from './http/health.ts'
import type { ApiDescription } from './http/openapi/describe.ts'
import { openApi } from './http/openapi/route.ts'
import { createPageCache } from './http/page-cache.ts'
import { pageErrors } from './http/page-errors.ts'
import { apiErrors } from './http/problem-details.ts'
import { listenForPublishing } from './http/published-listener.ts'
import { createRateLimits } from './http/rate-limits.ts'
import { renderPages } from './http/render-page.ts'
import { requestContext, requestId } from './http/request-context.ts'
import { refuseCrossSite } from './http/same-origin.ts'
import { securityHeaders } from './http/security-headers.ts'
import { serveCachedPages } from './http/serve-cached.ts'
import { sheetChoice } from './http/sheet-choice.ts'
import { staticFiles } from './http/static-files.ts'
import { createTidyUp } from './maintenance/tidy.ts'
import { createMailWorker, startMailCapture, type MailWorker } from './mail/index.ts'
import { mailboxApi, mailboxDescription, peopleApi, peopleDescription, peopleForms, sessionMiddleware } from './people/index.ts'
import { createPasswords } from './people/passwords.ts'
import { sessionCookieName } from './people/session-cookie.ts'
import { createGuideRenderer } from './rendering/index.ts'
import { loadRenderVocabulary } from './guides/render-vocabulary.ts'
import { readVersion } from './version.ts'

interface RunningApp {
  app: App
  express: Express
  mailWorker: MailWorker
  /** Finishes what is under way, stops workers and closes the database. */
  close(): Promise<void>
}

/** Puts the whole server together on a migrated database. Nothing listens yet. */
async function createApp(config: Config, options: { clock?: () => Date } = {}): Promise<RunningApp> {
  const log = pino({ level: config.logLevel, redact: ['req.headers.cookie', 'req.headers.authorization'] })
  const connection = connectDatabase(config.databaseUrl, {
    max: config.databasePool,
    onError: (error) => log.warn({ err: error }, 'a database connection broke'),
  })
  const calculators = await loadCalculators()
  const mailbox = config.smtpUrl === undefined ? await startMailCapture() : undefined
  const app: App = {
    config,
    connection,
    db: connection.db,
    log,
    clock: options.clock ?? (() => new Date()),
    calculators,
    renderer: createGuideRenderer({
      vocabulary: () => loadRenderVocabulary(connection.db, calculators),
      timeoutMs: config.renderTimeout,
    }),
    pageCache: createPageCache(config.pageCacheBytes),
    rateLimits: createRateLimits(connection.pool),
    passwords: createPasswords(),
    mailbox,
  }
  const listener = listenForPublishing(app)
  const mailWorker = createMailWorker(app)
  const tidyUp = createTidyUp(app)
  await listener.ready
  const server = express()
  server.disable('x-powered-by')
  server.set('etag', false)
  server.set('query parser', 'simple')
  server.set('trust proxy', config.trustProxy)
  server.use(requestId(), securityHeaders({ https: config.secureCookies }))
  if (!config.liveReload) server.use(staticFiles())
  server.use(serveCachedPages(app))
  server.use(health(app, readVersion()))
  server.use(sessionMiddleware(app), requestContext(app), refuseCrossSite(config.origin))
  server.use('/api', apiRoutes(app))
  server.use(formBodies(), sheetChoice({ secure: config.secureCookies }), peopleForms(app), editsForms(app), carsForms(), heatReportsForms(), discovery(app))
  if (config.liveReload) await useLiveReload(server)
  server.get('/{*path}', renderPages())
  server.use(() => {
    throw new NotFoundError('place', 'to send that to')
  })
  server.use('/api', apiErrors)
  server.use(pageErrors)
  return {
    app,
    express: server,
    mailWorker,
    async close() {
      await Promise.all([listener.close(), mailWorker.close(), tidyUp.close(), app.renderer.close()])
      await mailbox?.close()
      await connection.close()
    },
  }
}

function apiRoutes(app: App): Router {
  const router = Router()
  router.use((_req, res, next) => {
    res.setHeader('Cache-Control', 'no-store')
    next()
  })
  router.use(...jsonBodies())
  router.use(calculatorRoutes(app.calculators), guidesApi(app), editsApi(app), carsApi(app), feelApi(), heatReportsApi(), peopleApi(app))
  if (app.mailbox !== undefined) router.use(mailboxApi(app))
  router.use(openApi(describeApi(app), { version: readVersion(), sessionCookie: sessionCookieName(app.config.secureCookies) }))
  router.use((req) => {
    throw new NotFoundError('API address', req.originalUrl)
  })
  router.use(apiErrors)
  return router
}

/** What stands in /api/openapi.json: one description for each router above that answers under /api. */
function describeApi(app: App): ApiDescription[] {
  return [
    guidesDescription,
    describeCalculators(app.calculators),
    editsDescription,
    carsDescription,
    feelDescription,
    heatReportsDescription,
    peopleDescription,
    ...(app.mailbox === undefined ? [] : [mailboxDescription]),
    healthDescription,
  ]
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', reject)
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address() as AddressInfo
      probe.close(() => resolve(port))
    })
  })
}

async function useLiveReload(server: Express): Promise<void> {
  const { createDevMiddleware } = await import('vike/server')
  // A free port of its own for live reload, so that a second clone can be worked in at the same time.
  const viteConfig = { server: { hmr: { port: await freePort() } } }
  const { devMiddleware } = await createDevMiddleware({ root: process.cwd(), viteConfig })
  server.use(devMiddleware)
}
