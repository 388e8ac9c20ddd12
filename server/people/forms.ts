export { peopleForms }

import { Router, type Request, type RequestHandler, type Response } from 'express'
import type { App } from '../context.ts'
import { isAppError } from '../errors.ts'
import { answerWithForm } from '../http/forms.ts'
import { askForReset } from './ask-for-reset.ts'
import { changeRole, changeStatus, endMemberSessions } from './change-member.ts'
import { changePassword } from './change-password.ts'
import { ownMember } from './find-member.ts'
import { join } from './join.ts'
import { endOtherSessions, endOwnSession } from './own-sessions.ts'
import { requireSignedIn } from './permissions.ts'
import { resendVerification } from './resend-verification.ts'
import { resetPassword } from './reset-password.ts'
import { safeNext } from './safe-next.ts'
import { endSession, renewSession, startSession } from './session.ts'
import { signIn } from './sign-in.ts'
import { verifyEmail } from './verify-email.ts'

/** The same for plain HTML forms: each goes on to a page, or shows its own page again with what was typed. */
function peopleForms(app: App): Router {
  const router = Router()

  router.post('/join', form('/join', async (req) => {
    const { name, email, password } = fields(req)
    await join(req.ctx, { name, email, password })
    return '/join?said=joined'
  }))
  router.post('/sign-in', form('/sign-in', async (req) => {
    const { email, password, next } = fields(req)
    const member = await signIn(req.ctx, { email, password })
    await startSession(app, req, member)
    return safeNext(next)
  }))
  router.post('/sign-out', form('/', async (req, res) => {
    await endSession(app, req, res)
    return '/sign-in?said=signed-out'
  }))
  router.post('/forgotten', form('/forgotten', async (req) => {
    await askForReset(req.ctx, { email: fields(req).email })
    return '/forgotten?said=reset-asked'
  }))
  router.post('/reset', form('/reset', async (req) => {
    const { token, password } = fields(req)
    await resetPassword(req.ctx, { token, password })
    return '/sign-in?said=password-set'
  }))
  router.post('/verify', form('/verify', async (req) => {
    await verifyEmail(req.ctx, { token: fields(req).token })
    return req.ctx.actor.kind === 'visitor' ? '/sign-in?said=verified' : '/you?said=verified'
  }))

  router.post('/you/password', form('/you', async (req) => {
    const { currentPassword, newPassword } = fields(req)
    await changePassword(req.ctx, { currentPassword, newPassword })
    await renewSession(app, req)
    return '/you?said=password-changed'
  }))
  router.post('/you/sign-out-everywhere', form('/you', async (req) => {
    await endOtherSessions(req.ctx)
    await renewSession(app, req)
    return '/you?said=signed-out-elsewhere'
  }))
  router.post('/you/sessions/:handle/end', form('/you', async (req) => {
    await endOwnSession(req.ctx, String(req.params.handle))
    return '/you?said=session-ended'
  }))
  router.post('/you/resend', form('/you', async (req) => {
    const { actor } = req.ctx
    requireSignedIn(actor, 'ask for that mail')
    await resendVerification(req.ctx, { email: (await ownMember({ ...req.ctx, actor })).email })
    return '/you?said=mail-sent'
  }))

  router.post('/members/:id/role', form('/members', async (req) => {
    await changeRole(req.ctx, { memberId: req.params.id, role: fields(req).role })
    return '/members?said=role-changed'
  }))
  router.post('/members/:id/status', form('/members', async (req) => {
    await changeStatus(req.ctx, { memberId: req.params.id, status: fields(req).status })
    return '/members?said=status-changed'
  }))
  router.post('/members/:id/end-sessions', form('/members', async (req) => {
    await endMemberSessions(req.ctx, { memberId: req.params.id })
    return '/members?said=sessions-ended'
  }))
  return router
}

// What a person can put right on the form itself; everything else is for an error page. A 401 is only a form's own
// where it is about a wrong password; otherwise the visitor is sent to sign in.
const formStatuses = [409, 422, 429]
const formCodes = ['sign_in_failed', 'suspended', 'wrong_password']

/** @param act carries the form out and says where to go on */
function form(page: string, act: (req: Request, res: Response) => Promise<string>): RequestHandler {
  return async (req, res) => {
    try {
      res.redirect(303, await act(req, res))
    } catch (error) {
      if (!isAppError(error) || !(formStatuses.includes(error.status) || formCodes.includes(error.code))) throw error
      await answerWithForm(req, res, { url: page, error })
    }
  }
}

/** The posted fields; a field sent twice is an array in the parser's hands and counts as not sent. */
function fields(req: Request): Record<string, string | undefined> {
  return Object.fromEntries(
    Object.entries((req.body ?? {}) as Record<string, unknown>).filter(([, value]) => typeof value === 'string'),
  ) as Record<string, string>
}
