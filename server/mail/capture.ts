export { startMailCapture }

import type { AddressInfo } from 'node:net'
import { simpleParser, type ParsedMail } from 'mailparser'
import { SMTPServer } from 'smtp-server'
import type { CapturedMail, Mailbox } from './mailbox.ts'

const KEPT = 200
const LARGEST_BYTES = 1024 * 1024

/**
 * Starts a mail server on a free loopback port that keeps what it gets instead of passing it on.
 * Never started in production mode.
 */
async function startMailCapture(): Promise<Mailbox> {
  const mails: CapturedMail[] = []
  let count = 0

  const server = new SMTPServer({
    banner: 'keeps mail, sends none',
    disabledCommands: ['AUTH', 'STARTTLS'],
    // A look-up of the caller's name would go out to a name server; on loopback there is nothing to learn.
    disableReverseLookup: true,
    size: LARGEST_BYTES,
    logger: false,
    onData(stream, session, done) {
      simpleParser(stream, { skipImageLinks: true, skipTextLinks: true })
        .then((mail) => {
          count += 1
          mails.unshift(capturedMail(count, mail, session.envelope.rcptTo.map((recipient) => recipient.address)))
          mails.splice(KEPT)
          done()
        })
        .catch(done)
    },
  })
  // A sender that hangs up in the middle is that sender's trouble.
  server.on('error', () => {})

  await new Promise<void>((resolve, reject) => {
    server.server.once('error', reject)
    server.listen(0, '127.0.0.1', resolve)
  })
  const { port } = server.server.address() as AddressInfo

  return {
    list: () => [...mails],
    find: (id) => mails.find((mail) => mail.id === id),
    smtpUrl: `smtp://127.0.0.1:${port}`,
    close: () => new Promise((resolve) => server.close(() => resolve())),
  }
}

/** @param recipients from the SMTP envelope: who would really have got it, whatever the headers say */
function capturedMail(id: number, mail: ParsedMail, recipients: string[]): CapturedMail {
  return {
    id,
    messageId: mail.messageId ?? '',
    from: mail.from?.text ?? '',
    to: recipients,
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    receivedAt: new Date(),
    headers: mail.headerLines.map(({ key, line }) => ({ name: key, value: line.slice(line.indexOf(':') + 1).trim() })),
  }
}
