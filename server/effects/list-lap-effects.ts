export { listLapEffects }
export type { LapEffect }

import { asc, desc, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { adjustables, editions, effects, guides } from '../db/schema/index.ts'
import { titleOf } from '../guides/edition-columns.ts'
import type { Phase } from '#shared/vocabulary/phases.ts'
import { adjustableColumns, effectRow, type EffectRow } from './adjustable-view.ts'
import { effectColumns } from './effect-columns.ts'

type LapEffect = EffectRow & { guide: { slug: string; mark: string; title: string } }

/** What the published guides say about one part of the lap, strongest first, then by quality and mark. */
async function listLapEffects(ctx: Pick<ServiceContext, 'db'>, phase: Phase): Promise<LapEffect[]> {
  const rows = await ctx.db
    .select({
      effect: effectColumns,
      adjustable: { name: adjustableColumns.name, up: adjustableColumns.up, down: adjustableColumns.down },
      guide: { slug: guides.slug, chapter: guides.chapter, number: guides.number, title: titleOf(editions.content) },
    })
    .from(effects)
    .innerJoin(adjustables, eq(adjustables.key, effects.adjustable))
    .innerJoin(guides, eq(guides.id, effects.guideId))
    .innerJoin(editions, eq(editions.id, effects.editionId))
    .where(eq(effects.phase, phase))
    .orderBy(desc(effects.strength), asc(effects.quality), asc(guides.chapter), asc(guides.number), asc(effects.position))
  return rows.map(({ effect, adjustable, guide }) => ({
    ...effectRow(effect, adjustable),
    guide: { slug: guide.slug, mark: `${guide.chapter}${guide.number}`, title: guide.title },
  }))
}
