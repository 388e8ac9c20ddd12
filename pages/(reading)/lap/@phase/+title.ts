export { title }

import type { PageContextServer } from 'vike/types'
import { phases } from '#shared/vocabulary/phases.ts'
import type { Data } from './+data.ts'

function title({ data: { phase } }: PageContextServer<Data>): string {
  return `${phases[phase].name}: what to change · Camber & Clay`
}
