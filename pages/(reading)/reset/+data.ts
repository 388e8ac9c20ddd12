export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { readyPassphrase } from '#server/people/passphrase.ts'

type Data = ReturnType<typeof data>

/** Looking at the link does not use it up: mail programs open links before people do. */
function data(pageContext: PageContextServer) {
  return { token: pageContext.form?.values.token ?? pageContext.query.token ?? '', passphrase: readyPassphrase() }
}
