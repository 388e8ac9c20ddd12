export { guard }

import { redirect } from 'vike/abort'
import type { PageContextServer } from 'vike/types'

/** Writing is for members: a visitor signs in first and comes back to where they were going. */
function guard(pageContext: PageContextServer): void {
  if (pageContext.reader === null) {
    throw redirect(`/sign-in?next=${encodeURIComponent(pageContext.urlOriginal)}`)
  }
}
