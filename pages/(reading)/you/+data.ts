export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { forPage } from '#server/http/page-abort.ts'
import { readOwnPage } from '#server/people/own-page.ts'
import { readyPassphrase } from '#server/people/passphrase.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  return { you: await forPage(pageContext, () => readOwnPage(pageContext.ctx)), passphrase: readyPassphrase() }
}
