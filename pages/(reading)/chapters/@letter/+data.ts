export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { redirect } from 'vike/abort'
import { listAdjustables } from '#server/effects/list-adjustables.ts'
import { getChapter } from '#server/guides/get-chapter.ts'
import { forPage } from '#server/http/page-abort.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const letter = pageContext.routeParams.letter ?? ''
  // Shouted or typed, a mark is the same in small letters; the address stays one.
  if (/^[a-z]$/.test(letter)) throw redirect(`/chapters/${letter.toUpperCase()}`, 301)
  const chapter = await forPage(pageContext, () => getChapter(pageContext.ctx, letter))
  const adjustables = await listAdjustables(pageContext.ctx)
  const onTheCar = chapter.guides.map(({ slug, mark, title }) => ({
    mark,
    title,
    href: `/guides/${slug}`,
    adjustables: adjustables.filter((adjustable) => adjustable.guide === slug).map(({ key }) => key),
  }))
  return { chapter, onTheCar }
}
