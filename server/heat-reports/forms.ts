export { heatReportsForms }

import { Router, type Request } from 'express'
import { answerForm } from '../http/answer-form.ts'
import { flatFields } from '../http/form-body.ts'
import { isUuid } from '../http/uuid.ts'
import { NotFoundError } from '../errors.ts'
import { requirePermission } from '../people/permissions.ts'
import { safeNext } from '../people/safe-next.ts'
import { readChange, reportAddress } from '#shared/heat-reports/report-address.ts'
import { saveHeatReport } from './save-heat-report.ts'
import { letHeatReportCount, setAsideHeatReport } from './set-aside-heat-report.ts'
import { takeBackHeatReport } from './take-back-heat-report.ts'

const formNames: Record<string, string> = { carClass: 'class', adjustable: 'change', direction: 'change' }

/** “Did it hold?”, one's own reports and the moderators' list, as plain forms. */
function heatReportsForms(): Router {
  const router = Router()
  router.post('/report', async (req, res) => {
    const fields = flatFields(req.body)
    const { change = '', class: carClass, surface, bite, verdict, note, back } = fields
    const at = { change, class: carClass, surface, bite, back: back === undefined ? undefined : safeNext(back) }
    const form = { url: reportAddress(at), values: () => fields, fieldName: (field: string) => formNames[field] ?? field }
    // A press alone is quickly pressed again: signing in leads back to the same form, filled in.
    if (req.ctx.actor.kind === 'visitor' && (note ?? '').trim() === '') {
      res.redirect(303, `/sign-in?next=${encodeURIComponent(form.url)}`)
      return
    }
    await answerForm(req, res, form, async () => {
      const { created } = await saveHeatReport(req.ctx, { ...readChange(change), carClass, surface, bite, verdict, note })
      return reportAddress(at, { said: created ? 'saved' : 'changed' })
    })
  })
  router.post('/you/reports/:id/take-back', async (req, res) => {
    const id = String(req.params.id)
    await answerForm(req, res, { url: '/you', values: () => ({}), fieldName: (field) => field }, async () => {
      await takeBackHeatReport(req.ctx, { id })
      return '/you?said=report-taken-back#reports'
    })
  })
  router.post('/reports/:id/set-aside', async (req, res) => {
    const id = idForModerators(req)
    const { reason } = flatFields(req.body)
    // There is a field for each report on the page: the message stands at the one that was sent.
    const form = { url: '/reports', values: () => ({ id, reason: reason ?? '' }), fieldName: (field: string) => `${field}-${id}` }
    await answerForm(req, res, form, async () => {
      await setAsideHeatReport(req.ctx, { id, reason })
      return '/reports?said=set-aside'
    })
  })
  router.post('/reports/:id/let-count', async (req, res) => {
    const id = idForModerators(req)
    await answerForm(req, res, { url: '/reports', values: () => ({ id }), fieldName: (field) => field }, async () => {
      await letHeatReportCount(req.ctx, { id })
      return '/reports?said=let-count'
    })
  })
  return router
}

function idForModerators(req: Request): string {
  requirePermission(req.ctx.actor, 'report.oversee')
  const id = String(req.params['id'])
  if (!isUuid(id)) throw new NotFoundError('report', id)
  return id
}
