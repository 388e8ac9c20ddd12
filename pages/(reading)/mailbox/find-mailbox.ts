export { requireMailbox }

import { render } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import type { Mailbox } from '#server/mail/mailbox.ts'

/** The captured mail; where mail really goes out, and always in production mode, there is no such page. */
function requireMailbox({ ctx }: PageContextServer): Mailbox {
  if (ctx.config.production || ctx.mailbox === undefined) throw render(404)
  return ctx.mailbox
}
