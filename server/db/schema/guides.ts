export { chapters, editions, guides, slugRedirects }

import { sql } from 'drizzle-orm'
import {
  check, index, integer, jsonb, pgTable, text, timestamp, unique, uuid, type AnyPgColumn,
} from 'drizzle-orm/pg-core'
import type { ChangeSizes } from '#shared/editing/compare-guides.ts'
import type { GuideContent } from '#shared/schemas/guide-content.ts'
import type { RenderedPart } from '#shared/rendering/parts.ts'
import { members } from './people.ts'

const chapters = pgTable(
  'chapters',
  {
    letter: text().primaryKey(),
    name: text().notNull(),
    about: text().notNull(),
  },
  (t) => [check('chapters_letter', sql`${t.letter} ~ '^[A-Z]$'`)],
)

/** A guide's place in the book. What it says stands in its editions. */
const guides = pgTable(
  'guides',
  {
    id: uuid().primaryKey().defaultRandom(),
    slug: text().notNull().unique(),
    chapter: text()
      .notNull()
      .references(() => chapters.letter),
    number: integer().notNull(),
    publishedEditionId: uuid().references((): AnyPgColumn => editions.id),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (t) => [
    unique('guides_mark').on(t.chapter, t.number),
    check('guides_number', sql`${t.number} between 1 and 999`),
    check('guides_slug', sql`${t.slug} ~ '^[a-z0-9]+(-[a-z0-9]+)*$' and char_length(${t.slug}) <= 90`),
  ],
)

/** One published state of a guide. A trigger refuses to change or delete it; only its rendering may be renewed. */
const editions = pgTable(
  'editions',
  {
    id: uuid().primaryKey().defaultRandom(),
    guideId: uuid()
      .notNull()
      .references((): AnyPgColumn => guides.id),
    number: integer().notNull(),
    content: jsonb().notNull().$type<GuideContent>(),
    html: text().notNull(),
    parts: jsonb().notNull().$type<RenderedPart[]>(),
    rendererVersion: integer().notNull(),
    authorId: uuid()
      .notNull()
      .references(() => members.id),
    approverId: uuid()
      .notNull()
      .references(() => members.id),
    /** The edit this edition came from; unique, so that no edit can be published twice. Null for the first stock. */
    editId: uuid(),
    summary: text().notNull(),
    /** How much it changes against the edition before it, counted once; empty in editions from before this was kept. */
    changes: jsonb().notNull().default({}).$type<Partial<ChangeSizes>>(),
    publishedAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (t) => [
    unique('editions_number').on(t.guideId, t.number),
    unique('editions_edit').on(t.editId),
    unique('editions_guide_and_id').on(t.guideId, t.id),
    check('editions_number_positive', sql`${t.number} >= 1`),
    check('editions_not_own_approver', sql`${t.authorId} <> ${t.approverId}`),
    index('editions_published').on(t.publishedAt),
    index('editions_author').on(t.authorId),
  ],
)

/** Addresses that a guide once had. */
const slugRedirects = pgTable('slug_redirects', {
  slug: text().primaryKey(),
  guideId: uuid()
    .notNull()
    .references(() => guides.id),
})
