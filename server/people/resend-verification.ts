export { resendVerification }

import type { ServiceContext } from '../context.ts'
import { queueMail } from '../mail/outbox.ts'
import { evenAnswer } from './even-answer.ts'
import { findMemberByEmail } from './find-member.ts'
import { ResendVerification } from './inputs.ts'
import { verifyMail } from './mails.ts'
import { takeMailLimits } from './mail-limits.ts'
import { parseInput } from './parse-input.ts'
import { issueToken } from './tokens.ts'

const ANSWER_AFTER_MS = 150

/**
 * Sends the confirming mail again. Does nothing, with the same answer, for an unknown address or one that is confirmed.
 * @throws ValidationError (422), TooManyRequestsError (429)
 */
async function resendVerification(ctx: ServiceContext, input: unknown): Promise<void> {
  const { email } = parseInput(ResendVerification, input)
  await takeMailLimits(ctx, email)
  await evenAnswer(ANSWER_AFTER_MS, () =>
    ctx.db.transaction(async (tx) => {
      const member = await findMemberByEmail(tx, email)
      if (member === undefined || member.emailVerifiedAt !== null) return
      const secret = await issueToken(tx, member, 'verify', ctx.clock())
      await queueMail(tx, verifyMail(ctx.config, member.email, secret))
    }),
  )
}
