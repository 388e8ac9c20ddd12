export { askForReset }

import type { ServiceContext } from '../context.ts'
import { queueMail } from '../mail/outbox.ts'
import { byThemself, recordAudit } from '../records/audit.ts'
import { evenAnswer } from './even-answer.ts'
import { findMemberByEmail } from './find-member.ts'
import { AskForReset } from './inputs.ts'
import { takeMailLimits } from './mail-limits.ts'
import { resetMail } from './mails.ts'
import { parseInput } from './parse-input.ts'
import { issueToken } from './tokens.ts'

const ANSWER_AFTER_MS = 150

/**
 * Sends a link to set a new password, if the address is in the book; the answer does not say whether it is.
 * @throws ValidationError (422), TooManyRequestsError (429)
 */
async function askForReset(ctx: ServiceContext, input: unknown): Promise<void> {
  const { email } = parseInput(AskForReset, input)
  await takeMailLimits(ctx, email)
  await evenAnswer(ANSWER_AFTER_MS, () =>
    ctx.db.transaction(async (tx) => {
      const member = await findMemberByEmail(tx, email)
      if (member === undefined) return
      const secret = await issueToken(tx, member, 'reset', ctx.clock())
      await queueMail(tx, resetMail(ctx.config, member, secret))
      await recordAudit({ ...ctx, db: tx }, { action: 'password.ask_reset', ...byThemself(member.id) })
    }),
  )
}
