export { compareGuides, noChanges }
export type { ChangeSizes, GuideComparison }

import type { Effect, EffectDraft } from '../schemas/effect.ts'
import type { GuideDraft } from '../schemas/guide-content.ts'
import { compareBodies, type BodyChange } from './compare-bodies.ts'
import { compareEffects, compareSources, type EffectChange, type SourceChange } from './compare-lists.ts'
import { guideTextFields } from './guide-fields.ts'
import { changedWords, compareWords, textAfter, textBefore, type Segment } from './segments.ts'

interface FieldChange {
  field: string
  label: string
  words: Segment[]
}

/** How much changed, by kind. */
interface ChangeSizes {
  /** Words of the body and of the short fields that were put in, taken out or replaced. */
  words: number
  fields: number
  effects: number
  /** Calculators and worked examples in the body that were put in, taken out or set differently. */
  calculators: number
  pictures: number
  sources: number
}

const noChanges: ChangeSizes = { words: 0, fields: 0, effects: 0, calculators: 0, pictures: 0, sources: 0 }

/** @typeParam E what an effect may be: whole ones among editions, unfinished ones too where a draft is compared */
interface GuideComparison<E extends EffectDraft = Effect> {
  /** Short fields that differ. */
  fields: FieldChange[]
  /** The whole body in order; no entry but `same` ones when it did not change. */
  body: BodyChange[]
  effects: EffectChange<E>[]
  effectsReordered: boolean
  sources: SourceChange[]
  counts: ChangeSizes
}

/** Everything that differs between two states of a guide, in the order in which a page shows it. */
function compareGuides<Guide extends GuideDraft>(before: Guide, after: Guide): GuideComparison<Guide['effects'][number]> {
  const newFields = guideTextFields(after)
  const fields = guideTextFields(before).flatMap((old, at) => {
    const fresh = newFields[at]!
    return old.text === fresh.text ? [] : [{ field: old.field, label: old.label, words: compareWords(old.text, fresh.text) }]
  })
  const body = compareBodies(before.body, after.body)
  const { changes: effects, reordered: effectsReordered } = compareEffects(before.effects, after.effects)
  const sources = compareSources(before.sources, after.sources)
  return { fields, body, effects, effectsReordered, sources, counts: countsOf({ fields, body, effects, sources }) }
}

function countsOf(changes: Pick<GuideComparison<EffectDraft>, 'fields' | 'body' | 'effects' | 'sources'>): ChangeSizes {
  const changedBlocks = changes.body.flatMap((block) => (block.kind === 'same' ? [] : [block.words]))
  return {
    words: [...changes.fields.map((field) => field.words), ...changedBlocks].reduce((sum, words) => sum + changedWords(words), 0),
    fields: changes.fields.length,
    effects: changes.effects.length,
    calculators: countChangedLines(changedBlocks, /^::(?:calculator|worked)\b/),
    pictures: countChangedLines(changedBlocks, /^::picture\b/),
    sources: changes.sources.length,
  }
}

/** Lines of one kind that stand in only one of the two texts; a line that was altered counts once. */
function countChangedLines(blocks: readonly Segment[][], kind: RegExp): number {
  const linesOf = (text: string) => text.split('\n').map((line) => line.trim()).filter((line) => kind.test(line))
  const old = blocks.flatMap((words) => linesOf(textBefore(words)))
  const fresh = blocks.flatMap((words) => linesOf(textAfter(words)))
  const without = (lines: string[], others: string[]) => {
    const left = [...others]
    return lines.filter((line) => {
      const at = left.indexOf(line)
      if (at >= 0) left.splice(at, 1)
      return at < 0
    }).length
  }
  return Math.max(without(old, fresh), without(fresh, old))
}
