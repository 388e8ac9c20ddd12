export { numberChanges }
export type { NumberedChange, NumberedComparison }

import type { GuideComparison } from '#shared/editing/compare-guides.ts'
import type { EffectDraft } from '#shared/schemas/effect.ts'
import { textAfter, textBefore, type Segment } from '#shared/editing/segments.ts'
import { placeRemarks, type Placed, type Remark } from './place-remarks.ts'

/** One entry in the list of changes; `id` is where it stands on the page. */
interface NumberedChange {
  number: number
  id: string
  title: string
  kind: string
}

/** Of drafts too, in which an effect may be unfinished. */
type Comparison = GuideComparison<EffectDraft>
type Numbered<T> = T & { number: number; id: string }
type Changed = Exclude<Placed, { kind: 'same' }>
type Same = Extract<Placed, { kind: 'same' }>

/** A comparison with a number at every change, in the order in which the page shows them. */
interface NumberedComparison {
  fields: Numbered<Comparison['fields'][number]>[]
  body: (Same | Numbered<Changed>)[]
  effects: Numbered<Comparison['effects'][number] & { title: string }>[]
  reordered: Numbered<{ title: string }> | null
  sources: Numbered<Comparison['sources'][number]>[]
  list: NumberedChange[]
}

const LONGEST_TITLE = 44

/**
 * Numbers the changes of a comparison from 1.
 * @param effectTitle the effect in a few words, such as “Front diff fluid thicker, corner exit”
 * @param remarks what laying the text out has noticed, to be shown where it is
 */
function numberChanges(
  changes: Comparison,
  effectTitle: (effect: EffectDraft) => string,
  remarks: readonly Remark[] = [],
): NumberedComparison {
  const list: NumberedChange[] = []
  const next = (title: string, kind: string) => {
    const number = list.length + 1
    const id = `change-${number}`
    list.push({ number, id, title, kind })
    return { number, id }
  }
  return {
    fields: changes.fields.map((field) => ({ ...field, ...next(field.label, 'Field') })),
    body: placeRemarks(changes.body, remarks).map((block) => {
      if (block.kind === 'same') return { ...block, text: block.text.split(/\n{2,}/).map(withoutSoftBreaks).join('\n\n').trim() }
      // A blank line more or less at the end of a paragraph is nothing to decide on.
      if (isBlankChange(block)) return { kind: 'same', text: textAfter(block.words), blocks: 1, words: 0, remarks: block.remarks }
      return { ...block, ...next(titleOf(block), kindOf(block)), words: asRead(block.words) }
    }),
    effects: changes.effects.map((effect) => {
      const title = effectTitle((effect.after ?? effect.before)!)
      return { ...effect, title, ...next(title, effect.kind === 'added' ? 'Lap, new' : effect.kind === 'removed' ? 'Lap, taken out' : 'Lap') }
    }),
    reordered: changes.effectsReordered ? { title: 'Effects in another order', ...next('Effects in another order', 'Lap') } : null,
    sources: changes.sources.map((source) => {
      const kind = source.kind === 'added' ? 'Source, new' : source.kind === 'removed' ? 'Source, taken out' : 'Source'
      return { ...source, ...next(short((source.after ?? source.before)!.text || 'A source without words'), kind) }
    }),
    list,
  }
}

/** Lines that Markdown reads as one are shown as one, and no blank line is marked at the end. */
function asRead(words: readonly Segment[]): Segment[] {
  const whole = words.map(({ text }) => text).join('')
  const joined = words.map(({ kind, text }) => ({ kind, text: isProse(whole) ? withoutSoftBreaks(text) : text }))
  const last = joined.findLastIndex(({ text }) => text.trim() !== '')
  return joined.slice(0, last + 1).map((segment, at) => (at === last ? { ...segment, text: segment.text.trimEnd() } : segment))
}

function withoutSoftBreaks(block: string): string {
  return isProse(block) ? block.replace(/\n(?=\S)/g, ' ') : block
}

/** In a list, a table or a block mark every line counts. */
function isProse(block: string): boolean {
  return !/^ {0,3}(?:[-*+>|#]|:::?|\d+[.)]|`{3})/m.test(block)
}

function isBlankChange(block: Changed): boolean {
  return block.words.every(({ kind, text }) => kind === 'same' || text.trim() === '')
}

/** The heading a paragraph stands under, or its first words. */
function titleOf(block: Changed): string {
  const words = textAfter(block.words).trim() || textBefore(block.words).trim()
  const plain = words.replace(/^[#>\s*-]+/, '').replace(/:{1,3}[a-z]+(?=[[{])/g, '').replace(/[[\]{}*_]+/g, ' ').replace(/ +/g, ' ').trim()
  return short(block.heading !== null && !words.startsWith('#') ? block.heading : plain || 'A paragraph')
}

function kindOf(block: Changed): string {
  return block.kind === 'added' ? 'Words, new' : block.kind === 'removed' ? 'Words, taken out' : 'Words'
}

function short(text: string): string {
  const line = text.split('\n')[0]!.trim()
  if (line.length <= LONGEST_TITLE) return line
  const cut = line.slice(0, LONGEST_TITLE)
  return `${cut.slice(0, Math.max(cut.lastIndexOf(' '), LONGEST_TITLE / 2)).trimEnd()} …`
}
