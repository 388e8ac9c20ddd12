export { data }
export type { Data }

import { redirect } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { chosenCar } from '#server/cars/list-cars.ts'
import { getEdition } from '#server/guides/get-edition.ts'
import { forPage } from '#server/http/page-abort.ts'
import { guidePage } from '#renderer/guides/guide-page.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query, routeParams } = pageContext
  const number = /^[1-9][0-9]{0,9}$/.test(routeParams.number ?? '') ? Number(routeParams.number) : 0
  const edition = await forPage(pageContext, () => getEdition(ctx, { slug: routeParams.slug ?? '', number }))
  if ('movedTo' in edition) throw redirect(`/guides/${edition.movedTo}/editions/${number}`, 301)
  const path = `/guides/${edition.slug}/editions/${number}`
  return {
    guide: guidePage(ctx, edition, { path, query, car: await chosenCar(ctx) }),
    summary: edition.summary,
    isPublished: edition.isPublished,
    publishedEdition: edition.publishedEdition,
  }
}
