export { title }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function title({ data: { chapter } }: PageContextServer<Data>): string {
  return `${chapter.letter} ${chapter.name} · Camber & Clay`
}
