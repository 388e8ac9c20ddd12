export { listEvidence }
export type { EvidenceRow }

import { and, desc, eq, inArray, sql } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { editions, effects, guides } from '../db/schema/index.ts'
import { effectColumns } from '../effects/effect-columns.ts'
import { markOf, titleOf } from '../guides/edition-columns.ts'
import type { FeelConditions } from '#shared/feel/fit.ts'
import type { Effect } from '#shared/schemas/effect.ts'
import { fitSql } from './fit-sql.ts'

/** One published effect behind a recommendation, with the guide that says it. */
interface EvidenceRow {
  effect: Effect
  fit: number
  guide: { slug: string; mark: string; title: string }
}

/** How many effects of an adjustable are told one by one; the sums are over all of them. */
const TOLD = 24

/** The effects of these adjustables that fit the reader, those that weigh most first, at most two dozen each. */
async function listEvidence(
  ctx: Pick<ServiceContext, 'db'>,
  adjustables: readonly string[],
  conditions: FeelConditions,
): Promise<Map<string, EvidenceRow[]>> {
  if (adjustables.length === 0) return new Map()
  const fit = fitSql(conditions)
  const place = sql<number>`row_number() over (partition by ${effects.adjustable} order by ${effects.strength} * (${fit}) desc, ${effects.id})`
  const best = ctx.db
    .select({ id: effects.id, fit: sql<number>`(${fit})`.mapWith(Number).as('fit'), place: place.as('place') })
    .from(effects)
    .where(and(inArray(effects.adjustable, [...adjustables]), sql`(${fit}) > 0`))
    .as('best')
  const rows = await ctx.db
    .select({
      effect: effectColumns,
      fit: best.fit,
      guide: { slug: guides.slug, chapter: guides.chapter, number: guides.number, title: titleOf(editions.content) },
    })
    .from(best)
    .innerJoin(effects, eq(effects.id, best.id))
    .innerJoin(guides, eq(guides.id, effects.guideId))
    .innerJoin(editions, eq(editions.id, effects.editionId))
    .where(sql`${best.place} <= ${TOLD}`)
    .orderBy(desc(sql`${effects.strength} * ${best.fit}`), guides.chapter, guides.number, effects.position)
  const told = new Map<string, EvidenceRow[]>()
  for (const { effect, fit: much, guide } of rows) {
    const list = told.get(effect.adjustable) ?? []
    told.set(effect.adjustable, list)
    list.push({ effect, fit: much, guide: { slug: guide.slug, mark: markOf(guide), title: guide.title } })
  }
  return told
}
