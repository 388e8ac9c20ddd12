export { title }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function title({ data: { comparison } }: PageContextServer<Data>): string {
  const { mark, title: name, from, to } = comparison
  return `Edition ${from.number} against ${to.number} of ${mark} ${name} · Camber & Clay`
}
