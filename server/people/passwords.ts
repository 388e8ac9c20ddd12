export { UNKNOWN_HASH, createPasswords, isWeaker }
export type { Passwords }

import argon2 from 'argon2'
import { TooManyRequestsError } from '../errors.ts'

/** OWASP Password Storage Cheat Sheet: argon2id with at least 19 MiB, two passes, one lane. */
const HASHING = { type: argon2.argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const

/**
 * The hash of a random text that nobody kept. A password given for an address that is not here is compared with this,
 * so that the answer takes as long as for one that is.
 */
const UNKNOWN_HASH =
  '$argon2id$v=19$m=19456,t=2,p=1$tVFALrWsBqf0Wu1CKrsyWg$57XA/mrsMzEyvUgty8HUdZpvGO9ZoA0QhhFTcMh8aSo'

// Each hash holds 19 MiB and one of the four threads that files and pictures are also waiting for.
const AT_ONCE = 2
const WAITING_AT_MOST = 20

interface Passwords {
  /** @throws TooManyRequestsError when too many are waiting */
  hash(password: string): Promise<string>
  /**
   * @param stored undefined when there is no such account: takes as long and never matches
   * @throws TooManyRequestsError when too many are waiting
   */
  matches(stored: string | undefined | null, password: string): Promise<boolean>
}

/** The one queue of a running server: two at work, twenty waiting. */
function createPasswords(): Passwords {
  let busy = 0
  const waiting: (() => void)[] = []

  async function inTurn<T>(work: () => Promise<T>): Promise<T> {
    if (busy >= AT_ONCE) {
      if (waiting.length >= WAITING_AT_MOST) {
        throw new TooManyRequestsError('Many people are signing in at this moment. Try again in a few seconds.', 5)
      }
      await new Promise<void>((resolve) => waiting.push(resolve))
    } else {
      busy += 1
    }
    try {
      return await work()
    } finally {
      const next = waiting.shift()
      if (next === undefined) busy -= 1
      else next()
    }
  }

  return {
    hash: (password) => inTurn(() => argon2.hash(password.normalize('NFC'), HASHING)),
    matches: (stored, password) =>
      inTurn(async () => {
        const same = await argon2.verify(stored ?? UNKNOWN_HASH, password.normalize('NFC'))
        return same && typeof stored === 'string'
      }),
  }
}

/** Whether a hash was made with less work than we ask for today, and should be made anew at the next sign-in. */
function isWeaker(stored: string): boolean {
  return !stored.startsWith('$argon2id$') || argon2.needsRehash(stored, HASHING)
}
