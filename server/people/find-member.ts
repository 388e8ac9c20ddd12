export { findMemberByEmail, memberById, ownMember }
export type { Member }

import { eq, sql } from 'drizzle-orm'
import type { ServiceContext, SignedIn } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { NotFoundError, SignInRequiredError } from '../errors.ts'

type Member = typeof members.$inferSelect
/** A member who can sign in. */
type MemberWithAddress = Member & { email: string; passwordHash: string }

async function findMemberByEmail(db: ServiceContext['db'], email: string): Promise<MemberWithAddress | undefined> {
  const [member] = await db.select().from(members).where(sql`lower(${members.email}) = lower(${email})`)
  return member as MemberWithAddress | undefined
}

/** @throws NotFoundError (404) */
async function memberById(db: ServiceContext['db'], id: string): Promise<Member> {
  const [member] = await db.select().from(members).where(eq(members.id, id))
  if (member === undefined) throw new NotFoundError('member', id)
  return member
}

/** The row of who is asking, who has signed in and so has an address and a password. */
async function ownMember(ctx: ServiceContext & { actor: SignedIn }): Promise<MemberWithAddress> {
  const member = await memberById(ctx.db, ctx.actor.id)
  if (member.email === null || member.passwordHash === null) throw new SignInRequiredError('see your page')
  return member as MemberWithAddress
}
