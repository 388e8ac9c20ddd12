export { adjustables, effects }

import { sql } from 'drizzle-orm'
import { boolean, check, doublePrecision, index, integer, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core'
import type { Axle } from '#shared/vocabulary/axles.ts'
import type { Bite, CarClass, Surface } from '#shared/vocabulary/conditions.ts'
import type { Basis, Change, Direction, Strength } from '#shared/vocabulary/effect-words.ts'
import { PHASES, type Phase } from '#shared/vocabulary/phases.ts'
import { QUALITIES, type Quality } from '#shared/vocabulary/qualities.ts'
import { BITES, CAR_CLASSES, SURFACES } from '#shared/vocabulary/conditions.ts'
import { editions, guides } from './guides.ts'
import { members } from './people.ts'

/** A thing on the car that can be set. */
const adjustables = pgTable(
  'adjustables',
  {
    key: text().primaryKey(),
    name: text().notNull(),
    axle: text().notNull().$type<Axle>(),
    unit: text().notNull(),
    upName: text().notNull(),
    downName: text().notNull(),
    /** The usual small step, in `unit`. */
    smallStep: doublePrecision().notNull(),
    minutes: integer().notNull(),
    tools: text().array().notNull(),
    opensCar: boolean().notNull(),
    guideSlug: text(),
    about: text().notNull(),
    changedBy: uuid().references(() => members.id),
  },
  (t) => [
    check('adjustables_key', sql`${t.key} ~ '^[a-z][a-z0-9_]{1,39}$'`),
    check('adjustables_axle', sql`${t.axle} in ('front', 'centre', 'rear', 'whole')`),
    check('adjustables_step', sql`${t.smallStep} > 0`),
    check('adjustables_minutes', sql`${t.minutes} between 0 and 600`),
  ],
)

const listed = (values: readonly string[]) => sql.raw(values.map((value) => `'${value}'`).join(', '))
const arrayOf = (values: readonly string[]) => sql.raw(`array[${values.map((value) => `'${value}'`).join(', ')}]::text[]`)

/** The effects of published editions, one row each: a projection, replaced whole when an edition is published. */
const effects = pgTable(
  'effects',
  {
    id: uuid().primaryKey().defaultRandom(),
    guideId: uuid()
      .notNull()
      .references(() => guides.id),
    editionId: uuid()
      .notNull()
      .references(() => editions.id),
    position: integer().notNull(),
    adjustable: text()
      .notNull()
      .references(() => adjustables.key),
    direction: text().notNull().$type<Direction>(),
    phase: text().notNull().$type<Phase>(),
    quality: text().notNull().$type<Quality>(),
    change: text().notNull().$type<Change>(),
    strength: integer().notNull().$type<Strength>(),
    surfaces: text().array().notNull().$type<Surface[]>(),
    bites: text().array().notNull().$type<Bite[]>(),
    carClasses: text().array().notNull().$type<CarClass[]>(),
    mirrors: boolean().notNull(),
    basis: text().notNull().$type<Basis>(),
    note: text().notNull(),
  },
  (t) => [
    unique('effects_position').on(t.guideId, t.position),
    check('effects_direction', sql`${t.direction} in ('up', 'down')`),
    check('effects_phase', sql`${t.phase} in (${listed(PHASES)})`),
    check('effects_quality', sql`${t.quality} in (${listed(QUALITIES)})`),
    check('effects_change', sql`${t.change} in ('more', 'less')`),
    check('effects_strength', sql`${t.strength} between 1 and 3`),
    check('effects_basis', sql`${t.basis} in ('physics', 'common_practice', 'reported')`),
    check('effects_surfaces', sql`${t.surfaces} <@ ${arrayOf(SURFACES)}`),
    check('effects_bites', sql`${t.bites} <@ ${arrayOf(BITES)}`),
    check('effects_classes', sql`${t.carClasses} <@ ${arrayOf(CAR_CLASSES)}`),
    index('effects_lap').on(t.phase, t.quality),
    index('effects_adjustable').on(t.adjustable, t.direction),
  ],
)
