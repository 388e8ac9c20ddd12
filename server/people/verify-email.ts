export { verifyEmail }

import { eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { byThemself, recordAudit } from '../records/audit.ts'
import { VerifyEmail } from './inputs.ts'
import { linkNoLongerWorks } from './link-problem.ts'
import { parseInput } from './parse-input.ts'
import { redeemToken } from './tokens.ts'

/**
 * Uses up the link from the mail: the address is confirmed and the member may write.
 * @throws ValidationError (422) when the link does not work, TooManyRequestsError (429)
 */
async function verifyEmail(ctx: ServiceContext, input: unknown): Promise<void> {
  const { token } = parseInput(VerifyEmail, input)
  await ctx.rateLimits.take('token_address', ctx.address)
  await ctx.db.transaction(async (tx) => {
    const memberId = await redeemToken(tx, 'verify', token, ctx.clock())
    if (memberId === undefined) throw linkNoLongerWorks('verify')
    await tx.update(members).set({ emailVerifiedAt: ctx.clock() }).where(eq(members.id, memberId))
    await recordAudit({ ...ctx, db: tx }, { action: 'member.verify', ...byThemself(memberId) })
  })
}
