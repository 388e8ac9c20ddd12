export { data }
export type { Data }

import { render } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { requireMailbox } from '../find-mailbox.ts'
import { splitLinks } from './split-links.ts'

type Data = ReturnType<typeof data>

function data(pageContext: PageContextServer) {
  const mail = requireMailbox(pageContext).find(Number(pageContext.routeParams.id))
  if (mail === undefined) throw render(404)
  const { from, to, subject, text, receivedAt } = mail
  return {
    mail: {
      from, subject, to: to.join(', '), receivedAt: receivedAt.toISOString(), parts: splitLinks(text, pageContext.origin),
    },
  }
}
