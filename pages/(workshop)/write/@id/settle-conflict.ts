export { settleConflict, canSettle }
export type { Side, Theirs }

import type { MergeConflict } from '#shared/editing/merge-guides.ts'
import { effectSentence } from '#shared/editing/effect-sentence.ts'
import type { GuideDraft } from '#shared/schemas/guide-content.ts'
import type { EditableDraft } from './draft-model.ts'
import { nextRow } from './draft-model.ts'

type Side = 'mine' | 'theirs'
type Theirs = Pick<GuideDraft, 'effects' | 'sources'>

/** A place that both sides changed can be put to either side by a press, while the text there is still one of the two. */
function canSettle(draft: EditableDraft, conflict: MergeConflict, side: Side): boolean {
  const { field } = conflict
  if (field === 'effects' || field === 'sources') return true
  if (field === 'body') return placeInBody(draft.body, conflict[otherSide(side)]) !== null
  return textAt(draft, field) !== null
}

/** Puts one side of a conflict into the draft. Where the writer has changed the place by hand, the body is left alone. */
function settleConflict(draft: EditableDraft, conflict: MergeConflict, side: Side, rows: { mine: Theirs; theirs: Theirs }): void {
  const { field } = conflict
  if (field === 'effects') {
    const isOwn = (of: Side) => (effect: GuideDraft['effects'][number]) => linesOf(conflict[of]).includes(effectSentence(effect))
    draft.effects = putIn(draft.effects, rows[side].effects.filter(isOwn(side)), (row) => isOwn('mine')(row) || isOwn('theirs')(row))
  } else if (field === 'sources') {
    const isOwn = (of: Side) => ({ text }: { text: string }) => linesOf(conflict[of]).some((line) => line.includes(text))
    draft.sources = putIn(draft.sources, rows[side].sources.filter(isOwn(side)), (row) => isOwn('mine')(row) || isOwn('theirs')(row))
  } else if (field === 'body') {
    const place = placeInBody(draft.body, conflict[otherSide(side)])
    if (place !== null) draft.body = draft.body.slice(0, place.from) + conflict[side] + draft.body.slice(place.to)
  } else {
    textAt(draft, field)?.(conflict[side])
  }
}

/** The new rows stand where the first of the old ones stood. */
function putIn<T extends object>(list: (T & { row: number })[], rows: readonly T[], isOld: (row: T) => boolean): (T & { row: number })[] {
  const at = list.findIndex(isOld)
  const rest = list.filter((row) => !isOld(row))
  const place = at === -1 ? rest.length : at
  const first = nextRow(list)
  rest.splice(place, 0, ...rows.map((row, n) => ({ ...row, row: first + n })))
  return rest
}

function placeInBody(body: string, text: string): { from: number; to: number } | null {
  if (text === '') return null
  const from = body.indexOf(text)
  return from === -1 ? null : { from, to: from + text.length }
}

/** Sets a one-line text by the name of its field; null where there is none of that name. */
function textAt(draft: EditableDraft, field: string): ((text: string) => void) | null {
  const [name, key, part] = field.split('.')
  if (name === 'title' || name === 'inShort') return (text) => (draft[name] = text)
  if (name === 'bench' && key !== undefined && key in draft.bench) return (text) => (draft.bench[key as keyof EditableDraft['bench']] = text)
  const answer = name === 'answers' ? draft.answers[Number(key)] : undefined
  if (answer !== undefined && (part === 'heading' || part === 'text')) return (text) => (answer[part] = text)
  return null
}

function otherSide(side: Side): Side {
  return side === 'mine' ? 'theirs' : 'mine'
}

function linesOf(text: string): string[] {
  return text.split('\n').filter((line) => line !== '')
}
