export { description }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function description({ data: { comparison } }: PageContextServer<Data>): string {
  const { mark, title, from, to } = comparison
  return `What changed in ${mark} ${title} between edition ${from.number} and edition ${to.number}: words, effects and sources, side by side in one proof.`
}
