export { changePassword }

import { and, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { AppError, ValidationError } from '../errors.ts'
import { queueMail } from '../mail/outbox.ts'
import { byThemself, recordAudit } from '../records/audit.ts'
import { endSessionsOf } from './end-sessions.ts'
import { ownMember } from './find-member.ts'
import { ChangePassword } from './inputs.ts'
import { changedPasswordMail } from './mails.ts'
import { parseInput } from './parse-input.ts'
import { requireGoodPassword } from './password-rules.ts'
import { requireSignedIn } from './permissions.ts'
import { invalidateTokens } from './tokens.ts'

/**
 * Changes the own password; needs the current one, since an open browser may have been left alone. All other sessions
 * end; the caller renews this one.
 * @throws AppError `wrong_password` (403), ValidationError (422), TooManyRequestsError (429), SignInRequiredError (401)
 */
async function changePassword(ctx: ServiceContext, input: unknown): Promise<void> {
  const { actor } = ctx
  requireSignedIn(actor, 'change your password')
  const { currentPassword, newPassword } = parseInput(ChangePassword, input)
  const member = await ownMember({ ...ctx, actor })
  requireGoodPassword(newPassword, { name: member.name, email: member.email, clubName: ctx.config.clubName }, 'newPassword')
  await ctx.rateLimits.take('password_change', actor.id)
  const { passwords } = ctx
  if (!(await passwords.matches(member.passwordHash, currentPassword))) {
    throw wrongPassword('Current password: that is not it.')
  }
  await ctx.rateLimits.reset('password_change', actor.id)
  if (newPassword.normalize('NFC') === currentPassword.normalize('NFC')) {
    const message = 'New password: that is the one you have.'
    throw new ValidationError(message, [{ field: 'newPassword', message }])
  }
  const passwordHash = await passwords.hash(newPassword)
  await ctx.db.transaction(async (tx) => {
    // Only over the hash that was just compared: a reset by mail that was committed meanwhile has to win.
    const changed = await tx
      .update(members)
      .set({ passwordHash })
      .where(and(eq(members.id, actor.id), eq(members.passwordHash, member.passwordHash)))
    if (changed.rowCount === 0) throw wrongPassword('Current password: it was changed somewhere else a moment ago.')
    await invalidateTokens(tx, actor.id, ctx.clock())
    await endSessionsOf(tx, actor.id, { except: actor.sessionId })
    await queueMail(tx, changedPasswordMail(ctx.config, member))
    await recordAudit({ ...ctx, db: tx }, { action: 'password.change', ...byThemself(actor.id) })
  })
}

function wrongPassword(message: string): AppError {
  return new AppError('wrong_password', 403, message, { fields: [{ field: 'currentPassword', message }] })
}
