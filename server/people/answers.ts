export { EndedAnswer, MemberChangedAnswer, MembersAnswer, MessageAnswer, SessionAnswer, SessionsAnswer, SignedInAnswer, SignedInMember }

import { z } from 'zod'
import { MEMBER_ROLES } from '#shared/vocabulary/roles.ts'
import type { MemberRow } from './list-members.ts'
import type { OwnSession } from './own-sessions.ts'

/** What the API answers about people; the services' types are checked against it. */

const role = z.enum(MEMBER_ROLES)
const status = z.enum(['active', 'suspended'])

const MessageAnswer = z.object({ message: z.string().describe('What to tell the person; the same whether or not the address is known.') })

const SignedInMember = z.object({
  id: z.uuid(),
  name: z.string(),
  role,
  verified: z.boolean().describe('Whether the e-mail address is confirmed; writing needs that.'),
})

const SessionAnswer = z.object({ member: SignedInMember.nullable().describe('null when nobody is signed in.') })

const SignedInAnswer = z.object({ member: SignedInMember })

const SessionsAnswer = z.object({
  sessions: z.array(
    z.object({
      handle: z.string().describe('Names the session; useless as a cookie.'),
      device: z.string(),
      startedAt: z.iso.datetime(),
      lastSeenAt: z.iso.datetime(),
      isThisOne: z.boolean(),
    }) satisfies z.ZodType<OwnSession>,
  ),
})

const EndedAnswer = z.object({ ended: z.int().describe('How many sessions were ended.') })

const MembersAnswer = z.object({
  members: z.array(
    z.object({
      id: z.uuid(),
      name: z.string(),
      role,
      status,
      verified: z.boolean(),
      canSignIn: z.boolean().describe('Members who are only named as writers cannot sign in.'),
      joinedAt: z.iso.datetime(),
    }) satisfies z.ZodType<MemberRow>,
  ),
  page: z.int(),
  pages: z.int(),
})

const MemberChangedAnswer = z.object({ id: z.uuid(), name: z.string(), role, status })
