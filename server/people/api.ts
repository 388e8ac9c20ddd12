export { MembersQuery, peopleApi }

import { Router } from 'express'
import { z } from 'zod'
import type { App } from '../context.ts'
import { pageNumber } from '../http/page-number.ts'
import { askForReset } from './ask-for-reset.ts'
import { changeRole, changeStatus, endMemberSessions } from './change-member.ts'
import { changePassword } from './change-password.ts'
import { SAME_ANSWER } from './same-answer.ts'
import { join } from './join.ts'
import { listMembers } from './list-members.ts'
import { endOtherSessions, endOwnSession, listOwnSessions } from './own-sessions.ts'
import { parseInput } from './parse-input.ts'
import { resendVerification } from './resend-verification.ts'
import { resetPassword } from './reset-password.ts'
import { endSession, renewSession, startSession } from './session.ts'
import { signIn } from './sign-in.ts'
import { verifyEmail } from './verify-email.ts'

const MembersQuery = z.strictObject({ page: pageNumber.default(1) })

/** Joining, signing in and what follows from it, and the admin's members, under /api. */
function peopleApi(app: App): Router {
  const router = Router()

  router.post('/members', async (req, res) => {
    await join(req.ctx, req.body)
    res.status(201).json({ message: SAME_ANSWER.join })
  })
  router.get('/members', async (req, res) => {
    res.json(await listMembers(req.ctx, parseInput(MembersQuery, req.query).page))
  })
  router.put('/members/:id/role', async (req, res) => {
    const { id, name, role, status } = await changeRole(req.ctx, { ...asObject(req.body), memberId: req.params.id })
    res.json({ id, name, role, status })
  })
  router.put('/members/:id/status', async (req, res) => {
    const { id, name, role, status } = await changeStatus(req.ctx, { ...asObject(req.body), memberId: req.params.id })
    res.json({ id, name, role, status })
  })
  router.delete('/members/:id/sessions', async (req, res) => {
    res.json({ ended: await endMemberSessions(req.ctx, { memberId: req.params.id }) })
  })

  router.post('/verifications', async (req, res) => {
    await verifyEmail(req.ctx, req.body)
    res.status(204).end()
  })
  router.post('/verification-mails', async (req, res) => {
    await resendVerification(req.ctx, req.body)
    res.status(202).json({ message: SAME_ANSWER.resend })
  })
  router.post('/password-resets', async (req, res) => {
    await askForReset(req.ctx, req.body)
    res.status(202).json({ message: SAME_ANSWER.reset })
  })
  router.post('/password-resets/redeem', async (req, res) => {
    await resetPassword(req.ctx, req.body)
    res.status(204).end()
  })
  router.put('/password', async (req, res) => {
    await changePassword(req.ctx, req.body)
    await renewSession(app, req)
    res.status(204).end()
  })

  router.get('/session', (req, res) => {
    const { actor } = req.ctx
    const member =
      actor.kind === 'visitor' ? null : { id: actor.id, name: actor.name, role: actor.role, verified: actor.verified }
    res.json({ member })
  })
  router.post('/session', async (req, res) => {
    const member = await signIn(req.ctx, req.body)
    await startSession(app, req, member)
    res.json({
      member: { id: member.id, name: member.name, role: member.role, verified: member.emailVerifiedAt !== null },
    })
  })
  router.delete('/session', async (req, res) => {
    await endSession(app, req, res)
    res.status(204).end()
  })
  router.get('/sessions', async (req, res) => {
    res.json({ sessions: await listOwnSessions(req.ctx) })
  })
  router.delete('/sessions', async (req, res) => {
    const ended = await endOtherSessions(req.ctx)
    await renewSession(app, req)
    res.json({ ended })
  })
  router.delete('/sessions/:handle', async (req, res) => {
    await endOwnSession(req.ctx, req.params.handle)
    res.status(204).end()
  })
  return router
}

// The schema then says what is missing; an array or a bare text has no fields to spread.
function asObject(body: unknown): object {
  return typeof body === 'object' && body !== null && !Array.isArray(body) ? body : {}
}
