export { title }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function title(pageContext: PageContextServer): string {
  const { edit } = pageContext.data as Data
  const name = edit.title || edit.guide?.title || 'a new guide'
  return `Review: ${edit.guide === null ? name : `${edit.guide.mark} ${name}`} · Camber & Clay`
}
