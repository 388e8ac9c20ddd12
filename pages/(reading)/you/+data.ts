export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { listOwnHeatReports } from '#server/heat-reports/list-heat-reports.ts'
import { forPage } from '#server/http/page-abort.ts'
import { readOwnPage } from '#server/people/own-page.ts'
import { readyPassphrase } from '#server/people/passphrase.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx } = pageContext
  const [you, reports] = await forPage(pageContext, () => Promise.all([readOwnPage(ctx), listOwnHeatReports(ctx)]))
  return { you, reports, passphrase: readyPassphrase() }
}
