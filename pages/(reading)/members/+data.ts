export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { forPage } from '#server/http/page-abort.ts'
import { listMembers } from '#server/people/list-members.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  return forPage(pageContext, () => listMembers(pageContext.ctx, Number(pageContext.query.page ?? 1)))
}
