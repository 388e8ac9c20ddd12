export { createMailWorker }
export type { MailWorker }

import { sql } from 'drizzle-orm'
import type { App } from '../context.ts'
import { listenForMail } from './listen.ts'
import { DEAD_AFTER_HOURS, RETRY_AFTER_SECONDS, isRefusedForGood } from './retry.ts'
import { createTransport, type MailTransport, type WaitingMail } from './transport.ts'

/** A mail taken out of the outbox to be sent now. */
interface ClaimedMail extends WaitingMail {
  attempts: number
  tooOld: boolean
}

interface MailWorker {
  /** Sends all that is due; resolves when none is left that is due now. */
  drain(): Promise<void>
  /** Finishes what is being sent and stops. */
  close(): Promise<void>
}

const LANES = 4
const LOOK_EVERY_MS = 15_000

/**
 * Sends what stands in the outbox. Any number of workers may run: a mail is claimed by one conditional UPDATE that also
 * sets the time of the next attempt, so that a worker that dies in the middle leaves a mail that is simply due again
 * later, under the same Message-ID. Once a mail is sent or given up its text is blanked: it may hold a link that works.
 * @param options.transport for tests; otherwise the configured mail server or the local capture
 */
function createMailWorker(
  app: Pick<App, 'config' | 'db' | 'log' | 'mailbox'>,
  options: { transport?: MailTransport; lookEveryMs?: number } = {},
): MailWorker {
  const smtpUrl = app.config.smtpUrl ?? app.mailbox?.smtpUrl
  if (smtpUrl === undefined) throw new Error('There is no mail server: set SMTP_URL.')
  const transport = options.transport ?? createTransport(app.config, smtpUrl)
  let closed = false
  let running: Promise<void> | undefined
  let again = false

  async function sendOne(mail: ClaimedMail): Promise<void> {
    try {
      await transport.send(mail)
      await app.db.execute(sql`update outbox set sent_at = now(), last_error = '', body = '' where id = ${mail.id}`)
    } catch (error) {
      const reason = error instanceof Error ? error.message : String(error)
      const dead = mail.tooOld || isRefusedForGood(error)
      await app.db.execute(sql`
        update outbox set last_error = ${reason.slice(0, 500)}, dead_at = ${dead ? sql`now()` : sql`null`},
          body = ${dead ? sql`''` : sql`body`}
        where id = ${mail.id} and sent_at is null`)
      app.log[dead ? 'error' : 'warn']({ mail: mail.id, attempts: mail.attempts, reason }, dead ? 'mail given up' : 'mail not sent yet')
    }
  }

  // Each lane takes one mail at a time, so that a server that hangs holds up one lane and not the others.
  async function sendAllDue(): Promise<void> {
    await Promise.all(
      Array.from({ length: LANES }, async () => {
        for (let mail = await claimNext(app.db); mail !== undefined; mail = closed ? undefined : await claimNext(app.db)) {
          await sendOne(mail)
        }
      }),
    )
  }

  /** One round at a time; a call during a round makes one more, since that round may already have looked. */
  function drain(): Promise<void> {
    if (running !== undefined) {
      again = true
      return running
    }
    running = (async () => {
      do {
        again = false
        await sendAllDue()
      } while (again && !closed)
    })().finally(() => {
      running = undefined
    })
    return running
  }

  const wake = () => {
    if (!closed) drain().catch((error: unknown) => app.log.error({ err: error }, 'outbox could not be read'))
  }
  const listener = listenForMail(app.config.databaseUrl, wake)
  const timer = setInterval(wake, options.lookEveryMs ?? LOOK_EVERY_MS)
  timer.unref()
  wake()

  return {
    drain,
    async close() {
      closed = true
      clearInterval(timer)
      await listener.close()
      await running?.catch(() => {})
      transport.close()
    },
  }
}

async function claimNext(db: App['db']): Promise<ClaimedMail | undefined> {
  // Times are the database's own, since they have to mean the same to every worker.
  const claimed = await db.execute<{
    id: string; recipient: string; subject: string; body: string; message_id: string; attempts: number; too_old: boolean
  }>(sql`
    update outbox set attempts = outbox.attempts + 1,
      next_attempt_at = now() + interval '1 second' *
        (${sql.param(RETRY_AFTER_SECONDS)}::int[])[least(outbox.attempts + 1, ${RETRY_AFTER_SECONDS.length}::int)]
    where id = (
      select id from outbox where sent_at is null and dead_at is null and next_attempt_at <= now()
      order by next_attempt_at limit 1 for update skip locked)
    returning id, recipient, subject, body, message_id, attempts,
      created_at < now() - interval '1 hour' * ${DEAD_AFTER_HOURS}::int as too_old`)
  const row = claimed.rows[0]
  if (row === undefined) return undefined
  const { message_id: messageId, too_old: tooOld, ...mail } = row
  return { ...mail, messageId, tooOld }
}
