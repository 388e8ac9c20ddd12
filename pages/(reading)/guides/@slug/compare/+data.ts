export { data }
export type { Data }

import { redirect, render } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { compareEditions } from '#server/guides/compare-editions.ts'
import { forPage } from '#server/http/page-abort.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query, routeParams } = pageContext
  const slug = routeParams.slug ?? ''
  const [from, to] = [query.from, query.to].map((number) => (/^[1-9][0-9]{0,9}$/.test(number ?? '') ? Number(number) : null))
  if (from == null || to == null) {
    throw render(404, { message: 'Say which two editions to compare: pick them in the guide’s history.' })
  }
  const comparison = await forPage(pageContext, () => compareEditions(ctx, { slug, from, to }))
  if ('movedTo' in comparison) throw redirect(`/guides/${comparison.movedTo}/compare?from=${from}&to=${to}`, 301)
  return { comparison }
}
