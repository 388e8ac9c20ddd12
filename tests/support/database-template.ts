import { migrateDatabase } from '#server/db/migrate.ts'
import { seedDatabase } from '#server/seeding/index.ts'
import { createDatabase, dropDatabase, TEMPLATE } from './database.ts'

/** Vitest global set-up: makes the template database, and drops it at the end. */
export async function setup(): Promise<() => Promise<void>> {
  await dropDatabase(TEMPLATE)
  const url = await createDatabase({ name: TEMPLATE })
  await migrateDatabase(url)
  await seedDatabase(url, { demo: true })
  return () => dropDatabase(TEMPLATE)
}
