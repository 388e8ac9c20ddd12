export { heatReportsApi, HeatReportsQuery }

import { Router, type Request } from 'express'
import { z } from 'zod'
import { NotFoundError } from '../errors.ts'
import { isUuid } from '../http/uuid.ts'
import { parseInput } from '../people/parse-input.ts'
import { requirePermission } from '../people/permissions.ts'
import { listLatestHeatReports, listOwnHeatReports } from './list-heat-reports.ts'
import { saveHeatReport } from './save-heat-report.ts'
import { letHeatReportCount, setAsideHeatReport } from './set-aside-heat-report.ts'
import { takeBackHeatReport } from './take-back-heat-report.ts'

const HeatReportsQuery = z.strictObject({
  mine: z.string().optional().describe('One’s own; so it is when nothing is asked.'),
  whose: z.enum(['mine', 'everyone'], { error: 'Whose: mine or everyone.' }).default('mine').describe('Everyone’s are for moderators, the newest fifty.'),
})

type ReportRequest = Request<{ id: string }>

function heatReportsApi(): Router {
  const router = Router()
  router.get('/heat-reports', async (req, res) => {
    requirePermission(req.ctx.actor, 'report.own')
    const { whose } = parseInput(HeatReportsQuery, req.query)
    res.json(whose === 'mine' ? await listOwnHeatReports(req.ctx) : (await listLatestHeatReports(req.ctx)).reports)
  })
  router.post('/heat-reports', async (req, res) => {
    const { report, created } = await saveHeatReport(req.ctx, req.body)
    res.status(created ? 201 : 200).json(report)
  })
  router.delete('/heat-reports/:id', async (req: ReportRequest, res) => {
    await takeBackHeatReport(req.ctx, req.params)
    res.status(204).end()
  })
  router.post('/heat-reports/:id/set-aside', async (req: ReportRequest, res) => {
    const { reason } = (req.body ?? {}) as { reason?: unknown }
    res.json(await setAsideHeatReport(req.ctx, { id: idForModerators(req), reason }))
  })
  router.delete('/heat-reports/:id/set-aside', async (req: ReportRequest, res) => {
    res.json(await letHeatReportCount(req.ctx, { id: idForModerators(req) }))
  })
  return router
}

function idForModerators(req: ReportRequest): string {
  requirePermission(req.ctx.actor, 'report.oversee')
  if (!isUuid(req.params.id)) throw new NotFoundError('report', req.params.id)
  return req.params.id
}
