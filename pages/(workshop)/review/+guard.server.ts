export { guard }

import { redirect, render } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { can } from '#server/people/permissions.ts'

/** The review desk is for moderators: a visitor signs in first, everybody else is told so. */
function guard(pageContext: PageContextServer): void {
  if (pageContext.reader === null) {
    throw redirect(`/sign-in?next=${encodeURIComponent(pageContext.urlOriginal)}`)
  }
  if (!can(pageContext.ctx.actor, 'queue.read')) {
    throw render(403, { message: 'The review desk is for moderators.' })
  }
}
