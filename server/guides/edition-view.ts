export { editionView }

import type { ServiceContext } from '../context.ts'
import { effectRow, findAdjustables } from '../effects/index.ts'
import type { Effect } from '#shared/schemas/effect.ts'
import { markOf } from './edition-columns.ts'
import type { EditionRow } from './edition-query.ts'
import { headingsOf } from './headings.ts'
import type { GuideView } from './views.ts'

/** Puts an edition together for its page: one more statement, for the words of what its effects and its text speak of. */
async function editionView(ctx: Pick<ServiceContext, 'db'>, row: EditionRow, effects: readonly Effect[]): Promise<GuideView> {
  const named = row.parts.flatMap((part) => (part.kind === 'effects' ? [part.adjustable] : []))
  const adjustables = await findAdjustables(ctx, [...effects.map((effect) => effect.adjustable), ...named])
  const byKey = new Map(adjustables.map((adjustable) => [adjustable.key, adjustable]))
  return {
    ...row.content,
    id: row.guideId,
    slug: row.slug,
    mark: markOf({ chapter: row.chapter.letter, number: row.number }),
    number: row.number,
    chapter: row.chapter,
    html: row.html,
    parts: row.parts,
    headings: headingsOf(row.html),
    effects: effects.map((effect) => effectRow(effect, byKey.get(effect.adjustable))),
    adjustables,
    edition: row.edition,
    editions: row.editions,
    summary: row.summary,
    author: row.author,
    approver: row.approver,
    contributors: row.contributors,
    publishedAt: row.publishedAt.toISOString(),
    firstPublishedAt: row.firstPublishedAt.toISOString(),
  }
}
