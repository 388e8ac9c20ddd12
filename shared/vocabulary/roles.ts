export { MEMBER_ROLES, roleNames, roleAtLeast }
export type { MemberRole, Role }

/** Roles a signed-in person can hold, each holding every right of those before it. */
const MEMBER_ROLES = ['member', 'moderator', 'admin'] as const
type MemberRole = (typeof MEMBER_ROLES)[number]
type Role = 'visitor' | MemberRole

const roleNames: Record<Role, string> = {
  visitor: 'Visitor',
  member: 'Member',
  moderator: 'Moderator',
  admin: 'Admin',
}

function roleAtLeast(role: Role, least: MemberRole): boolean {
  return role !== 'visitor' && MEMBER_ROLES.indexOf(role) >= MEMBER_ROLES.indexOf(least)
}
