export { description }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function description({ data: { guide } }: PageContextServer<Data>): string {
  return guide.inShort
}
