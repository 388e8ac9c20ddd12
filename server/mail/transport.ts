export { createTransport }
export type { MailTransport, WaitingMail }

import nodemailer from 'nodemailer'
import type { Config } from '../config.ts'

interface WaitingMail {
  id: string
  recipient: string
  subject: string
  body: string
  messageId: string
}

interface MailTransport {
  /** @throws what the mail server said, with `responseCode` and `command` where it answered at all */
  send(mail: WaitingMail): Promise<void>
  close(): void
}

// For each step; a server that says a little again and again would stretch the whole beyond any of them.
const SMTP_PATIENCE = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 20_000 }

// Shorter than the first wait of the outbox (60 seconds), so that no other worker picks up a mail that is still being sent
// here: it would arrive twice.
const SEND_WITHIN_MS = 50_000

/**
 * @param smtpUrl where to send: the configured server, or the local capture
 * @param sendWithinMs when the connection is closed whatever is going on
 */
function createTransport(config: Pick<Config, 'mailFrom'>, smtpUrl: string, sendWithinMs = SEND_WITHIN_MS): MailTransport {
  const transporter = nodemailer.createTransport({
    url: smtpUrl,
    ...SMTP_PATIENCE,
    // The text of a mail is text: it must never make us read a file or fetch an address.
    disableFileAccess: true,
    disableUrlAccess: true,
  })
  return {
    async send(mail) {
      await transporter.sendMail({
        from: config.mailFrom,
        // As an object, so that a comma or an angle bracket cannot make a second recipient.
        to: { name: '', address: mail.recipient },
        subject: mail.subject,
        text: mail.body,
        messageId: messageIdOf(config, mail.messageId),
        signal: AbortSignal.timeout(sendWithinMs),
        headers: { 'Auto-Submitted': 'auto-generated' },
      })
    },
    close: () => transporter.close(),
  }
}

/** RFC 5322, 3.6.4: unique on the left, a domain of our own on the right. */
function messageIdOf(config: Pick<Config, 'mailFrom'>, left: string): string {
  const domain = /@([A-Za-z0-9.-]+)>?\s*$/.exec(config.mailFrom)?.[1] ?? 'localhost'
  return `<${left}@${domain}>`
}
