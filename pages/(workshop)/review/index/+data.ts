export { data }
export type { Data, QueueRow }

import type { PageContextServer } from 'vike/types'
import { listEdits } from '#server/edits/list-edits.ts'
import type { EditEntry } from '#server/edits/views.ts'
import { listFreshInk } from '#server/guides/list-fresh-ink.ts'
import { listLatestHeatReports } from '#server/heat-reports/list-heat-reports.ts'
import { listRecentBursts } from '#server/heat-reports/list-recent-bursts.ts'
import { forPage } from '#server/http/page-abort.ts'
import type { EditState } from '#shared/vocabulary/edit-states.ts'

type Data = Awaited<ReturnType<typeof data>>
type QueueRow = Data['edits'][number]

/** What `?state=` may ask for, by the words that stand on the page. */
const shelves: Record<string, EditState> = { asked: 'changes_asked', approved: 'approved', declined: 'declined' }

async function data(pageContext: PageContextServer) {
  const { ctx, query, reader } = pageContext
  const shelf = Object.hasOwn(shelves, query.state ?? '') ? query.state! : 'waiting'
  const state = shelves[shelf] ?? 'in_review'
  const page = Math.min(100_000, Math.max(1, Number.parseInt(query.page ?? '1', 10) || 1))
  return forPage(pageContext, async () => {
    const [list, reports, bursts] = await Promise.all([listEdits(ctx, { whose: 'everyone', state, page }), listLatestHeatReports(ctx), listRecentBursts(ctx)])
    const [last] = list.total === 0 ? await listFreshInk(ctx, { limit: 1 }) : []
    return {
      shelf,
      now: ctx.clock().toISOString(),
      edits: list.edits.map((edit) => queueRow(edit, reader?.id)),
      page: list.page,
      pages: list.pages,
      total: list.total,
      heatReports: { total: reports.total, bursts: bursts.length },
      lastApproved: last === undefined ? null : { slug: last.slug, mark: last.mark, title: last.title, publishedAt: last.publishedAt },
    }
  })
}

function queueRow(edit: EditEntry, readerId: string | undefined) {
  const { id, title, guide, chapter, author, summary, sentAt, updatedAt, baseEdition, state, changes: sizes } = edit
  return { id, title, guide, chapter, author, summary, sentAt, updatedAt, baseEdition, state, sizes, isMine: author.id === readerId }
}
