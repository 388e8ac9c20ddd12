export { fitSql }

import { sql, type Column, type SQL } from 'drizzle-orm'
import { effects } from '../db/schema/index.ts'
import { feelWeights } from '#shared/feel/weights.ts'
import type { FeelConditions } from '#shared/feel/fit.ts'

/** `fitOf` (shared/feel/fit.ts) as an expression over a row of effects; a test holds the two together. */
function fitSql({ carClass, surface, bite }: FeelConditions): SQL {
  return sql.join(
    [sql`1.0::float8`, one(effects.surfaces, surface), one(effects.bites, bite), one(effects.carClasses, carClass)].filter((part) => part !== undefined),
    sql` * `,
  )
}

function one(named: Column, reader: string | undefined): SQL | undefined {
  if (reader === undefined) return undefined
  return sql`case when ${named} = '{}' then ${feelWeights.silentFit}::float8 when ${named} @> array[${reader}]::text[] then ${feelWeights.namedFit}::float8 else 0 end`
}
