export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { requireMailbox } from './find-mailbox.ts'

type Data = ReturnType<typeof data>

function data(pageContext: PageContextServer) {
  return {
    mails: requireMailbox(pageContext)
      .list()
      .map(({ id, to, subject, receivedAt }) => ({ id, to: to.join(', '), subject, receivedAt: receivedAt.toISOString() })),
  }
}
