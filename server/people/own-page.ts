export { readOwnPage }
export type { OwnPage }

import type { ServiceContext } from '../context.ts'
import { ownMember } from './find-member.ts'
import { listOwnSessions, type OwnSession } from './own-sessions.ts'
import { requireSignedIn } from './permissions.ts'
import type { MemberRole } from '#shared/vocabulary/roles.ts'

interface OwnPage {
  name: string
  email: string
  role: MemberRole
  verified: boolean
  joinedAt: string
  sessions: OwnSession[]
}

/** What a person sees about themself, and nobody else does. @throws SignInRequiredError (401) */
async function readOwnPage(ctx: ServiceContext): Promise<OwnPage> {
  const { actor } = ctx
  requireSignedIn(actor, 'see your page')
  const member = await ownMember({ ...ctx, actor })
  return {
    name: member.name,
    email: member.email,
    role: member.role,
    verified: member.emailVerifiedAt !== null,
    joinedAt: member.createdAt.toISOString(),
    sessions: await listOwnSessions(ctx),
  }
}
