export { makeAdmin }

import { randomBytes } from 'node:crypto'
import { eq } from 'drizzle-orm'
import type { App } from '../context.ts'
import { visitor } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { queueMail } from '../mail/outbox.ts'
import { recordAudit } from '../records/audit.ts'
import { endSessionsOf } from './end-sessions.ts'
import { findMemberByEmail } from './find-member.ts'
import { EmailAddress, MemberName } from './inputs.ts'
import { firstAdminMail } from './mails.ts'
import { parseInput } from './parse-input.ts'
import { createPasswords } from './passwords.ts'
import { invalidateTokens, issueToken } from './tokens.ts'

/**
 * Makes someone an admin from the command line: the way to the first admin, since there is no account to begin with.
 * Whoever has the address already keeps their name and nothing else: anybody may have joined with it, so their password,
 * sessions and links end here, and the address counts as confirmed only when the link sent to it is used.
 * @returns the one-time link to set a password, also sent by mail
 * @throws ValidationError when name or address is none
 */
async function makeAdmin(
  app: Pick<App, 'clock' | 'config' | 'db'>,
  input: { name: string; email: string },
): Promise<string> {
  const name = parseInput(MemberName, input.name)
  const email = parseInput(EmailAddress, input.email)
  // Nobody knows this password; the link sets another.
  const passwordHash = await createPasswords().hash(randomBytes(32).toString('base64url'))
  return app.db.transaction(async (tx) => {
    await tx.insert(members).values({ name, email, passwordHash, role: 'admin' }).onConflictDoNothing()
    const member = await findMemberByEmail(tx, email)
    if (member === undefined) throw new Error(`The member with ${email} vanished meanwhile; try again.`)
    await tx
      .update(members)
      .set({ role: 'admin', status: 'active', passwordHash, emailVerifiedAt: null })
      .where(eq(members.id, member.id))
    await endSessionsOf(tx, member.id)
    await invalidateTokens(tx, member.id, app.clock())
    const secret = await issueToken(tx, member, 'reset', app.clock())
    await queueMail(tx, firstAdminMail(app.config, member, secret))
    await recordAudit({ db: tx, actor: visitor }, { action: 'member.make_admin', subjectKind: 'member', subjectId: member.id })
    return `${app.config.origin}/reset?token=${secret}`
  })
}
