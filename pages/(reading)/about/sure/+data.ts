export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { hasHeatReports } from '#server/heat-reports/tell-first-report.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data({ ctx }: PageContextServer) {
  return { hasReports: await hasHeatReports(ctx) }
}
