export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { getEdit } from '#server/edits/get-edit.ts'
import { listEdits } from '#server/edits/list-edits.ts'
import { listChapters } from '#server/guides/list-chapters.ts'
import { forPage } from '#server/http/page-abort.ts'
import { OPEN_EDIT_STATES, isOpenEditState } from '#shared/vocabulary/edit-states.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, query } = pageContext
  const page = Math.min(100_000, Math.max(1, Number.parseInt(query.page ?? '1', 10) || 1))
  return forPage(pageContext, async () => {
    const [chapters, all, ...open] = await Promise.all([
      listChapters(ctx),
      listEdits(ctx, { whose: 'mine', page }),
      ...OPEN_EDIT_STATES.map((state) => listEdits(ctx, { whose: 'mine', state })),
    ])
    const openEdits = open.flatMap(({ edits }) => edits)
    return {
      now: ctx.clock().toISOString(),
      chapters: chapters.map(({ letter, name, wanted }) => ({ letter, name, wanted })),
      open: await Promise.all(openEdits.map(async (edit) => ({ ...edit, asked: await reasonAsked(edit) }))),
      closed: all.edits.filter(({ state }) => !isOpenEditState(state)),
      page: all.page,
      pages: all.pages,
    }
  })

  async function reasonAsked({ id, state }: { id: string; state: string }) {
    if (state !== 'changes_asked') return null
    const { reviews } = await getEdit(ctx, id)
    return reviews.findLast(({ decision }) => decision === 'ask') ?? null
  }
}
