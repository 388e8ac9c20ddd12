export { glossaryTerms, wantedGuides }

import { sql } from 'drizzle-orm'
import { check, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core'
import { chapters } from './guides.ts'

const glossaryTerms = pgTable(
  'glossary_terms',
  {
    key: text().primaryKey(),
    term: text().notNull(),
    /** One sentence, shown in place. */
    short: text().notNull(),
    long: text().notNull().default(''),
    /** The standard that defines the term, where one does. */
    standard: text().notNull().default(''),
  },
  (t) => [check('glossary_terms_key', sql`${t.key} ~ '^[a-z0-9]+(-[a-z0-9]+)*$'`)],
)

/** Guides that the book still lacks, shown on the front page and on chapter pages. */
const wantedGuides = pgTable(
  'wanted_guides',
  {
    id: uuid().primaryKey().defaultRandom(),
    chapter: text()
      .notNull()
      .references(() => chapters.letter),
    title: text().notNull(),
    why: text().notNull(),
  },
  (t) => [unique('wanted_guides_title').on(t.title)],
)
