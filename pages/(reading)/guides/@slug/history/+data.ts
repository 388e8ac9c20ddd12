export { data }
export type { Data }

import { render, redirect } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { getHistory } from '#server/guides/get-history.ts'
import { forPage } from '#server/http/page-abort.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query, routeParams } = pageContext
  const page = /^[1-9][0-9]{0,4}$/.test(query.page ?? '') ? Number(query.page) : 1
  const history = await forPage(pageContext, () => getHistory(ctx, { slug: routeParams.slug ?? '', page }))
  if ('movedTo' in history) throw redirect(`/guides/${history.movedTo}/history`, 301)
  if (page > history.pages) throw render(404, { message: 'The history does not go back that far.' })
  return { history }
}
