export { listenForMail }

import pg from 'pg'
import { MAIL_CHANNEL } from './outbox.ts'

const RETRY_MS = 5_000

/**
 * Calls `onMail` whenever a transaction that queued mail commits, on any node. A broken connection is opened again; what
 * was missed meanwhile is found by the worker's regular look.
 */
function listenForMail(databaseUrl: string, onMail: () => void): { close(): Promise<void> } {
  let client: pg.Client | undefined
  let retry: NodeJS.Timeout | undefined
  let closed = false

  async function connect(): Promise<void> {
    const fresh = new pg.Client({ connectionString: databaseUrl, application_name: 'camber-and-clay mail' })
    let lost = false
    const lose = () => {
      if (lost || closed) return
      lost = true
      fresh.end().catch(() => {})
      retry = setTimeout(() => void connect(), RETRY_MS)
      retry.unref()
    }
    fresh.on('error', lose)
    fresh.on('end', lose)
    fresh.on('notification', onMail)
    client = fresh
    try {
      await fresh.connect()
      await fresh.query(`listen ${MAIL_CHANNEL}`)
      onMail()
    } catch {
      lose()
    }
  }
  const first = connect()

  return {
    async close() {
      closed = true
      clearTimeout(retry)
      await first
      await client?.end().catch(() => {})
    },
  }
}
