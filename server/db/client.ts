export { connectDatabase }
export type { Database, DatabaseConnection, Transaction }

import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres'
import pg from 'pg'
import * as schema from './schema/index.ts'

type Database = NodePgDatabase<typeof schema>
type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0]

interface DatabaseConnection {
  db: Database
  pool: pg.Pool
  close(): Promise<void>
}

/**
 * Opens a pool on one PostgreSQL database.
 * @param options.statementTimeout longest time in milliseconds that one statement may take
 */
function connectDatabase(
  url: string,
  options: { max?: number; statementTimeout?: number; onError?: (error: Error) => void } = {},
): DatabaseConnection {
  const pool = new pg.Pool({
    connectionString: url,
    max: options.max ?? 10,
    connectionTimeoutMillis: 5_000,
    statement_timeout: options.statementTimeout ?? 10_000,
    application_name: 'camber-and-clay',
  })
  // An idle connection that breaks (PostgreSQL restarted) must not end the process; the pool opens a new one.
  pool.on('error', (error) => options.onError?.(error))
  return { db: drizzle(pool, { schema, casing: 'snake_case' }), pool, close: () => pool.end() }
}
