export { title }

import type { PageContextServer } from 'vike/types'
import { saysWhere } from './says-where.ts'
import type { Data } from './+data.ts'

function title({ data }: PageContextServer<Data>): string {
  const { complaints } = data.query
  return `${complaints.length === 0 ? '' : `${complaints.map(saysWhere).join(', ')} · `}By feel · Camber & Clay`
}
