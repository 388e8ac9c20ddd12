export { resetPassword }

import { eq, sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { queueMail } from '../mail/outbox.ts'
import { byThemself, recordAudit } from '../records/audit.ts'
import { endSessionsOf } from './end-sessions.ts'
import { RedeemReset } from './inputs.ts'
import { linkNoLongerWorks } from './link-problem.ts'
import { resetPasswordMail } from './mails.ts'
import { parseInput } from './parse-input.ts'
import { requireGoodPassword } from './password-rules.ts'
import { findToken, invalidateTokens, redeemToken } from './tokens.ts'

/**
 * Sets a new password by the link from a mail. Ends all of the member's sessions and links and signs nobody in: whoever
 * only holds the link has yet to show that they know the password.
 * @throws ValidationError (422) for the password, or when the link does not work; TooManyRequestsError (429)
 */
async function resetPassword(ctx: ServiceContext, input: unknown): Promise<void> {
  const { token, password } = parseInput(RedeemReset, input)
  await ctx.rateLimits.take('token_address', ctx.address)
  // Looked at first without using it up, so that a password refused by the rules does not cost the link.
  const owner = await findToken(ctx.db, 'reset', token, ctx.clock())
  if (owner === undefined) throw linkNoLongerWorks('reset')
  requireGoodPassword(password, { ...owner, clubName: ctx.config.clubName })
  const passwordHash = await ctx.passwords.hash(password)
  await ctx.db.transaction(async (tx) => {
    const now = ctx.clock()
    const memberId = await redeemToken(tx, 'reset', token, now)
    if (memberId === undefined) throw linkNoLongerWorks('reset')
    await tx
      .update(members)
      // The link came by mail, so the address is theirs.
      .set({ passwordHash, emailVerifiedAt: sql`coalesce(${members.emailVerifiedAt}, ${now.toISOString()}::timestamptz)` })
      .where(eq(members.id, memberId))
    await invalidateTokens(tx, memberId, now)
    await endSessionsOf(tx, memberId)
    await queueMail(tx, resetPasswordMail(ctx.config, owner))
    await recordAudit({ ...ctx, db: tx }, { action: 'password.reset', ...byThemself(memberId) })
  })
  // Whoever was locked out by somebody else's guesses can sign in at once.
  await ctx.rateLimits.reset('sign_in_guesser', `${owner.email.toLowerCase()} ${ctx.address}`)
  await ctx.rateLimits.reset('sign_in_account', owner.email.toLowerCase())
  await ctx.rateLimits.reset('sign_in_in_a_row', owner.email.toLowerCase())
}
