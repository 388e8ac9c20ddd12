export { migrateDatabase }

import { fileURLToPath } from 'node:url'
import { sql } from 'drizzle-orm'
import { migrate } from 'drizzle-orm/node-postgres/migrator'
import { connectDatabase } from './client.ts'

const migrationsFolder = fileURLToPath(new URL('../../drizzle', import.meta.url))
// Any number; it only has to be the same on every node that starts at once.
const MIGRATION_LOCK = 4_207_001

/** Brings the database to the newest schema. Safe to repeat and to run on several nodes at once. */
async function migrateDatabase(url: string): Promise<void> {
  const connection = connectDatabase(url, { max: 1, statementTimeout: 300_000 })
  try {
    await connection.db.execute(sql`select pg_advisory_lock(${MIGRATION_LOCK})`)
    await migrate(connection.db, { migrationsFolder })
    await connection.db.execute(sql`select pg_advisory_unlock(${MIGRATION_LOCK})`)
  } finally {
    await connection.close()
  }
}
