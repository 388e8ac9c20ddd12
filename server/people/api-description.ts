export { peopleDescription }

import { z } from 'zod'
import type { ApiDescription, ApiOperation } from '../http/openapi/describe.ts'
import { EndedAnswer, MemberChangedAnswer, MembersAnswer, MessageAnswer, SessionAnswer, SessionsAnswer, SignedInAnswer, SignedInMember } from './answers.ts'
import { MembersQuery } from './api.ts'
import { AskForReset, ChangePassword, ChangeRole, ChangeStatus, Join, RedeemReset, ResendVerification, SignIn, VerifyEmail } from './inputs.ts'

const done = { 204: { says: 'Done.' } }
const mailed = { 202: { says: 'Carried out if there is something to do.', body: MessageAnswer } }
const LINK_OLD = 'The link does not work any more.'

/** What the operations on one member have in common. */
const onMember = {
  who: 'admins',
  params: { id: z.uuid() },
  problems: { 404: 'There is no such member.' },
} satisfies Partial<ApiOperation>

const peopleDescription: ApiDescription = {
  name: 'People',
  about: 'Joining, signing in and what follows from it; the admin’s members.',
  answers: { SignedInMember },
  operations: {
    'POST /members': {
      id: 'join',
      summary: 'Joins the book. A mail with a link confirms the address.',
      body: Join,
      limited: true,
      answers: { 201: { says: 'The mail is on its way.', body: MessageAnswer } },
    },
    'GET /members': {
      id: 'listMembers',
      summary: 'Everyone in the book by name, fifty a page.',
      who: 'admins',
      query: MembersQuery,
      answers: { 200: { says: 'One page of members.', body: MembersAnswer } },
    },
    'PUT /members/:id/role': {
      ...onMember,
      id: 'changeRole',
      summary: 'Gives a member another role and ends their sessions.',
      body: ChangeRole.omit({ memberId: true }),
      answers: { 200: { says: 'The member as they are now.', body: MemberChangedAnswer } },
      problems: { ...onMember.problems, 409: 'Nobody else is an admin (`last_admin`).' },
    },
    'PUT /members/:id/status': {
      ...onMember,
      id: 'changeStatus',
      summary: 'Suspends a member and ends their sessions, or lets them in again.',
      body: ChangeStatus.omit({ memberId: true }),
      answers: { 200: { says: 'The member as they are now.', body: MemberChangedAnswer } },
      problems: { ...onMember.problems, 409: 'Nobody else is an admin (`last_admin`).' },
    },
    'DELETE /members/:id/sessions': {
      ...onMember,
      id: 'endMemberSessions',
      summary: 'Signs a member out everywhere.',
      answers: { 200: { says: 'Signed out.', body: EndedAnswer } },
    },
    'POST /verifications': {
      id: 'verifyEmail',
      summary: 'Confirms an address with the secret from the mail.',
      body: VerifyEmail,
      limited: true,
      answers: done,
      problems: { 422: LINK_OLD },
    },
    'POST /verification-mails': {
      id: 'resendVerification',
      summary: 'Sends the confirming mail again.',
      body: ResendVerification,
      limited: true,
      answers: mailed,
    },
    'POST /password-resets': {
      id: 'askForReset',
      summary: 'Sends a mail with a link for a new password.',
      body: AskForReset,
      limited: true,
      answers: mailed,
    },
    'POST /password-resets/redeem': {
      id: 'resetPassword',
      summary: 'Sets a new password with the secret from the mail.',
      body: RedeemReset,
      limited: true,
      answers: done,
      problems: { 422: LINK_OLD },
    },
    'PUT /password': {
      id: 'changePassword',
      summary: 'Sets a new password and signs out everywhere else.',
      who: 'members',
      body: ChangePassword,
      limited: true,
      answers: done,
      problems: { 403: 'The present password is another (`wrong_password`).' },
    },
    'GET /session': {
      id: 'getSession',
      summary: 'Who is signed in.',
      answers: { 200: { says: 'Who is asking.', body: SessionAnswer } },
    },
    'POST /session': {
      id: 'signIn',
      summary: 'Signs in; the answer sets the session’s cookie.',
      body: SignIn,
      limited: true,
      answers: { 200: { says: 'Signed in.', body: SignedInAnswer } },
      problems: { 401: 'Address and password do not go together (`sign_in_failed`).', 403: 'The membership is suspended (`suspended`).' },
    },
    'DELETE /session': { id: 'signOut', summary: 'Signs out.', answers: done },
    'GET /sessions': {
      id: 'listOwnSessions',
      summary: 'Where one is signed in.',
      who: 'members',
      answers: { 200: { says: 'One’s own sessions, this one first.', body: SessionsAnswer } },
    },
    'DELETE /sessions': {
      id: 'endOtherSessions',
      summary: 'Signs out everywhere else.',
      who: 'members',
      answers: { 200: { says: 'Signed out.', body: EndedAnswer } },
    },
    'DELETE /sessions/:handle': {
      id: 'endOwnSession',
      summary: 'Ends one of one’s own sessions.',
      who: 'members',
      params: { handle: z.string() },
      answers: done,
      problems: { 404: 'It is none of one’s own sessions.' },
    },
  },
}
