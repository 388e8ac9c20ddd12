export { SAME_ANSWER }

/** What everybody is told, whether or not the address is in the book. */
const SAME_ANSWER = {
  join: 'Look in your mail. There is a link to go on with.',
  resend: 'If that address waits to be confirmed, a mail with a new link is on its way.',
  reset: 'If that address is in the book, a mail with a link is on its way.',
} as const
