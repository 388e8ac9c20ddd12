import { describe, expect, it } from 'vitest'
import { compareGuides } from '#shared/editing/compare-guides.ts'
import { emptyGuideContent, type GuideDraft } from '#shared/schemas/guide-content.ts'
import { numberChanges } from './number-changes.ts'

const effect = {
  adjustable: 'rear_droop', direction: 'up', phase: 'entry', quality: 'steering', change: 'more', strength: 1,
  surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '',
} satisfies GuideDraft['effects'][number]

const before: GuideDraft = {
  ...emptyGuideContent(),
  title: 'Droop',
  body: '## How it works\n\nWhen you lift off, load moves to the front.\n\nLast words of the part.\n',
  effects: [effect],
}

const numbered = (after: GuideDraft) => numberChanges(compareGuides(before, after), ({ adjustable, phase }) => `${adjustable} ${phase}`)

describe('numberChanges', () => {
  it('counts fields, words, effects and sources through, in the order of the page', () => {
    const { list, fields, effects, sources } = numbered({
      ...before,
      title: 'Droop at both ends',
      body: before.body.replace('load moves', 'weight moves') + '\nA new paragraph that says how long it takes to do all of this.\n',
      effects: [{ ...effect, strength: 2 }],
      sources: [{ kind: 'from_memory', text: 'Our own bench.', url: '' }],
    })
    expect(list.map(({ number, title, kind }) => [number, title, kind])).toEqual([
      [1, 'Title', 'Field'],
      [2, 'How it works', 'Words'],
      [3, 'How it works', 'Words, new'],
      [4, 'rear_droop entry', 'Lap'],
      [5, 'Our own bench.', 'Source, new'],
    ])
    expect([fields[0]!.id, effects[0]!.id, sources[0]!.id]).toEqual(['change-1', 'change-4', 'change-5'])
  })

  it('names a paragraph before any heading by its first words, shortened at a space', () => {
    const after = { ...before, body: 'A **long** opening sentence that goes on well past what fits in a narrow list.\n\n' + before.body }
    expect(numbered(after).list[0]).toMatchObject({ title: 'A long opening sentence that goes on well …', kind: 'Words, new' })
  })

  it('joins the lines of a paragraph as Markdown does, and leaves those of a list', () => {
    const lines = (text: string) => {
      const { body } = numbered({ ...before, body: `${before.body}\n${text}\n` })
      const added = body.find((block) => block.kind === 'added')
      return added?.kind === 'added' ? added.words : []
    }
    expect(lines('One line of a new paragraph\nand its second line.')).toEqual([
      { kind: 'added', text: 'One line of a new paragraph and its second line.' },
    ])
    expect(lines('- one\n- two')).toEqual([{ kind: 'added', text: '- one\n- two' }])
  })

  it('is empty for two guides that say the same', () => {
    expect(numbered(before).list).toEqual([])
  })
})
