export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { safeNext } from '#server/people/safe-next.ts'

type Data = ReturnType<typeof data>

function data(pageContext: PageContextServer) {
  return { next: safeNext(pageContext.form?.values.next ?? pageContext.query.next) }
}
