export { title }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function title({ data }: PageContextServer<Data>): string {
  return `${data.title} · Camber & Clay`
}
