export { TOKEN_MINUTES, findToken, invalidateTokens, issueToken, redeemToken }
export type { TokenPurpose }

import { createHash, randomBytes } from 'node:crypto'
import { and, eq, isNull, sql } from 'drizzle-orm'
import type { Database, Transaction } from '../db/client.ts'
import { members, signInTokens } from '../db/schema/index.ts'

type TokenPurpose = 'verify' | 'reset'

/** How long a link in a mail works, in minutes. */
const TOKEN_MINUTES: Record<TokenPurpose, number> = { verify: 24 * 60, reset: 30 }

interface TokenOwner {
  memberId: string
  name: string
  email: string
}

/**
 * Makes the secret of a one-time link, 256 random bits. Only its SHA-256 is kept, so that nobody who reads the database
 * can use it. The newest link is the only one that works. Has to run in a transaction.
 */
async function issueToken(
  tx: Transaction,
  member: { id: string; email: string },
  purpose: TokenPurpose,
  now: Date,
): Promise<string> {
  // Two links asked for at the same time wait for each other here; otherwise both would stay good.
  await tx.select({ id: members.id }).from(members).where(eq(members.id, member.id)).for('update')
  await invalidateTokens(tx, member.id, now, purpose)
  const secret = randomBytes(32).toString('base64url')
  await tx.insert(signInTokens).values({
    memberId: member.id,
    purpose,
    email: member.email,
    secretHash: hashOfSecret(secret),
    expiresAt: new Date(now.getTime() + TOKEN_MINUTES[purpose] * 60_000),
  })
  return secret
}

async function invalidateTokens(
  tx: Database | Transaction,
  memberId: string,
  now: Date,
  purpose?: TokenPurpose,
): Promise<void> {
  await tx
    .update(signInTokens)
    .set({ usedAt: now })
    .where(
      and(
        eq(signInTokens.memberId, memberId),
        isNull(signInTokens.usedAt),
        purpose === undefined ? undefined : eq(signInTokens.purpose, purpose),
      ),
    )
}

/** Whose a link is, if it still works. Does not use it up. */
async function findToken(
  tx: Database | Transaction,
  purpose: TokenPurpose,
  secret: string,
  now: Date,
): Promise<TokenOwner | undefined> {
  const [owner] = await tx
    .select({ memberId: members.id, name: members.name, email: signInTokens.email })
    .from(signInTokens)
    .innerJoin(members, eq(members.id, signInTokens.memberId))
    .where(usable(purpose, secret, now))
  return owner
}

/**
 * Uses a link up. One conditional UPDATE, so that of any number of simultaneous uses one succeeds.
 * @returns the member's id, or undefined when the link is unknown, used, replaced, too old, or was sent to an address
 *   that is no longer the member's
 */
async function redeemToken(tx: Transaction, purpose: TokenPurpose, secret: string, now: Date): Promise<string | undefined> {
  const [used] = await tx
    .update(signInTokens)
    .set({ usedAt: now })
    .from(members)
    .where(and(eq(members.id, signInTokens.memberId), usable(purpose, secret, now)))
    .returning({ memberId: signInTokens.memberId })
  return used?.memberId
}

function usable(purpose: TokenPurpose, secret: string, now: Date) {
  return and(
    eq(signInTokens.secretHash, hashOfSecret(secret)),
    eq(signInTokens.purpose, purpose),
    isNull(signInTokens.usedAt),
    sql`${signInTokens.expiresAt} > ${now.toISOString()}::timestamptz`,
    sql`lower(${signInTokens.email}) = lower(${members.email})`,
  )
}

/** What is kept of a secret. */
function hashOfSecret(secret: string): string {
  return createHash('sha256').update(secret).digest('hex')
}
