export { weighEffects }

import { sql, type SQL } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { effects } from '../db/schema/index.ts'
import type { FeelConditions } from '#shared/feel/fit.ts'
import type { WeighedEffect } from '#shared/feel/rank-changes.ts'
import { fitSql } from './fit-sql.ts'

/**
 * The published effects that fit the reader, alike ones added up in the database, so that a large book costs the server
 * no more than a small one: at most a row for each change, part of the lap, quality and basis.
 */
async function weighEffects(ctx: Pick<ServiceContext, 'db'>, conditions: FeelConditions): Promise<WeighedEffect[]> {
  const fit = fitSql(conditions)
  const weight: SQL<number> = sql`sum(${effects.strength} * (${fit}))::float8`.mapWith(Number)
  const alike = {
    adjustable: effects.adjustable,
    direction: effects.direction,
    phase: effects.phase,
    quality: effects.quality,
    change: effects.change,
    basis: effects.basis,
    mirrors: effects.mirrors,
  }
  return ctx.db
    .select({ ...alike, weight })
    .from(effects)
    .where(sql`(${fit}) > 0`)
    .groupBy(...Object.values(alike))
}
