export { visitor }
export type { Actor, App, ServiceContext, SignedIn }

import type { Logger } from 'pino'
import type { CalculatorRegistry } from './calculators/load-registry.ts'
import type { Config } from './config.ts'
import type { Database, DatabaseConnection, Transaction } from './db/client.ts'
import type { PageCache } from './http/page-cache.ts'
import type { RateLimits } from './http/rate-limits.ts'
import type { Mailbox } from './mail/mailbox.ts'
import type { Passwords } from './people/passwords.ts'
import type { GuideRenderer } from './rendering/index.ts'
import type { MemberRole } from '#shared/vocabulary/roles.ts'

/** What one running server holds. Made once by `createApp`, never kept in a module. */
interface App {
  config: Config
  connection: DatabaseConnection
  db: Database
  log: Logger
  clock: () => Date
  calculators: CalculatorRegistry
  renderer: GuideRenderer
  pageCache: PageCache
  rateLimits: RateLimits
  /** Makes and compares the hashes of passwords, a few at a time. */
  passwords: Passwords
  /** Captured mail; undefined when mail goes to a real server. */
  mailbox: Mailbox | undefined
}

interface SignedIn {
  kind: 'member'
  id: string
  name: string
  role: MemberRole
  verified: boolean
  sessionId: string
}
type Actor = { kind: 'visitor' } | SignedIn

const visitor: Actor = { kind: 'visitor' }

/** What every service gets: the app, who is asking, and the database or the transaction that the caller already opened. */
interface ServiceContext extends Omit<App, 'db'> {
  db: Database | Transaction
  actor: Actor
  requestId: string
  /** Network address of the asker, as far as the configured proxies vouch for it; the key of rate limits. */
  address: string
}
