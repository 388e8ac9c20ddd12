export { description }

import type { PageContextServer } from 'vike/types'
import type { Data } from './+data.ts'

function description({ data: { chapter } }: PageContextServer<Data>): string {
  return `Chapter ${chapter.letter}, ${chapter.name}. ${chapter.about}`
}
