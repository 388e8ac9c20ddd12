export type { CapturedMail, Mailbox }

interface CapturedMail {
  /** Counts up from 1 in the order of arrival. */
  id: number
  messageId: string
  from: string
  to: string[]
  subject: string
  /** The plain text. */
  text: string
  receivedAt: Date
  /** Every header as it came, name and value, so that a forged one would show. */
  headers: { name: string; value: string }[]
}

/** Mail that was caught instead of sent, for trying the product out without a mail server. */
interface Mailbox {
  /** Newest first; the last 200. */
  list(): CapturedMail[]
  find(id: number): CapturedMail | undefined
  /** Where the capture listens. */
  smtpUrl: string
  close(): Promise<void>
}
