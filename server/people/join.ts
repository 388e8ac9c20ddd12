export { join }

import type { ServiceContext } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { queueMail } from '../mail/outbox.ts'
import { byThemself, recordAudit } from '../records/audit.ts'
import { evenAnswer } from './even-answer.ts'
import { findMemberByEmail } from './find-member.ts'
import { Join } from './inputs.ts'
import { takeMailLimits } from './mail-limits.ts'
import { alreadyJoinedMail, verifyMail } from './mails.ts'
import { parseInput } from './parse-input.ts'
import { requireGoodPassword } from './password-rules.ts'
import { issueToken } from './tokens.ts'

// A hash takes about 60 ms and the rows about 10; with the queue of hashes in front of it this still covers both ways.
const ANSWER_AFTER_MS = 400

/**
 * A visitor joins. The answer is the same whether or not the address is in the book already; which of the two it was
 * is only said in the mail to that address.
 * @throws ValidationError (422), TooManyRequestsError (429)
 */
async function join(ctx: ServiceContext, input: unknown): Promise<void> {
  const { name, email, password } = parseInput(Join, input)
  requireGoodPassword(password, { name, email, clubName: ctx.config.clubName })
  await ctx.rateLimits.take('join_address', ctx.address)
  await takeMailLimits(ctx, email)
  await evenAnswer(ANSWER_AFTER_MS, async () => {
    const passwordHash = await ctx.passwords.hash(password)
    await ctx.db.transaction(async (tx) => {
      // One statement decides whether the address is new, so that two people joining with it at once become one member.
      const [member] = await tx
        .insert(members)
        .values({ name, email, passwordHash })
        .onConflictDoNothing()
        .returning({ id: members.id })
      if (member === undefined) {
        const known = await findMemberByEmail(tx, email)
        if (known !== undefined) await queueMail(tx, alreadyJoinedMail(ctx.config, known))
        return
      }
      const secret = await issueToken(tx, { id: member.id, email }, 'verify', ctx.clock())
      await queueMail(tx, verifyMail(ctx.config, email, secret))
      await recordAudit({ ...ctx, db: tx }, { action: 'member.join', ...byThemself(member.id) })
    })
  })
}
