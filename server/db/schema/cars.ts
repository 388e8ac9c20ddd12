export { cars }

import { sql } from 'drizzle-orm'
import { boolean, check, integer, jsonb, pgTable, primaryKey, text, timestamp, unique, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import type { CarValues } from '#shared/cars/car-values.ts'
import type { CarClass } from '#shared/vocabulary/conditions.ts'
import { members } from './people.ts'

/**
 * Members' own cars. The id is made in the browser, before there is an account to keep the car in; so it is unique only
 * among the cars of one member, and nobody can get into another's way by using theirs.
 */
const cars = pgTable(
  'cars',
  {
    memberId: uuid()
      .notNull()
      .references(() => members.id, { onDelete: 'cascade' }),
    id: uuid().notNull(),
    name: text().notNull(),
    carClass: text().$type<CarClass>(),
    values: jsonb().notNull().$type<CarValues>(),
    /** The one that calculators start from. */
    chosen: boolean().notNull().default(false),
    /** Rises by one with every change of name, class or values; carried as the ETag. */
    version: integer().notNull().default(1),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    updatedAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'cars_key', columns: [t.memberId, t.id] }),
    unique('cars_one_of_a_name').on(t.memberId, t.name),
    uniqueIndex('cars_one_chosen').on(t.memberId).where(sql`${t.chosen}`),
    check('cars_name_length', sql`char_length(${t.name}) between 1 and 60`),
    check('cars_class', sql`${t.carClass} ~ '^[a-z0-9_]{1,40}$'`),
    check('cars_values_object', sql`jsonb_typeof(${t.values}) = 'object'`),
    check('cars_values_size', sql`octet_length(${t.values}::text) <= 16384`),
    check('cars_version', sql`${t.version} >= 1`),
  ],
)
