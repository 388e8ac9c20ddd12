export { listenForPublishing }

import pg from 'pg'
import type { App } from '../context.ts'

const RETRY_MS = 1_000
// A connection that a network on the way has forgotten looks open for ever unless something is asked of it.
const HEARTBEAT_MS = 30_000
const ANSWER_MS = 5_000

/**
 * Empties this node's page cache whenever any node publishes. While the connection is away nothing is answered from
 * memory, since news could be missed.
 */
function listenForPublishing(app: Pick<App, 'config' | 'log' | 'pageCache'>): { close(): Promise<void>; ready: Promise<void> } {
  let current: pg.Client | undefined
  let closed = false
  let retry: NodeJS.Timeout | undefined

  async function connect(): Promise<void> {
    const client = new pg.Client({
      connectionString: app.config.databaseUrl,
      application_name: 'camber-and-clay listen',
      keepAlive: true,
      connectionTimeoutMillis: ANSWER_MS,
      query_timeout: ANSWER_MS,
    })
    current = client
    client.on('notification', () => app.pageCache.clear())
    client.on('error', (error) => lost(client, error))
    client.on('end', () => lost(client))
    try {
      await client.connect()
      await client.query('listen published')
      if (current === client && !closed) app.pageCache.resume()
    } catch (error) {
      lost(client, error as Error)
    }
  }

  function lost(client: pg.Client, error?: Error): void {
    if (closed || client !== current) return
    app.log.warn({ err: error }, 'news of publishing cannot be heard; pages are not answered from memory')
    current = undefined
    app.pageCache.pause()
    client.end().catch(() => undefined)
    retry = setTimeout(() => void connect(), RETRY_MS)
    retry.unref()
  }

  const heartbeat = setInterval(() => {
    const client = current
    client?.query('select 1').catch((error: unknown) => lost(client, error as Error))
  }, HEARTBEAT_MS)
  heartbeat.unref()

  const ready = connect()
  return {
    ready,
    async close() {
      closed = true
      clearTimeout(retry)
      clearInterval(heartbeat)
      await current?.end().catch(() => undefined)
    },
  }
}
