export { listenForPublishing }

import pg from 'pg'
import type { App } from '../context.ts'

/**
 * Empties this node's page cache whenever any node publishes. While the connection is away nothing is answered from
 * memory, since news could be missed.
 */
function listenForPublishing(app: Pick<App, 'config' | 'log' | 'pageCache'>): { close(): Promise<void>; ready: Promise<void> } {
  let client: pg.Client | undefined
  let closed = false
  let retry: NodeJS.Timeout | undefined

  async function connect(): Promise<void> {
    const next = new pg.Client({ connectionString: app.config.databaseUrl, application_name: 'camber-and-clay listen' })
    next.on('notification', () => app.pageCache.clear())
    next.on('error', (error) => lost(next, error))
    next.on('end', () => lost(next))
    try {
      await next.connect()
      await next.query('listen published')
      client = next
      app.pageCache.resume()
    } catch (error) {
      lost(next, error as Error)
    }
  }

  function lost(from: pg.Client, error?: Error): void {
    if (closed || retry !== undefined || (client !== undefined && from !== client)) return
    app.log.warn({ err: error }, 'news of publishing cannot be heard; pages are not answered from memory')
    client = undefined
    app.pageCache.pause()
    retry = setTimeout(() => {
      retry = undefined
      void connect()
    }, 1_000)
    retry.unref()
  }

  const ready = connect()
  return {
    ready,
    async close() {
      closed = true
      clearTimeout(retry)
      await client?.end().catch(() => undefined)
    },
  }
}
