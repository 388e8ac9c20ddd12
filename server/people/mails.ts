export { alreadyJoinedMail, changedPasswordMail, firstAdminMail, resetMail, resetPasswordMail, verifyMail }

import type { Config } from '../config.ts'
import type { OutgoingMail } from '../mail/outbox.ts'
import { TOKEN_MINUTES } from './tokens.ts'

interface Addressee {
  name: string
  email: string
}
type Site = Pick<Config, 'origin' | 'clubName'>

/**
 * To whoever joined: proves that the address is theirs. Says no name, since whoever typed the name may have typed
 * somebody else's address beside it.
 */
function verifyMail(site: Site, email: string, secret: string): OutgoingMail {
  return mail(site, { name: 'Hello', email }, 'Confirm your address', [
    `somebody, we hope you, joined the tuning book of ${site.clubName} with this address.`,
    'Confirm that it is yours. After that you can write:',
    link(site, '/verify', secret),
    `The link works once, for ${TOKEN_MINUTES.verify / 60} hours. If it was not you, do nothing.`,
  ])
}

/** To an address that is in the book already, when somebody joins with it: the page must not tell, so the mail does. */
function alreadyJoinedMail(site: Site, to: Addressee): OutgoingMail {
  return mail(site, to, 'You are in the book already', [
    `somebody, perhaps you, wanted to join the tuning book of ${site.clubName} with this address. It has been yours for a while, so nothing was changed.`,
    `Sign in:\n${site.origin}/sign-in`,
    `If you no longer know your password:\n${site.origin}/forgotten`,
    'If it was not you, do nothing.',
  ])
}

function resetMail(site: Site, to: Addressee, secret: string): OutgoingMail {
  return mail(site, to, 'Set a new password', [
    'somebody, we hope you, asked for a new password. Set it here:',
    link(site, '/reset', secret),
    `The link works once, for ${TOKEN_MINUTES.reset} minutes. If it was not you, do nothing: your password stays as it is.`,
  ])
}

function resetPasswordMail(site: Site, to: Addressee): OutgoingMail {
  return mail(site, to, 'Your password is new', [
    'your password was set anew by a link from a mail to this address. You have been signed out everywhere.',
    `If it was not you, somebody reads your mail. Make your mail account safe first, then set another password:\n${site.origin}/forgotten`,
  ])
}

function changedPasswordMail(site: Site, to: Addressee): OutgoingMail {
  return mail(site, to, 'Your password was changed', [
    'your password was changed on your page. Everywhere else you have been signed out.',
    `If it was not you, set another one now:\n${site.origin}/forgotten`,
  ])
}

/** To the first admin of a new installation, who has no password yet. */
function firstAdminMail(site: Site, to: Addressee, secret: string): OutgoingMail {
  return mail(site, to, 'You look after the book', [
    `you are now an admin of the tuning book of ${site.clubName}. Set your password here:`,
    link(site, '/reset', secret),
    `The link works once, for ${TOKEN_MINUTES.reset} minutes. For another one:\n${site.origin}/forgotten`,
  ])
}

function mail(site: Site, to: Addressee, subject: string, paragraphs: string[]): OutgoingMail {
  return {
    to: to.email,
    subject: `${subject} · Camber & Clay`,
    body: [`${to.name},`, ...paragraphs, `Camber & Clay, the tuning book of ${site.clubName}\n${site.origin}`].join('\n\n'),
  }
}

// From the configured origin, never from a request's Host, which anyone can set.
function link(site: Site, path: string, secret: string): string {
  return `${site.origin}${path}?token=${secret}`
}
