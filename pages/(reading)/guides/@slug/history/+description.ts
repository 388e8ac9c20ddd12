export { description }

import type { PageContextServer } from 'vike/types'
import { capital, counted } from '#renderer/words/count-words.ts'
import type { Data } from './+data.ts'

function description({ data: { history } }: PageContextServer<Data>): string {
  return `${capital(counted(history.editions, 'edition'))} of ${history.mark} ${history.title}: what each one changed, who wrote it, who approved it and when.`
}
