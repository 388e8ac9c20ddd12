export { listMembers }
export type { MemberRow }

import { sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { requirePermission } from './permissions.ts'
import type { MemberRole } from '#shared/vocabulary/roles.ts'

interface MemberRow {
  id: string
  name: string
  role: MemberRole
  status: 'active' | 'suspended'
  verified: boolean
  /** Members who are only named as writers cannot sign in. */
  canSignIn: boolean
  joinedAt: string
}

const PAGE_SIZE = 50

/** Everyone in the book, by name, fifty a page. @throws ForbiddenError (403) for all but admins */
async function listMembers(ctx: ServiceContext, page = 1): Promise<{ members: MemberRow[]; page: number; pages: number }> {
  requirePermission(ctx.actor, 'member.list')
  const total = await ctx.db.$count(members)
  const pages = Math.max(1, Math.ceil(total / PAGE_SIZE))
  const shown = Math.min(Math.max(1, Math.trunc(page) || 1), pages)
  const rows = await ctx.db
    .select({
      id: members.id,
      name: members.name,
      role: members.role,
      status: members.status,
      verified: sql<boolean>`${members.emailVerifiedAt} is not null`,
      canSignIn: sql<boolean>`${members.passwordHash} is not null`,
      joinedAt: members.createdAt,
    })
    .from(members)
    .orderBy(members.name, members.id)
    .limit(PAGE_SIZE)
    .offset((shown - 1) * PAGE_SIZE)
  return { members: rows.map((row) => ({ ...row, joinedAt: row.joinedAt.toISOString() })), page: shown, pages }
}
