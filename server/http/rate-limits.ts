export { RATE_LIMITS, createRateLimits }
export type { RateLimitName, RateLimits }

import type pg from 'pg'
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible'
import { TooManyRequestsError } from '../errors.ts'

const MINUTE = 60
const HOUR = 60 * MINUTE
const DAY = 24 * HOUR

/** What may be done how often, and what to say when it is too often. Keys are an address, a member or an account. */
const RATE_LIMITS = {
  sign_in_guesser: { points: 5, seconds: 15 * MINUTE, what: 'Too many wrong passwords for this account' },
  // From all networks together: ten times as many, since a low number would let anyone keep a member out by guessing
  // badly on purpose. A password of 15 characters is not found by 200 guesses an hour, and those end at the hundredth.
  sign_in_account: { points: 50, seconds: 15 * MINUTE, what: 'Too many wrong passwords for this account' },
  sign_in_address: { points: 30, seconds: 15 * MINUTE, what: 'Too many wrong passwords from your network' },
  // NIST SP 800-63B: a hundred failures in a row and the password is worth nothing; a reset by mail begins anew.
  sign_in_in_a_row: { points: 100, seconds: 90 * DAY, what: 'Too many wrong passwords. Set a new one by mail' },
  join_address: { points: 5, seconds: HOUR, what: 'Too many people joined from your network' },
  mail_account: { points: 3, seconds: HOUR, what: 'We have just sent mail to that address' },
  mail_account_day: { points: 10, seconds: DAY, what: 'We have sent enough mail to that address today' },
  mail_address: { points: 10, seconds: HOUR, what: 'Too many mails were asked for from your network' },
  token_address: { points: 20, seconds: HOUR, what: 'Too many links were tried from your network' },
  password_change: { points: 10, seconds: 15 * MINUTE, what: 'Too many wrong passwords' },
  write: { points: 60, seconds: 10 * MINUTE, what: 'You are saving faster than we can keep up' },
  car: { points: 300, seconds: 10 * MINUTE, what: 'You are saving your car faster than we can keep up' },
  heat_report: { points: 30, seconds: HOUR, what: 'You have sent many reports within the hour' },
  preview: { points: 60, seconds: 10 * MINUTE, what: 'Too many previews' },
  send: { points: 10, seconds: HOUR, what: 'You have sent many edits within the hour' },
} as const

type RateLimitName = keyof typeof RATE_LIMITS

interface RateLimits {
  /**
   * Counts one use.
   * @throws TooManyRequestsError (429) with the seconds to wait once the limit is used up
   */
  take(name: RateLimitName, key: string): Promise<void>
  /** Stops who has used up the limit, without counting. @throws TooManyRequestsError */
  check(name: RateLimitName, key: string): Promise<void>
  /** Forgives: begins the count afresh. */
  reset(name: RateLimitName, key: string): Promise<void>
}

/** Counters in PostgreSQL, so that they hold across nodes and restarts. */
function createRateLimits(pool: pg.Pool): RateLimits {
  const limiters = Object.fromEntries(
    Object.entries(RATE_LIMITS).map(([name, limit]) => [
      name,
      new RateLimiterPostgres({
        storeClient: pool,
        storeType: 'pool',
        tableName: 'rate_limits',
        tableCreated: true,
        keyPrefix: name,
        points: limit.points,
        duration: limit.seconds,
        clearExpiredByTimeout: false,
      }),
    ]),
  ) as Record<RateLimitName, RateLimiterPostgres>

  function refuse(name: RateLimitName, result: RateLimiterRes): never {
    const seconds = Math.max(1, Math.ceil(result.msBeforeNext / 1000))
    throw new TooManyRequestsError(`${RATE_LIMITS[name].what}. Try again in ${inWords(seconds)}.`, seconds)
  }

  return {
    async take(name, key) {
      try {
        await limiters[name].consume(key)
      } catch (error) {
        if (error instanceof RateLimiterRes) refuse(name, error)
        throw error
      }
    },
    async check(name, key) {
      const result = await limiters[name].get(key)
      if (result !== null && result.consumedPoints >= RATE_LIMITS[name].points && result.msBeforeNext > 0) {
        refuse(name, result)
      }
    },
    async reset(name, key) {
      await limiters[name].delete(key)
    },
  }
}

function inWords(seconds: number): string {
  if (seconds < 90) return `${seconds} seconds`
  const minutes = Math.ceil(seconds / 60)
  return minutes < 90 ? `${minutes} minutes` : `${Math.ceil(minutes / 60)} hours`
}
