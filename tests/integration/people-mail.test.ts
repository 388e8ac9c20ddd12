import { sql } from 'drizzle-orm'
import pino from 'pino'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { connectDatabase, type DatabaseConnection } from '#server/db/client.ts'
import { startMailCapture } from '#server/mail/capture.ts'
import { createMailWorker, type MailWorker } from '#server/mail/deliver.ts'
import type { Mailbox } from '#server/mail/mailbox.ts'
import { queueMail } from '#server/mail/outbox.ts'
import type { MailTransport, WaitingMail } from '#server/mail/transport.ts'
import { createDatabase, dropDatabase, TEMPLATE } from '../support/database.ts'
import { testConfig } from '../support/test-app.ts'

let url: string
let connection: DatabaseConnection
let mailbox: Mailbox
const workers: MailWorker[] = []
beforeAll(async () => {
  url = await createDatabase({ template: TEMPLATE })
  connection = connectDatabase(url)
  mailbox = await startMailCapture()
})
afterAll(async () => {
  await mailbox.close()
  await connection.close()
  await dropDatabase(url)
})
beforeEach(() => connection.db.execute(sql`delete from outbox`))
afterEach(() => Promise.all(workers.splice(0).map((worker) => worker.close())))

const HOURS = 3_600_000

/** A worker that never looks by itself within a test, except where news of mail reaches it. */
function worker(transport?: MailTransport): MailWorker {
  const app = { config: testConfig(url), db: connection.db, log: pino({ level: 'silent' }), mailbox }
  const made = createMailWorker(app, { lookEveryMs: 24 * HOURS, ...(transport === undefined ? {} : { transport }) })
  workers.push(made)
  return made
}

function fake(send: (mail: WaitingMail) => Promise<void> | void): MailTransport {
  return { send: async (mail) => send(mail), close: () => {} }
}

const mail = (n: number) => ({ to: `reader${n}@marsh.example`, subject: `Number ${n}`, body: `Text ${n}` })
const row = async (n: number) =>
  (
    await connection.db.execute<{ sent: boolean; dead: boolean; attempts: number; wait: number; last_error: string; body: string }>(sql`
      select sent_at is not null as sent, dead_at is not null as dead, attempts, last_error, body,
        extract(epoch from next_attempt_at - now())::float8 as wait
      from outbox where recipient = ${mail(n).to}`)
  ).rows[0]!
const makeDue = () => connection.db.execute(sql`update outbox set next_attempt_at = now() - interval '1 second'`)

describe('the outbox', () => {
  it('sends nothing of a transaction that was rolled back', async () => {
    await connection.db
      .transaction(async (tx) => {
        await queueMail(tx, mail(1))
        tx.rollback()
      })
      .catch(() => {})
    await connection.db.transaction((tx) => queueMail(tx, mail(2)))
    await worker().drain()
    expect(mailbox.list().map(({ to }) => to[0])).not.toContain(mail(1).to)
    expect(mailbox.list()[0]).toMatchObject({ to: [mail(2).to], subject: 'Number 2', text: 'Text 2\n' })
  })

  it('is looked at as soon as the transaction commits', async () => {
    const sent = new Promise<WaitingMail>((resolve) => worker(fake(resolve)))
    await connection.db.transaction((tx) => queueMail(tx, mail(3)))
    expect(await sent).toMatchObject({ recipient: mail(3).to })
  })

  it('gives each mail to one worker', async () => {
    const sent: string[] = []
    const transport = fake((one) => void sent.push(one.recipient))
    await connection.db.transaction(async (tx) => {
      for (let n = 0; n < 60; n += 1) await queueMail(tx, mail(n))
    })
    await Promise.all([worker(transport), worker(transport), worker(transport)].map((one) => one.drain()))
    expect([...sent].sort()).toEqual(Array.from({ length: 60 }, (_, n) => mail(n).to).sort())
  })

  it('keeps line breaks out of every header', async () => {
    await queueMail(connection.db, { to: 'one@marsh.example', subject: 'Hello\r\nBcc: two@marsh.example\n\nx', body: 'Text' })
    await worker().drain()
    const [newest] = mailbox.list()
    expect(newest).toMatchObject({ to: ['one@marsh.example'], subject: 'Hello Bcc: two@marsh.example x' })
    expect(newest?.headers.map(({ name }) => name)).not.toContain('bcc')
    await queueMail(connection.db, { to: 'one@marsh.example, two@marsh.example', subject: 'Two', body: 'Text' })
    await worker().drain()
    expect(mailbox.list().flatMap(({ to }) => to)).not.toContain('two@marsh.example')
  })
})

