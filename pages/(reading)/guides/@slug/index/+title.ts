export { title }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function title({ data: { guide } }: PageContextServer<Data>): string {
  return `${guide.mark} ${guide.title} · Camber & Clay`
}
