export { createTestApp, DEMO_PASSWORDS, testConfig }
export type { TestApp }

import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { readFileSync } from 'node:fs'
import supertest from 'supertest'
import { parse } from 'yaml'
import { createApp, type RunningApp } from '#server/app.ts'
import { readConfig, type Config } from '#server/config.ts'
import { ensureDemoSignIns } from '#server/people/index.ts'
import { createDatabase, dropDatabase, TEMPLATE } from './database.ts'

interface DemoMember {
  key: string
  demoEmail: string
  demoPassword: string
}

const demoMembers = parse(readFileSync(new URL('../../content/members.yaml', import.meta.url), 'utf8')) as DemoMember[]

/** Address and password of each member of the invented club, by key. */
const DEMO_PASSWORDS = Object.fromEntries(
  demoMembers.map(({ key, demoEmail, demoPassword }) => [key, { email: demoEmail, password: demoPassword }]),
)

interface TestApp extends RunningApp {
  url: string
  databaseUrl: string
  /** A browser-like client with its own cookies. */
  agent(): ReturnType<typeof supertest.agent>
  /** A client already signed in as one of the invented club. */
  signedIn(key: string): Promise<ReturnType<typeof supertest.agent>>
  /** Sends everything that waits in the outbox and gives the captured mails to one address. */
  mailTo(address: string): Promise<{ subject: string; text: string }[]>
  /** Stops the server and drops the database (kept when it was given). */
  stop(): Promise<void>
}

function testConfig(databaseUrl: string, overrides: Record<string, string> = {}): Config {
  return readConfig({
    NODE_ENV: 'test',
    DATABASE_URL: databaseUrl,
    LOG_LEVEL: 'silent',
    PORT: '0',
    DATABASE_POOL: '8',
    // A busy test machine must not fail an honest text; that the limit bites is tested beside the renderer.
    RENDER_TIMEOUT_MS: '20000',
    ...overrides,
  })
}

/**
 * A whole server on a fresh copy of the seeded database, listening on a free loopback port.
 * @param options.databaseUrl use this database instead, for a second node or a restart
 */
async function createTestApp(
  options: { databaseUrl?: string; environment?: Record<string, string>; clock?: () => Date } = {},
): Promise<TestApp> {
  const databaseUrl = options.databaseUrl ?? (await createDatabase({ template: TEMPLATE }))
  const config = testConfig(databaseUrl, options.environment)
  const running = await createApp(config, options.clock === undefined ? {} : { clock: options.clock })
  await ensureDemoSignIns(running.app)
  const server = await listen(running)
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`
  return {
    ...running,
    url,
    databaseUrl,
    agent: () => supertest.agent(url),
    async signedIn(key) {
      const agent = supertest.agent(url)
      const { email, password } = DEMO_PASSWORDS[key]!
      await agent.post('/api/session').send({ email, password }).expect(200)
      return agent
    },
    async mailTo(address) {
      await running.mailWorker.drain()
      return running.app.mailbox!.list().filter((mail) => mail.to.includes(address))
    },
    async stop() {
      await new Promise((resolve) => {
        server.close(resolve)
        server.closeAllConnections()
      })
      await running.close()
      if (options.databaseUrl === undefined) await dropDatabase(databaseUrl)
    },
  }
}

function listen(running: RunningApp): Promise<Server> {
  const server = createServer(running.express)
  return new Promise((resolve) => server.listen(0, '127.0.0.1', () => resolve(server)))
}
