export { can, requirePermission, requireSignedIn }

import { ForbiddenError, NotFoundError, SignInRequiredError } from '../errors.ts'
import type { Actor, SignedIn } from '../context.ts'
import { roleAtLeast } from '#shared/vocabulary/roles.ts'

/** The parts of an edit that decide who may do what with it. */
interface OwnedEdit {
  id: string
  authorId: string
  /** When it was first sent for review; null while nobody but its writer has ever been meant to see it. */
  sentAt: Date | null
}

/**
 * Who may do what: the one place where rights are decided. Services ask here before they do anything else; pages ask
 * here only to know what to offer.
 */
const permissions = {
  'edit.create': (actor: Actor) => isVerified(actor),
  'edit.read': (actor: Actor, edit: OwnedEdit) =>
    isMember(actor) && (actor.id === edit.authorId || (isModerator(actor) && edit.sentAt !== null)),
  'edit.save': (actor: Actor, edit: OwnedEdit) => isVerified(actor) && actor.id === edit.authorId,
  'edit.send': (actor: Actor, edit: OwnedEdit) => isVerified(actor) && actor.id === edit.authorId,
  'edit.withdraw': (actor: Actor, edit: OwnedEdit) => isMember(actor) && actor.id === edit.authorId,
  'edit.decide': (actor: Actor, edit: OwnedEdit) => isModerator(actor) && actor.id !== edit.authorId,
  'edit.note': (actor: Actor, edit: OwnedEdit) =>
    isMember(actor) && (actor.id === edit.authorId || (isModerator(actor) && edit.sentAt !== null)),
  'preview.render': (actor: Actor) => isVerified(actor),
  'queue.read': (actor: Actor) => isModerator(actor),
  // One's own and nobody else's: the services look for a car only among those of who asks.
  'car.keep': (actor: Actor) => isMember(actor),
  'report.save': (actor: Actor) => isVerified(actor),
  // One's own and nobody else's, as with cars.
  'report.own': (actor: Actor) => isMember(actor),
  'report.oversee': (actor: Actor) => isModerator(actor),
  'report.set_aside': (actor: Actor, report: { memberId: string }) => isModerator(actor) && actor.id !== report.memberId,
  'member.list': (actor: Actor) => isAdmin(actor),
  'member.change_role': (actor: Actor) => isAdmin(actor),
  'member.suspend': (actor: Actor) => isAdmin(actor),
} as const

type Permission = keyof typeof permissions
type SubjectOf<P extends Permission> = Parameters<(typeof permissions)[P]> extends [unknown, infer S] ? [S] : []

function can<P extends Permission>(actor: Actor, permission: P, ...subject: SubjectOf<P>): boolean {
  return (permissions[permission] as (actor: Actor, ...subject: unknown[]) => boolean)(actor, ...subject)
}

/**
 * Stops whoever may not.
 * @throws SignInRequiredError (401) for a visitor; NotFoundError (404) where even reading is not allowed, so that
 *   another person's draft cannot be told from none; ForbiddenError (403) otherwise
 */
function requirePermission<P extends Permission>(actor: Actor, permission: P, ...subject: SubjectOf<P>): asserts actor is SignedIn {
  if (can(actor, permission, ...subject)) return
  if (actor.kind === 'visitor') throw new SignInRequiredError(refusals[permission].toDo)
  const edit = subject[0] as OwnedEdit | undefined
  if (edit !== undefined && !can(actor, 'edit.read', edit)) throw new NotFoundError('edit', edit.id)
  if (!actor.verified && can({ ...actor, verified: true }, permission, ...subject)) {
    throw new ForbiddenError('Confirm your e-mail address first: open the link in the mail we sent you, or ask for a new one on your page.')
  }
  throw new ForbiddenError(refusals[permission].why)
}

function requireSignedIn(actor: Actor, toDo: string): asserts actor is SignedIn {
  if (actor.kind === 'visitor') throw new SignInRequiredError(toDo)
}

const refusals: Record<Permission, { toDo: string; why: string }> = {
  'edit.create': { toDo: 'write', why: 'You cannot write yet.' },
  'edit.read': { toDo: 'see this edit', why: 'Only its writer and the moderators can see this edit.' },
  'edit.save': { toDo: 'write', why: 'Only its writer can change this edit.' },
  'edit.send': { toDo: 'send an edit', why: 'Only its writer can send this edit.' },
  'edit.withdraw': { toDo: 'withdraw an edit', why: 'Only its writer can withdraw this edit.' },
  'edit.decide': {
    toDo: 'decide on edits',
    why: 'Moderators decide on edits, and nobody decides on their own.',
  },
  'edit.note': { toDo: 'write a note', why: 'Only its writer and the moderators can write notes on this edit.' },
  'preview.render': { toDo: 'see a preview', why: 'You cannot write yet.' },
  'queue.read': { toDo: 'open the review desk', why: 'The review desk is for moderators.' },
  'car.keep': { toDo: 'keep a car in your account', why: 'You cannot keep a car.' },
  'report.save': { toDo: 'say how it went', why: 'You cannot report yet.' },
  'report.own': { toDo: 'see your reports', why: 'You have no reports.' },
  'report.oversee': { toDo: 'look through heat reports', why: 'The list of heat reports is for moderators.' },
  'report.set_aside': { toDo: 'set reports aside', why: 'Moderators set reports aside, and nobody decides on their own.' },
  'member.list': { toDo: 'see the members', why: 'The list of members is for admins.' },
  'member.change_role': { toDo: 'change roles', why: 'Admins give out roles.' },
  'member.suspend': { toDo: 'suspend members', why: 'Admins suspend members and sign them out.' },
}

function isMember(actor: Actor): actor is SignedIn {
  return actor.kind === 'member'
}

function isVerified(actor: Actor): actor is SignedIn {
  return actor.kind === 'member' && actor.verified
}

function isModerator(actor: Actor): actor is SignedIn {
  return isVerified(actor) && roleAtLeast(actor.role, 'moderator')
}

function isAdmin(actor: Actor): actor is SignedIn {
  return isVerified(actor) && actor.role === 'admin'
}
