export { guard }

import { redirect } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { safeNext } from '#server/people/safe-next.ts'

/** Who is signed in has nothing to do here. */
function guard(pageContext: PageContextServer): void {
  if (pageContext.reader === null) return
  const { next } = pageContext.query
  throw redirect(next === undefined ? '/you' : safeNext(next))
}
