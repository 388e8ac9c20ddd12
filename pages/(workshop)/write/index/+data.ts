export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { listEdits } from '#server/edits/list-edits.ts'
import { listChapters } from '#server/guides/list-chapters.ts'
import { listWantedGuides } from '#server/guides/list-wanted-guides.ts'
import { forPage } from '#server/http/page-abort.ts'
import { OPEN_EDIT_STATES, isOpenEditState } from '#shared/vocabulary/edit-states.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query } = pageContext
  const page = Math.min(100_000, Math.max(1, Number.parseInt(query.page ?? '1', 10) || 1))
  return forPage(pageContext, async () => {
    const [chapters, wanted, all, ...open] = await Promise.all([
      listChapters(ctx),
      listWantedGuides(ctx),
      listEdits(ctx, { whose: 'mine', page }),
      ...OPEN_EDIT_STATES.map((state) => listEdits(ctx, { whose: 'mine', state })),
    ])
    return {
      now: ctx.clock().toISOString(),
      chapters: chapters.map(({ letter, name }) => ({ letter, name })),
      wanted: wanted.map(({ id, chapter, title }) => ({ id, chapter, title })),
      open: open.flatMap(({ edits }) => edits),
      closed: all.edits.filter(({ state }) => !isOpenEditState(state)),
      page: all.page,
      pages: all.pages,
    }
  })
}
