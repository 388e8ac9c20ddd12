export { beforeSending }
export type { ToDo }

import { config } from 'zod'
import { GuideContent, type GuideDraft } from '#shared/schemas/guide-content.ts'
import { withoutEmptyRows } from '#shared/editing/whole-rows.ts'

/** One thing to mend before a guide can go to the desk: at a field, or at a line of the text. */
interface ToDo {
  message: string
  field?: string
  line?: number
}

// Without this zod looks whether it may compile code, which the page's security policy refuses and the console reports.
config({ jitless: true })

/** What laying the guide out has found. */
interface Found {
  problems: readonly { line: number; message: string }[]
  /** Worked examples that do not match, in words. */
  missed: readonly string[]
}

/**
 * What still stands between a draft and the review desk: what the rules of a guide miss, and what laying it out has
 * found. Rows that were opened and left blank do not count: they go when the draft is sent.
 */
function beforeSending(draft: GuideDraft, summary: string, found: Found): ToDo[] {
  const checked = GuideContent.safeParse(withoutEmptyRows(draft))
  const fields = checked.success
    ? []
    : checked.error.issues.map(({ message, path }) => ({ message, field: fieldOf(draft, path) }))
  const lines = [
    ...found.problems.map(({ line, message }) => ({ message, line })),
    ...found.missed.map((message) => ({ message, field: 'body' })),
  ]
  const inOneLine = summary.trim().length >= 3 ? [] : [{ message: 'Say in one line what you changed.', field: 'summary' }]
  return [...fields, ...lines, ...inOneLine]
}

/** Where a row stands on the page: blank rows, which the check passes over, are still there. */
function fieldOf(draft: GuideDraft, path: readonly PropertyKey[]): string {
  const [list, row, ...rest] = path
  if ((list !== 'answers' && list !== 'sources') || typeof row !== 'number') return path.join('.')
  const isBlank = (values: object) => Object.entries(values).every(([key, value]) => key === 'kind' || value === '')
  const whole = draft[list].flatMap((values, at) => (isBlank(values) ? [] : [at]))
  return [list, whole[row] ?? row, ...rest].join('.')
}
