export { description }

import type { PageContextServer } from 'vike/types'
import { dayOf } from '../../../../dates.ts'
import type { Data } from './+data.ts'

function description({ data: { guide } }: PageContextServer<Data>): string {
  return `${guide.mark} ${guide.title} as it was printed on ${dayOf(guide.publishedAt)}, edition ${guide.edition}. Kept as it was; the guide itself may say something else today.`
}
