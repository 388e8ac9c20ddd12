export { members, sessions, signInTokens }

import { sql } from 'drizzle-orm'
import { check, index, json, pgTable, text, timestamp, unique, uniqueIndex, uuid } from 'drizzle-orm/pg-core'

/**
 * Everyone who has ever written or joined. A member without `email` and `passwordHash` is named as an author but cannot
 * sign in (the writers of the book that a new installation starts with).
 */
const members = pgTable(
  'members',
  {
    id: uuid().primaryKey().defaultRandom(),
    key: text().unique(),
    name: text().notNull(),
    email: text(),
    passwordHash: text(),
    role: text().notNull().default('member').$type<'member' | 'moderator' | 'admin'>(),
    status: text().notNull().default('active').$type<'active' | 'suspended'>(),
    about: text().notNull().default(''),
    emailVerifiedAt: timestamp({ withTimezone: true }),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (t) => [
    uniqueIndex('members_email_lower').on(sql`lower(${t.email})`),
    check('members_role', sql`${t.role} in ('member', 'moderator', 'admin')`),
    check('members_status', sql`${t.status} in ('active', 'suspended')`),
    check('members_name_length', sql`char_length(${t.name}) between 2 and 60`),
    check('members_email_length', sql`char_length(${t.email}) between 3 and 254`),
    check('members_can_sign_in', sql`(${t.email} is null) = (${t.passwordHash} is null)`),
  ],
)

/** The table that connect-pg-simple keeps, with the member beside the sealed session so that all of one's can be ended. */
const sessions = pgTable(
  'sessions',
  {
    sid: text().primaryKey(),
    sess: json().notNull(),
    expire: timestamp({ precision: 6 }).notNull(),
    memberId: uuid().generatedAlwaysAs(sql`((sess ->> 'memberId')::uuid)`),
  },
  (t) => [index('sessions_expire').on(t.expire), index('sessions_member').on(t.memberId)],
)

/** One-time links in mail. Only the SHA-256 of the secret is kept, bound to the address it was sent to. */
const signInTokens = pgTable(
  'sign_in_tokens',
  {
    id: uuid().primaryKey().defaultRandom(),
    memberId: uuid()
      .notNull()
      .references(() => members.id, { onDelete: 'cascade' }),
    purpose: text().notNull().$type<'verify' | 'reset'>(),
    email: text().notNull(),
    secretHash: text().notNull(),
    expiresAt: timestamp({ withTimezone: true }).notNull(),
    usedAt: timestamp({ withTimezone: true }),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (t) => [
    unique('sign_in_tokens_secret').on(t.secretHash),
    index('sign_in_tokens_member').on(t.memberId, t.purpose),
    check('sign_in_tokens_purpose', sql`${t.purpose} in ('verify', 'reset')`),
  ],
)
