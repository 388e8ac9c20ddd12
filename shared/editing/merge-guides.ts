export { mergeGuides }
export type { MergeConflict }

import type { GuideDraft, Source } from '../schemas/guide-content.ts'
import { sourceKinds } from '../vocabulary/source-kinds.ts'
import { effectIdentity, sameEffect } from './effect-identity.ts'
import { effectSentence } from './effect-sentence.ts'
import { guideTextFields } from './guide-fields.ts'
import { mergeBodies } from './merge-bodies.ts'
import { settle, type MergeConflict } from './merge-conflict.ts'
import { mergeRows } from './merge-rows.ts'

interface GuideMerge {
  /** Both sides' changes in one; where they conflict it keeps mine, and a person has to look before it is used. */
  merged: GuideDraft
  conflicts: MergeConflict[]
}

/**
 * Three-way merge of a guide: what I wrote and what they published, both from the same base. A value that one side
 * changed is taken; one that both changed differently is a conflict. Nothing either side wrote is lost: it is in
 * `merged` or in a conflict.
 */
function mergeGuides(base: GuideDraft, mine: GuideDraft, theirs: GuideDraft): GuideMerge {
  const fields = mergeTextFields(base, mine, theirs)
  const body = mergeBodies(base.body, mine.body, theirs.body)
  const effects = mergeRows(base.effects, mine.effects, theirs.effects, { identity: effectIdentity, same: sameEffect })
  const sources = mergeRows(base.sources, mine.sources, theirs.sources, { identity: (source) => source.text, same: sameSource })
  return {
    merged: { ...fields.merged, body: body.body, effects: effects.rows, sources: sources.rows },
    conflicts: [
      ...fields.conflicts,
      ...body.conflicts,
      ...effects.conflicts.map((rows) => ({ field: 'effects', label: 'An effect', ...inWords(rows, effectSentence) })),
      ...sources.conflicts.map((rows) => ({ field: 'sources', label: 'A source', ...inWords(rows, sourceSentence) })),
    ],
  }
}

function mergeTextFields(base: GuideDraft, mine: GuideDraft, theirs: GuideDraft) {
  const baseFields = guideTextFields(base)
  const theirFields = guideTextFields(theirs)
  const conflicts: MergeConflict[] = []
  const text: Record<string, string> = {}
  guideTextFields(mine).forEach(({ field, label, text: mineText }, at) => {
    const { value, conflict } = settle(baseFields[at]!.text, mineText, theirFields[at]!.text)
    if (conflict) conflicts.push({ field, label, base: baseFields[at]!.text, mine: mineText, theirs: theirFields[at]!.text })
    text[field] = value
  })
  const of = (field: string) => text[field]!
  const answer = (n: number) => ({ heading: of(`answers.${n}.heading`), text: of(`answers.${n}.text`) })
  return {
    conflicts,
    merged: {
      title: of('title'),
      inShort: of('inShort'),
      answers: mergedAnswers([answer(0), answer(1)], base, mine, theirs),
      bench: { reachFor: of('bench.reachFor'), moveBy: of('bench.moveBy'), youGiveUp: of('bench.youGiveUp'), takes: of('bench.takes') },
    },
  }
}

/**
 * The merged answers as a list again: as one side has it where the other changed nothing, blank rows included; otherwise
 * as long as the longer side, without blank ones at the end that only filled up the list.
 */
function mergedAnswers(answers: GuideDraft['answers'], base: GuideDraft, mine: GuideDraft, theirs: GuideDraft): GuideDraft['answers'] {
  const whole = settle(base.answers, mine.answers, theirs.answers, sameAnswers)
  if (!whole.conflict) return whole.value
  const list = answers.slice(0, Math.max(mine.answers.length, theirs.answers.length))
  while (list.at(-1)?.heading === '' && list.at(-1)?.text === '') list.pop()
  return list
}

function sameAnswers(a: GuideDraft['answers'], b: GuideDraft['answers']): boolean {
  return a.length === b.length && a.every((answer, n) => answer.heading === b[n]!.heading && answer.text === b[n]!.text)
}

function inWords<T>(rows: Record<'base' | 'mine' | 'theirs', readonly T[]>, say: (row: T) => string) {
  const all = (list: readonly T[]) => list.map(say).join('\n')
  return { base: all(rows.base), mine: all(rows.mine), theirs: all(rows.theirs) }
}

function sameSource(a: Source, b: Source): boolean {
  return a.kind === b.kind && a.text === b.text && a.url === b.url
}

function sourceSentence(source: Source): string {
  return `${sourceKinds[source.kind]}: ${source.text}${source.url === '' ? '' : ` (${source.url})`}`
}
