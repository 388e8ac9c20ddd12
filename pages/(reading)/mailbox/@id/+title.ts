export { title }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function title(pageContext: PageContextServer): string {
  return `${(pageContext.data as Data).mail.subject} · Mailbox`
}
