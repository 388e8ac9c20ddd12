export { summaryToKeep }

import type { EditRow } from './edit-row.ts'
import { textLength } from '#shared/schemas/text.ts'

/** The least that the database asks of an edit that was handed in once. */
const LEAST = 3

/** The one line of a draft as it was typed. What was handed in once is never without: there the last line stays until another is written. */
function summaryToKeep({ state }: Pick<EditRow, 'state'>, typed: string): { summary?: string } {
  return state === 'draft' || textLength(typed) >= LEAST ? { summary: typed } : {}
}
