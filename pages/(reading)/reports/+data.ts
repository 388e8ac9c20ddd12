export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { listLatestHeatReports } from '#server/heat-reports/list-heat-reports.ts'
import { listRecentBursts } from '#server/heat-reports/list-recent-bursts.ts'
import { forPage } from '#server/http/page-abort.ts'
import { readChange } from '#shared/heat-reports/report-address.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, urlParsed } = pageContext
  const text = urlParsed.search['change']
  const change = readChange(text)
  return forPage(pageContext, async () => {
    const page = Number.parseInt(urlParsed.search['page'] ?? '1', 10)
    const [list, bursts] = await Promise.all([listLatestHeatReports(ctx, { change, page }), listRecentBursts(ctx)])
    return {
      ...list,
      bursts,
      change: change === undefined ? null : text!,
      reports: list.reports.map((report) => ({ ...report, isMine: ctx.actor.kind === 'member' && report.member.id === ctx.actor.id })),
    }
  })
}
