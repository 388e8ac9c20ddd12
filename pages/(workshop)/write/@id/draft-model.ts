export { editableDraft, draftContent, sameDraft, newEffect, newSource, moveRow, nextRow }
export type { EditableDraft, Row }

import { GuideDraft, type Source } from '#shared/schemas/guide-content.ts'
import { withoutEmptyRows } from '#shared/editing/whole-rows.ts'
import type { EffectDraft } from '#shared/schemas/effect.ts'

/** A row of a list with a number of its own, so that moving it does not change which fields on the page belong to it. */
type Row<T> = T & { row: number }

/** A draft as the page edits it. */
interface EditableDraft extends Omit<GuideDraft, 'answers' | 'effects' | 'sources'> {
  answers: Row<GuideDraft['answers'][number]>[]
  effects: Row<EffectDraft>[]
  sources: Row<Source>[]
}

/** Always with room for both short answers: one for each way. */
function editableDraft(content: GuideDraft): EditableDraft {
  const answer = (at: number) => ({ heading: '', text: '', ...content.answers[at] })
  return {
    title: content.title,
    inShort: content.inShort,
    answers: numbered([answer(0), answer(1)]),
    bench: { ...content.bench },
    body: content.body,
    effects: numbered(content.effects.map(copyEffect)),
    sources: numbered(content.sources),
  }
}

/** The draft as it is sent, in copies that later typing does not reach. */
function draftContent(draft: EditableDraft): GuideDraft {
  return {
    title: draft.title,
    inShort: draft.inShort,
    answers: withoutBlankEnd(draft.answers.map(unnumbered)),
    bench: { ...draft.bench },
    body: draft.body,
    effects: draft.effects.map(({ row: _row, ...effect }) => copyEffect(effect)),
    sources: draft.sources.map(unnumbered),
  }
}

function copyEffect(effect: EffectDraft): EffectDraft {
  return { ...effect, surfaces: [...effect.surfaces], bites: [...effect.bites], carClasses: [...effect.carClasses] }
}

/** The second answer keeps its place when only the first is blank. */
function withoutBlankEnd(answers: GuideDraft['answers']): GuideDraft['answers'] {
  const last = answers.findLastIndex(({ heading, text }) => heading !== '' || text !== '')
  return answers.slice(0, last + 1)
}

/** Whether two drafts say the same, apart from spaces at the ends and blank rows, which the club does not keep. */
function sameDraft(one: GuideDraft, other: GuideDraft): boolean {
  return normal(one) === normal(other)
}

/** A new row claims nothing: every choice is still to be made. */
function newEffect(rows: readonly Row<EffectDraft>[]): Row<EffectDraft> {
  return {
    row: nextRow(rows), adjustable: '', direction: '', phase: '', quality: '', change: '', strength: '',
    surfaces: [], bites: [], carClasses: [], mirrors: false, basis: '', note: '',
  }
}

function newSource(rows: readonly Row<Source>[]): Row<Source> {
  return { row: nextRow(rows), kind: 'common_practice', text: '', url: '' }
}

/** Moves a row one place up (-1) or down (1); at the end of the list it stays. */
function moveRow<T>(rows: T[], at: number, by: -1 | 1): void {
  const to = at + by
  if (to < 0 || to >= rows.length) return
  rows.splice(to, 0, ...rows.splice(at, 1))
}

function nextRow(rows: readonly Row<unknown>[]): number {
  return Math.max(-1, ...rows.map(({ row }) => row)) + 1
}

function numbered<T extends object>(rows: readonly T[]): Row<T>[] {
  return rows.map((value, row) => ({ ...value, row }))
}

function unnumbered<T>({ row: _row, ...value }: Row<T>): Omit<Row<T>, 'row'> {
  return value
}

function normal(draft: GuideDraft): string {
  const checked = GuideDraft.safeParse(draft)
  return JSON.stringify(withoutEmptyRows(checked.success ? checked.data : draft))
}
