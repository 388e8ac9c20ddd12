export { auditEntries, idempotencyKeys, outbox, rateLimits }

import { sql } from 'drizzle-orm'
import {
  bigint, bigserial, check, index, integer, jsonb, pgTable, primaryKey, text, timestamp, unique, uuid,
} from 'drizzle-orm/pg-core'
import { members } from './people.ts'

/** Who did what to which thing, append-only (a trigger refuses change and deletion). */
const auditEntries = pgTable(
  'audit_entries',
  {
    id: bigserial({ mode: 'number' }).primaryKey(),
    at: timestamp({ withTimezone: true }).notNull().defaultNow(),
    actorId: uuid().references(() => members.id),
    action: text().notNull(),
    subjectKind: text().notNull(),
    subjectId: text().notNull(),
    details: jsonb().notNull().default({}).$type<Record<string, unknown>>(),
  },
  (t) => [
    index('audit_entries_subject').on(t.subjectKind, t.subjectId, t.id),
    index('audit_entries_actor').on(t.actorId, t.id),
    check('audit_entries_action', sql`${t.action} ~ '^[a-z_]+\\.[a-z_]+$'`),
  ],
)

/** Mail, written in the same transaction as its cause and sent by the worker. */
const outbox = pgTable(
  'outbox',
  {
    id: uuid().primaryKey().defaultRandom(),
    recipient: text().notNull(),
    subject: text().notNull(),
    body: text().notNull(),
    messageId: text().notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    attempts: integer().notNull().default(0),
    nextAttemptAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    sentAt: timestamp({ withTimezone: true }),
    deadAt: timestamp({ withTimezone: true }),
    lastError: text().notNull().default(''),
  },
  (t) => [
    unique('outbox_message_id').on(t.messageId),
    check('outbox_one_line', sql`${t.recipient} !~ '[\\r\\n]' and ${t.subject} !~ '[\\r\\n]'`),
    check('outbox_sent_or_dead', sql`${t.sentAt} is null or ${t.deadAt} is null`),
    index('outbox_waiting').on(t.nextAttemptAt).where(sql`sent_at is null and dead_at is null`),
  ],
)

/** Answers already given, so that a request sent twice acts once; kept for 24 hours. */
const idempotencyKeys = pgTable(
  'idempotency_keys',
  {
    memberId: uuid()
      .notNull()
      .references(() => members.id, { onDelete: 'cascade' }),
    key: text().notNull(),
    requestHash: text().notNull(),
    /** Null while the first request is still running. */
    status: integer(),
    body: jsonb(),
    headers: jsonb().$type<Record<string, string>>(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'idempotency_keys_pkey', columns: [t.memberId, t.key] }),
    check('idempotency_keys_key', sql`char_length(${t.key}) between 8 and 200`),
  ],
)

/** The counters of rate-limiter-flexible, shared by all nodes. */
const rateLimits = pgTable('rate_limits', {
  key: text().primaryKey(),
  points: integer().notNull().default(0),
  expire: bigint({ mode: 'number' }),
})
