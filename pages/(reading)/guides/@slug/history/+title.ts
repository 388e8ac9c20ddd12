export { title }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function title({ data: { history } }: PageContextServer<Data>): string {
  const leaf = history.page > 1 ? `, leaf ${history.page}` : ''
  return `History of ${history.mark} ${history.title}${leaf} · Camber & Clay`
}
