export { editNotes, edits, reviews }

import { sql } from 'drizzle-orm'
import {
  check, foreignKey, index, integer, jsonb, pgTable, text, timestamp, unique, uniqueIndex, uuid,
} from 'drizzle-orm/pg-core'
import type { ChangeSizes } from '#shared/editing/compare-guides.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import type { EditState } from '#shared/vocabulary/edit-states.ts'
import { chapters, editions, guides } from './guides.ts'
import { members } from './people.ts'

/** A member's proposed change to a guide, or a proposed new guide. */
const edits = pgTable(
  'edits',
  {
    id: uuid().primaryKey().defaultRandom(),
    /** Null while the edit proposes a new guide. */
    guideId: uuid().references(() => guides.id),
    baseEditionId: uuid(),
    /** For a new guide: the chapter it is meant for. */
    chapter: text().references(() => chapters.letter),
    authorId: uuid()
      .notNull()
      .references(() => members.id),
    content: jsonb().notNull().$type<GuideDraft>(),
    summary: text().notNull().default(''),
    state: text().notNull().default('draft').$type<EditState>(),
    /** Rises by one with every change of content or state; carried as the ETag. */
    version: integer().notNull().default(1),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    updatedAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    sentAt: timestamp({ withTimezone: true }),
    /** How much it changes against its base, counted when it is handed in; null while it is being written. */
    changes: jsonb().$type<ChangeSizes>(),
    /** The wanted guide it was begun from. No key: a wish that was granted is gone, and then this means nothing. */
    wantedId: uuid(),
  },
  (t) => [
    foreignKey({
      name: 'edits_base_of_same_guide',
      columns: [t.guideId, t.baseEditionId],
      foreignColumns: [editions.guideId, editions.id],
    }),
    check('edits_guide_or_new', sql`(${t.guideId} is null) = (${t.baseEditionId} is null)`),
    check('edits_new_has_chapter', sql`${t.guideId} is not null or ${t.chapter} is not null`),
    check(
      'edits_state',
      sql`${t.state} in ('draft', 'in_review', 'changes_asked', 'approved', 'declined', 'withdrawn')`,
    ),
    check('edits_sent_has_summary', sql`${t.state} in ('draft', 'withdrawn') or char_length(${t.summary}) >= 3`),
    check('edits_version', sql`${t.version} >= 1`),
    uniqueIndex('edits_one_open_for_each_writer')
      .on(t.authorId, t.guideId)
      .where(sql`${t.state} in ('draft', 'in_review', 'changes_asked') and ${t.guideId} is not null`),
    index('edits_queue').on(t.state, t.sentAt),
    index('edits_author').on(t.authorId, t.updatedAt),
    index('edits_guide').on(t.guideId),
  ],
)

/** A moderator's decision on one version of an edit. */
const reviews = pgTable(
  'reviews',
  {
    id: uuid().primaryKey().defaultRandom(),
    editId: uuid()
      .notNull()
      .references(() => edits.id),
    editVersion: integer().notNull(),
    reviewerId: uuid()
      .notNull()
      .references(() => members.id),
    decision: text().notNull().$type<'approve' | 'ask' | 'decline'>(),
    reason: text().notNull().default(''),
    decidedAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (t) => [
    unique('reviews_once_a_version').on(t.editId, t.editVersion),
    check('reviews_decision', sql`${t.decision} in ('approve', 'ask', 'decline')`),
    check('reviews_reason', sql`${t.decision} = 'approve' or char_length(${t.reason}) >= 3`),
  ],
)

/** What author and moderators write to each other about an edit. */
const editNotes = pgTable(
  'edit_notes',
  {
    id: uuid().primaryKey().defaultRandom(),
    editId: uuid()
      .notNull()
      .references(() => edits.id),
    authorId: uuid()
      .notNull()
      .references(() => members.id),
    text: text().notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (t) => [
    index('edit_notes_edit').on(t.editId, t.createdAt),
    check('edit_notes_length', sql`char_length(${t.text}) between 1 and 2000`),
  ],
)
