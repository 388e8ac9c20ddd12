export { mailboxDescription }

import { z } from 'zod'
import type { ApiDescription } from '../http/openapi/describe.ts'

const MailAnswer = z.object({
  id: z.int().describe('Counts up from 1 in the order of arrival.'),
  messageId: z.string(),
  from: z.string(),
  to: z.array(z.string()),
  subject: z.string(),
  text: z.string(),
  receivedAt: z.iso.datetime(),
  headers: z.array(z.object({ name: z.string(), value: z.string() })),
})

/** Mail that was caught instead of sent; named in the document only where mail is captured. */
const mailboxDescription: ApiDescription = {
  name: 'Mailbox',
  about: 'Mail that was caught instead of sent, for trying the product out.',
  answers: { Mail: MailAnswer },
  operations: {
    'GET /mailbox': {
      id: 'listMails',
      summary: 'The last 200 mails, newest first.',
      answers: { 200: { says: 'The mails.', body: z.object({ mails: z.array(MailAnswer) }) } },
    },
    'GET /mailbox/:id': {
      id: 'getMail',
      summary: 'One mail.',
      params: { id: z.int() },
      answers: { 200: { says: 'The mail.', body: MailAnswer } },
      problems: { 404: 'There is no such mail.' },
    },
  },
}
