export { description }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function description({ data }: PageContextServer<Data>): string {
  return data.purpose
}
