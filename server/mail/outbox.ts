export { MAIL_CHANNEL, queueMail }
export type { OutgoingMail }

import { randomUUID } from 'node:crypto'
import { sql } from 'drizzle-orm'
import type { Database, Transaction } from '../db/client.ts'
import { outbox } from '../db/schema/index.ts'

/** PostgreSQL channel on which the workers hear, at commit, that there is mail to send. */
const MAIL_CHANNEL = 'mail_waiting'

interface OutgoingMail {
  to: string
  subject: string
  /** Plain text. */
  body: string
}

/**
 * Writes a mail into the outbox within the caller's transaction: when that rolls back there is no mail, when it commits
 * the mail will be sent even if the server stops this very moment.
 */
async function queueMail(tx: Database | Transaction, mail: OutgoingMail): Promise<void> {
  await tx.insert(outbox).values({
    recipient: oneLine(mail.to),
    subject: oneLine(mail.subject),
    body: mail.body,
    // Fixed now, so that a mail sent twice after a crash can be recognised as one by the receiving side.
    messageId: randomUUID(),
  })
  await tx.execute(sql`select pg_notify(${MAIL_CHANNEL}, '')`)
}

// A line break in a header would begin another header, such as a second recipient. A subject may quote what a member
// typed; a recipient with a line break is nobody's address, so the database's own check then refuses the row.
function oneLine(text: string): string {
  return text.replace(/[\u0000-\u001f\u007f-\u009f\u2028\u2029]+/g, ' ').trim()
}
