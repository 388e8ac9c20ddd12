export { guideProblems, typedProblems, oneForEachField }
export type { GuideProblem }

import { GuideContent, type GuideDraft } from '../schemas/guide-content.ts'
import { textLength } from '../schemas/text.ts'
import { withoutEmptyRows } from './whole-rows.ts'

/** One thing to mend before a guide can be handed in; `field` is named as in the write form. */
interface GuideProblem {
  field: string
  message: string
}

/**
 * What keeps a draft from being a guide, one message a field. Short answers and sources that were opened and left blank do
 * not count: they go when it is sent.
 */
function guideProblems(draft: GuideDraft): GuideProblem[] {
  const checked = GuideContent.safeParse(withoutEmptyRows(draft))
  if (checked.success) return []
  return oneForEachField(checked.error.issues.map(({ message, path }) => ({ field: fieldOf(draft, path), message })))
}

/** No field asks for more than this many characters at least, so whatever is wrong with a longer text is not that it is short. */
const LONGEST_LEAST = 20

/** Only what is wrong with words that stand there: too long, on two lines, no address. What is still to be written is not. */
function typedProblems(draft: GuideDraft): GuideProblem[] {
  return guideProblems(draft).filter(({ field }) => textLength(textAt(draft, field).trim()) >= LONGEST_LEAST)
}

/** The first message of each field: a field has room for one, and what is mended is mended whole. */
function oneForEachField<Problem extends { field: string }>(problems: readonly Problem[]): Problem[] {
  const seen = new Set<string>()
  return problems.filter(({ field }) => !seen.has(field) && seen.add(field))
}

/** Where a row stands in the form: blank rows, which the check passes over, are still there. */
function fieldOf(draft: GuideDraft, path: readonly PropertyKey[]): string {
  const [list, row, ...rest] = path
  if ((list !== 'answers' && list !== 'sources') || typeof row !== 'number') return path.join('.')
  const isBlank = (values: object) => Object.entries(values).every(([key, value]) => key === 'kind' || value === '')
  const whole = draft[list].flatMap((values, at) => (isBlank(values) ? [] : [at]))
  return [list, whole[row] ?? row, ...rest].join('.')
}

function textAt(draft: GuideDraft, field: string): string {
  const value = field.split('.').reduce<unknown>((part, key) => (part as Record<string, unknown> | undefined)?.[key], draft)
  return typeof value === 'string' ? value : ''
}
