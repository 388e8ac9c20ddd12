export { approvedMail, askedMail, declinedMail }

import type { Config } from '../config.ts'

interface Told {
  config: Pick<Config, 'origin' | 'clubName'>
  to: string
  name: string
  title: string
  /** Who decided. */
  moderator: string
}

interface Mail {
  to: string
  subject: string
  body: string
}

function approvedMail({ config, to, name, title, moderator, slug, edition, note }: Told & { slug: string; edition: number; note: string }): Mail {
  return {
    to,
    subject: `“${title}” is in the book`,
    body: letter(config, name, [
      `${moderator} approved your edit. It is edition ${edition} of “${title}”, and it carries your name. Thank you.`,
      ...(note === '' ? [] : [note]),
      `${config.origin}/guides/${slug}`,
    ]),
  }
}

function askedMail({ config, to, name, title, moderator, editId, reason }: Told & { editId: string; reason: string }): Mail {
  return {
    to,
    subject: `“${title}”: changes asked for`,
    body: letter(config, name, [
      `${moderator} read your edit and asks for changes before it goes into the book:`,
      reason,
      'Your words are as you left them. Change them and send the edit again:',
      `${config.origin}/write/${editId}`,
    ]),
  }
}

function declinedMail({ config, to, name, title, moderator, editId, reason }: Told & { editId: string; reason: string }): Mail {
  return {
    to,
    subject: `“${title}”: not taken into the book`,
    body: letter(config, name, [
      `${moderator} read your edit and declined it:`,
      reason,
      'You can still read what you wrote, and begin again:',
      `${config.origin}/write/${editId}`,
    ]),
  }
}

function letter(config: Pick<Config, 'clubName'>, name: string, paragraphs: string[]): string {
  return [`Hello ${name},`, ...paragraphs, `Camber & Clay, ${config.clubName}`].join('\n\n') + '\n'
}
