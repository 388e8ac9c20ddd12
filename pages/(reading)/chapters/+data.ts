export { data }
export type { Data }

import type { PageContextServer } from 'vike/types'
import { listChapters } from '#server/guides/list-chapters.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data({ ctx }: PageContextServer) {
  return { chapters: await listChapters(ctx) }
}
