export { mailboxApi }

import { Router } from 'express'
import type { App } from '../context.ts'
import { NotFoundError } from '../errors.ts'

/** The captured mail as JSON; mounted only where mail is captured, so never in production mode. */
function mailboxApi(app: Pick<App, 'mailbox'>): Router {
  const router = Router()
  router.get('/mailbox', (_req, res) => {
    res.json({ mails: app.mailbox?.list() ?? [] })
  })
  router.get('/mailbox/:id', (req, res) => {
    const mail = app.mailbox?.find(Number(req.params.id))
    if (mail === undefined) throw new NotFoundError('mail', req.params.id)
    res.json(mail)
  })
  return router
}
