export { firstLooks, heatReports, heatReportTallies }

import { sql } from 'drizzle-orm'
import { check, index, integer, pgTable, primaryKey, text, timestamp, unique, uuid } from 'drizzle-orm/pg-core'
import { BITES, CAR_CLASSES, SURFACES, type Bite, type CarClass, type Surface } from '#shared/vocabulary/conditions.ts'
import type { Direction } from '#shared/vocabulary/effect-words.ts'
import { VERDICTS, type Verdict } from '#shared/vocabulary/verdicts.ts'
import { PHASES, type Phase } from '#shared/vocabulary/phases.ts'
import { QUALITIES, type Quality } from '#shared/vocabulary/qualities.ts'
import { adjustables } from './effects.ts'
import { members } from './people.ts'

const listed = (values: readonly string[]) => sql.raw(values.map((value) => `'${value}'`).join(', '))

/** What one member found when they tried a change under certain conditions; a second report replaces the first. */
const heatReports = pgTable(
  'heat_reports',
  {
    id: uuid().primaryKey().defaultRandom(),
    memberId: uuid()
      .notNull()
      .references(() => members.id),
    adjustable: text()
      .notNull()
      .references(() => adjustables.key),
    direction: text().notNull().$type<Direction>(),
    verdict: text().notNull().$type<Verdict>(),
    carClass: text().notNull().$type<CarClass>(),
    surface: text().notNull().$type<Surface>(),
    bite: text().notNull().$type<Bite>(),
    note: text().notNull().default(''),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    changedAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    /** Set when a moderator does not let it count; it stays readable, with the reason. */
    setAsideBy: uuid().references(() => members.id),
    setAsideWhy: text(),
  },
  (t) => [
    unique('heat_reports_once').on(t.memberId, t.adjustable, t.direction, t.carClass, t.surface, t.bite),
    check('heat_reports_direction', sql`${t.direction} in ('up', 'down')`),
    check('heat_reports_verdict', sql`${t.verdict} in (${listed(VERDICTS)})`),
    check('heat_reports_class', sql`${t.carClass} in (${listed(CAR_CLASSES)})`),
    check('heat_reports_surface', sql`${t.surface} in (${listed(SURFACES)})`),
    check('heat_reports_bite', sql`${t.bite} in (${listed(BITES)})`),
    check('heat_reports_note_length', sql`char_length(${t.note}) <= 300`),
    check('heat_reports_set_aside', sql`(${t.setAsideBy} is null) = (${t.setAsideWhy} is null)`),
    index('heat_reports_change').on(t.adjustable, t.direction, t.changedAt),
  ],
)

/**
 * The reports that count, added up for each change and condition. A trigger keeps it, so that by feel adds up a few
 * hundred rows instead of a million. Reports set aside and those of suspended members are not in it.
 */
const heatReportTallies = pgTable(
  'heat_report_tallies',
  {
    adjustable: text()
      .notNull()
      .references(() => adjustables.key),
    direction: text().notNull().$type<Direction>(),
    carClass: text().notNull().$type<CarClass>(),
    surface: text().notNull().$type<Surface>(),
    bite: text().notNull().$type<Bite>(),
    helped: integer().notNull().default(0),
    same: integer().notNull().default(0),
    worse: integer().notNull().default(0),
  },
  (t) => [
    primaryKey({ name: 'heat_report_tallies_pk', columns: [t.adjustable, t.direction, t.carClass, t.surface, t.bite] }),
    check('heat_report_tallies_counts', sql`${t.helped} >= 0 and ${t.same} >= 0 and ${t.worse} >= 0`),
  ],
)

/** Things to look at before anything is changed: worn parts imitate bad settings. */
const firstLooks = pgTable(
  'first_looks',
  {
    id: uuid().primaryKey().defaultRandom(),
    phase: text().notNull().$type<Phase>(),
    quality: text().notNull().$type<Quality>(),
    wants: text().notNull().$type<'more' | 'less'>(),
    position: integer().notNull(),
    says: text().notNull(),
    changedBy: uuid().references(() => members.id),
  },
  (t) => [
    unique('first_looks_position').on(t.phase, t.quality, t.wants, t.position),
    check('first_looks_phase', sql`${t.phase} in (${listed(PHASES)})`),
    check('first_looks_quality', sql`${t.quality} in (${listed(QUALITIES)})`),
    check('first_looks_wants', sql`${t.wants} in ('more', 'less')`),
    check('first_looks_length', sql`char_length(${t.says}) between 10 and 160`),
  ],
)
