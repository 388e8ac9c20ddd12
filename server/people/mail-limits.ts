export { takeMailLimits }

import type { ServiceContext } from '../context.ts'

/**
 * Counts one asked-for mail, against the asker's network and the address it goes to, so that nobody can fill somebody
 * else's mailbox. Counts for unknown addresses just the same.
 * @throws TooManyRequestsError (429)
 */
async function takeMailLimits(ctx: Pick<ServiceContext, 'address' | 'rateLimits'>, email: string): Promise<void> {
  const account = email.toLowerCase()
  await ctx.rateLimits.take('mail_address', ctx.address)
  await ctx.rateLimits.take('mail_account', account)
  await ctx.rateLimits.take('mail_account_day', account)
}
