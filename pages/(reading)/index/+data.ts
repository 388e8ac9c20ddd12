export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { listAnswered } from '#server/feel/index.ts'
import { listChapters } from '#server/guides/list-chapters.ts'
import { listFreshInk } from '#server/guides/list-fresh-ink.ts'
import { listGuides } from '#server/guides/list-guides.ts'
import { listWantedGuides } from '#server/guides/list-wanted-guides.ts'
import { PHASES } from '#shared/vocabulary/phases.ts'
import { complaintsFor } from './complaints.ts'
import { firstGuides } from './first-guides.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data({ ctx }: PageContextServer) {
  const [answered, chapters, fresh, wanted, { guides }] = await Promise.all([
    listAnswered(ctx),
    listChapters(ctx),
    listFreshInk(ctx, { limit: 5 }),
    listWantedGuides(ctx),
    listGuides(ctx, {}),
  ])
  const complaints = Object.fromEntries(PHASES.map((phase) => [phase, complaintsFor(phase, answered)]))
  const named = chapters.map((chapter) => ({
    ...chapter,
    titles: guides.filter((guide) => guide.chapter === chapter.letter).map(({ title }) => title),
  }))
  return { complaints, chapters: named, fresh, wanted, first: firstGuides(guides) }
}
