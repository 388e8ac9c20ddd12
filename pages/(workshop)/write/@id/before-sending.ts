export { beforeSending }
export type { ToDo }

import { config } from 'zod'
import { guideProblems } from '#shared/editing/guide-problems.ts'
import { GUIDE_LIMITS, type GuideDraft } from '#shared/schemas/guide-content.ts'
import { textLength } from '#shared/schemas/text.ts'

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
 * What still stands between a draft and the review desk: what the rules of a guide miss, one message a field, and what
 * laying it out has found, one a line.
 */
function beforeSending(draft: GuideDraft, summary: string, found: Found): ToDo[] {
  const lines = [
    ...found.problems.map(({ line, message }) => ({ message, line })),
    ...found.missed.map((message) => ({ message, field: 'body' })),
  ]
  return [...guideProblems(draft), ...lines, ...summaryProblems(summary)]
}

function summaryProblems(summary: string): ToDo[] {
  const length = textLength(summary.trim())
  if (length < 3) return [{ message: 'Say in one line what you changed.', field: 'summary' }]
  return length > GUIDE_LIMITS.summary ? [{ message: `What you changed: keep it under ${GUIDE_LIMITS.summary + 1} characters.`, field: 'summary' }] : []
}
