export { data }
export type { Data }

import { redirect } from 'vike/abort'
import type { PageContextServer } from 'vike/types'
import { chosenCar } from '#server/cars/list-cars.ts'
import { getGuide } from '#server/guides/get-guide.ts'
import { forPage } from '#server/http/page-abort.ts'
import { guidePage } from '#renderer/guides/guide-page.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query, routeParams } = pageContext
  const guide = await forPage(pageContext, () => getGuide(ctx, routeParams.slug ?? ''))
  if ('movedTo' in guide) throw redirect(`/guides/${guide.movedTo}`, 301)
  return { guide: guidePage(ctx, guide, { path: `/guides/${guide.slug}`, query, car: await chosenCar(ctx) }) }
}
