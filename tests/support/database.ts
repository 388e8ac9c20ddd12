export { adminUrl, createDatabase, dropDatabase, TEMPLATE }

import { randomBytes } from 'node:crypto'
import pg from 'pg'

/** Migrated and seeded once a run; every test database is a copy of it. */
const TEMPLATE = 'camber_test_template'

/** The connection that may create databases; `npm test` sets it. */
function adminUrl(): string {
  const url = process.env.TEST_DATABASE_URL
  if (url === undefined) throw new Error('Run these tests by `npm test`: they need TEST_DATABASE_URL.')
  return url
}

async function asAdmin(run: (client: pg.Client) => Promise<unknown>): Promise<void> {
  const client = new pg.Client({ connectionString: adminUrl() })
  await client.connect()
  try {
    await run(client)
  } finally {
    await client.end()
  }
}

/** @returns the address of a new database of its own */
async function createDatabase(options: { name?: string; template?: string } = {}): Promise<string> {
  const name = options.name ?? `camber_test_${randomBytes(6).toString('hex')}`
  await asAdmin((client) =>
    client.query(`create database ${name}${options.template === undefined ? '' : ` template ${options.template}`}`),
  )
  const url = new URL(adminUrl())
  url.pathname = `/${name}`
  return url.href
}

async function dropDatabase(urlOrName: string): Promise<void> {
  const name = urlOrName.includes('/') ? new URL(urlOrName).pathname.slice(1) : urlOrName
  await asAdmin((client) => client.query(`drop database if exists ${name} with (force)`))
}