describe('a mail that cannot be sent', () => {
  it('is tried again after 1 minute, 4, 16, then longer, under the same Message-ID, and succeeds', async () => {
    const ids: string[] = []
    let working = false
    const one = worker(
      fake(({ messageId }) => {
        ids.push(messageId)
        if (!working) throw Object.assign(new Error('451 try later'), { responseCode: 451, command: 'RCPT TO' })
      }),
    )
    await queueMail(connection.db, mail(4))
    const waits = [60, 240, 960, 3_840, 15_360, 21_600, 21_600]
    // The worker also looks when it starts and when it hears of the mail, so an attempt may come before we ask for one.
    for (let state = await row(4); state.attempts < waits.length; ) {
      await makeDue()
      await one.drain()
      state = await row(4)
      expect(state).toMatchObject({ sent: false, dead: false, last_error: '451 try later', body: 'Text 4' })
      expect(Math.abs(state.wait - waits[state.attempts - 1]!)).toBeLessThan(10)
      const tries = ids.length
      await one.drain()
      expect(ids.length).toBe(tries)
    }
    working = true
    await makeDue()
    await one.drain()
    expect(await row(4)).toMatchObject({ sent: true, dead: false, last_error: '', body: '' })
    expect(new Set(ids).size).toBe(1)
  })

  it('is given up after 24 hours', async () => {
    const one = worker(fake(() => Promise.reject(new Error('no route'))))
    await connection.db.transaction((tx) => queueMail(tx, mail(5)))
    await one.drain()
    await connection.db.execute(sql`update outbox set created_at = now() - interval '24 hours 1 second', next_attempt_at = now()`)
    await one.drain()
    expect(await row(5)).toMatchObject({ sent: false, dead: true, last_error: 'no route', body: '' })
    await makeDue()
    await one.drain()
    expect((await row(5)).attempts).toBe(2)
  })

  it('is given up at once when the other side refuses it for good', async () => {
    const one = worker(
      fake(() => Promise.reject(Object.assign(new Error('550 no such mailbox'), { responseCode: 550, command: 'RCPT TO' }))),
    )
    await queueMail(connection.db, mail(6))
    await one.drain()
    expect(await row(6)).toMatchObject({ dead: true, attempts: 1, body: '' })
  })

  it('does not hold up the others when its server hangs', async () => {
    let letGo = () => {}
    const hanging = new Promise<void>((resolve) => {
      letGo = resolve
    })
    const sent: string[] = []
    let allSent = () => {}
    const others = new Promise<void>((resolve) => {
      allSent = resolve
    })
    const one = worker(
      fake(async ({ recipient }) => {
        if (recipient === mail(0).to) await hanging
        sent.push(recipient)
        if (sent.length === 9) allSent()
      }),
    )
    await connection.db.transaction(async (tx) => {
      for (let n = 0; n < 10; n += 1) await queueMail(tx, mail(n))
    })
    const drained = one.drain()
    await others
    expect(sent).not.toContain(mail(0).to)
    letGo()
    await drained
    expect(sent).toHaveLength(10)
  })

  it('whose sender was killed in the middle is sent again later, under the same Message-ID', async () => {
    const ids: string[] = []
    const killed = worker(
      fake(({ messageId }) => {
        ids.push(messageId)
        // What a kill leaves behind: the mail is out, and nobody wrote that down.
        return new Promise<void>(() => {})
      }),
    )
    workers.pop()
    await queueMail(connection.db, mail(7))
    void killed.drain()
    await expect.poll(() => ids.length).toBe(1)
    await makeDue()
    await worker(fake(({ messageId }) => void ids.push(messageId))).drain()
    expect(await row(7)).toMatchObject({ sent: true, attempts: 2 })
    expect(ids[1]).toBe(ids[0])
  })
})

describe('the capture', () => {
  it('keeps the last 200', async () => {
    const one = worker()
    await connection.db.transaction(async (tx) => {
      for (let n = 0; n < 205; n += 1) await queueMail(tx, mail(n))
    })
    await one.drain()
    expect(mailbox.list()).toHaveLength(200)
    const [newest] = mailbox.list()
    expect(mailbox.find(newest!.id)).toEqual(newest)
    expect(mailbox.find(1)).toBeUndefined()
  })
})
