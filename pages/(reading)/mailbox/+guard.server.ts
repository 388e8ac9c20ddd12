export { guard }

import type { PageContextServer } from 'vike/types'
import { requireMailbox } from './find-mailbox.ts'

function guard(pageContext: PageContextServer): void {
  requireMailbox(pageContext)
}
