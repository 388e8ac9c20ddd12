export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { listAdjustables } from '#server/effects/list-adjustables.ts'
import { listLapEffects } from '#server/effects/list-lap-effects.ts'
import { listChapters } from '#server/guides/list-chapters.ts'
import { listFreshInk } from '#server/guides/list-fresh-ink.ts'
import { listGuides } from '#server/guides/list-guides.ts'
import { listWantedGuides } from '#server/guides/list-wanted-guides.ts'
import { PHASES } from '#shared/vocabulary/phases.ts'
import { groupByWish } from '../lap/@phase/group-by-wish.ts'
import { complaintsFor } from './complaints.ts'
import { firstGuides } from './first-guides.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data({ ctx }: PageContextServer) {
  const [adjustables, effects, chapters, fresh, wanted, { guides }] = await Promise.all([
    listAdjustables(ctx),
    Promise.all(PHASES.map((phase) => listLapEffects(ctx, phase))),
    listChapters(ctx),
    listFreshInk(ctx, { limit: 5 }),
    listWantedGuides(ctx),
    listGuides(ctx, {}),
  ])
  const complaints = Object.fromEntries(
    PHASES.map((phase, at) => {
      const answered = new Set(groupByWish(effects[at] ?? [], adjustables).map(({ anchor }) => anchor))
      return [phase, complaintsFor(phase, answered)]
    }),
  )
  const named = chapters.map((chapter) => ({
    ...chapter,
    titles: guides.filter((guide) => guide.chapter === chapter.letter).map(({ title }) => title),
  }))
  return { complaints, chapters: named, fresh, wanted, first: firstGuides(guides) }
}
