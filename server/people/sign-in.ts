export { signIn }

import { and, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { AppError } from '../errors.ts'
import { byThemself, recordAudit } from '../records/audit.ts'
import { findMemberByEmail, type Member } from './find-member.ts'
import { SignIn } from './inputs.ts'
import { parseInput } from './parse-input.ts'
import { isWeaker } from './passwords.ts'

/**
 * Checks address and password. An unknown address takes as long and answers the same as a wrong password. The caller
 * starts the session.
 * @throws AppError `sign_in_failed` (401) or `suspended` (403), TooManyRequestsError (429), ValidationError (422)
 */
async function signIn(ctx: ServiceContext, input: unknown): Promise<Member> {
  const { email, password } = parseInput(SignIn, input)
  const account = email.toLowerCase()
  const guesser = `${account} ${ctx.address}`
  await ctx.rateLimits.check('sign_in_address', ctx.address)
  // Counted before the password is looked at, so that many guesses at once count as many; forgotten when it was right.
  await ctx.rateLimits.take('sign_in_guesser', guesser)
  await ctx.rateLimits.take('sign_in_account', account)
  await ctx.rateLimits.take('sign_in_in_a_row', account)
  const member = await findMemberByEmail(ctx.db, email)
  const { passwords } = ctx
  const matches = await passwords.matches(member?.passwordHash, password)
  if (member === undefined || !matches) {
    ctx.log.warn({ event: 'sign_in_failed', address: ctx.address }, 'wrong address or password')
    await ctx.rateLimits.take('sign_in_address', ctx.address)
    throw new AppError('sign_in_failed', 401, 'That e-mail address and that password do not go together.')
  }
  await ctx.rateLimits.reset('sign_in_guesser', guesser)
  await ctx.rateLimits.reset('sign_in_account', account)
  await ctx.rateLimits.reset('sign_in_in_a_row', account)
  if (member.status === 'suspended') {
    throw new AppError('suspended', 403, 'Your membership is suspended. Talk to the people who run your club.')
  }
  const signedIn = isWeaker(member.passwordHash) ? await renewHash(ctx, member, await passwords.hash(password)) : member
  await recordAudit(ctx, { action: 'session.start', ...byThemself(member.id) })
  ctx.log.info({ event: 'signed_in', member: member.id, address: ctx.address }, 'signed in')
  return signedIn
}

// Only over the hash that was just compared: the password may have been changed in between.
async function renewHash(ctx: ServiceContext, member: Member, passwordHash: string): Promise<Member> {
  const renewed = await ctx.db
    .update(members)
    .set({ passwordHash })
    .where(and(eq(members.id, member.id), eq(members.passwordHash, member.passwordHash ?? '')))
  return renewed.rowCount === 1 ? { ...member, passwordHash } : member
}
