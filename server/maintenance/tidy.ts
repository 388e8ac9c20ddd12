export { createTidyUp }
export type { TidyUp }

import type pg from 'pg'
import type { App } from '../context.ts'

interface TidyUp {
  /** Deletes at once what is past its time. @returns rows deleted by table; nothing while another node is at it */
  run(): Promise<Record<string, number>>
  close(): Promise<void>
}

const EVERY_MS = 3_600_000
// Any number that no other lock of this database uses.
const LOCK = 7_264_011

/**
 * What is past its time. Sent mail and used links are kept for a while, so that "I never got it" can be looked into;
 * none of them holds a secret any more.
 */
const PAST_ITS_TIME = {
  idempotency_keys: `created_at < now() - interval '24 hours'`,
  rate_limits: `expire < extract(epoch from now()) * 1000`,
  sign_in_tokens: `coalesce(used_at, expires_at) < now() - interval '7 days'`,
  outbox: `coalesce(sent_at, dead_at) < now() - interval '30 days'`,
  sessions: `expire < now()`,
} as const

/** Deletes once an hour what is past its time, on one node at a time. */
function createTidyUp(app: Pick<App, 'connection' | 'log'>): TidyUp {
  let running: Promise<unknown> = Promise.resolve()

  async function run(): Promise<Record<string, number>> {
    const client = await app.connection.pool.connect()
    try {
      return await tidy(client)
    } finally {
      client.release()
    }
  }

  const timer = setInterval(() => {
    running = run().then(
      (deleted) => app.log.info({ deleted }, 'tidied up'),
      (error: unknown) => app.log.error({ err: error }, 'could not tidy up'),
    )
  }, EVERY_MS)
  timer.unref()

  return {
    run,
    async close() {
      clearInterval(timer)
      await running
    },
  }
}

async function tidy(client: pg.PoolClient): Promise<Record<string, number>> {
  const { rows } = await client.query<{ mine: boolean }>('select pg_try_advisory_lock($1) as mine', [LOCK])
  if (rows[0]?.mine !== true) return {}
  try {
    const deleted: Record<string, number> = {}
    // One statement a table and no transaction around them, so that no lock is held longer than its own deletion.
    for (const [table, past] of Object.entries(PAST_ITS_TIME)) {
      deleted[table] = (await client.query(`delete from ${table} where ${past}`)).rowCount ?? 0
    }
    return deleted
  } finally {
    await client.query('select pg_advisory_unlock($1)', [LOCK])
  }
}
