import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { emptyGuideContent, type GuideDraft } from '../schemas/guide-content.ts'
import { headingOf, splitBlocks } from './blocks.ts'
import { compareBodies, type BodyChange } from './compare-bodies.ts'
import { compareGuides } from './compare-guides.ts'
import { arbitraryBody, arbitraryGuide } from './guides.arbitrary.ts'
import { guideTextFields } from './guide-fields.ts'
import { textAfter, textBefore } from './segments.ts'

const effect = {
  adjustable: 'rear_droop', direction: 'up', phase: 'entry', quality: 'steering', change: 'more', strength: 1,
  surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '',
} satisfies GuideDraft['effects'][number]

function guide(parts: Partial<GuideDraft>): GuideDraft {
  return { ...emptyGuideContent(), ...parts }
}

const side = (changes: BodyChange[], read: typeof textBefore) =>
  changes.map((change) => (change.kind === 'same' ? change.text : read(change.words))).join('')

describe('splitBlocks', () => {
  it('splits at blank lines and loses nothing', () => {
    expect(splitBlocks('## A\n\none\ntwo\n\n\nthree')).toEqual(['## A\n\n', 'one\ntwo\n\n\n', 'three'])
    fc.assert(
      fc.property(fc.oneof(arbitraryBody, fc.string()), (text) => {
        expect(splitBlocks(text).join('')).toBe(text)
      }),
    )
  })
})

describe('headingOf', () => {
  it.each([
    ['## How it works\n', 'How it works'],
    ['   ###### Deep ## ', 'Deep'],
    ['## C#', 'C#'],
    ['##\tTab\t#\t', 'Tab'],
    ['## ##', null],
    ['##   ', null],
    ['##Not one', null],
    ['A line\n## Later', null],
  ])('%j', (block, words) => {
    expect(headingOf(block)).toBe(words)
  })
})

describe('compareBodies', () => {
  it('folds unchanged paragraphs, names the heading and goes into words where a paragraph changed', () => {
    const before = '## How it works\n\nThe fluid resists the difference between the wheels.\n\nLast words.'
    const after = '## How it works\n\nThe fluid resists any difference between the wheels.\n\nLast words.'
    expect(compareBodies(before, after)).toEqual([
      { kind: 'same', text: '## How it works\n\n', blocks: 1, words: 3 },
      {
        kind: 'changed',
        heading: 'How it works',
        words: [
          { kind: 'same', text: 'The fluid resists ' },
          { kind: 'removed', text: 'the' },
          { kind: 'added', text: 'any' },
          { kind: 'same', text: ' difference between the wheels.\n\n' },
        ],
      },
      { kind: 'same', text: 'Last words.', blocks: 1, words: 2 },
    ])
  })

  it('shows a paragraph put in between two as added, not as everything after it changed', () => {
    const changes = compareBodies('one two three\n\nseven eight nine\n', 'one two three\n\nfour five six\n\nseven eight nine\n')
    expect(changes.map((change) => change.kind)).toEqual(['same', 'added', 'same'])
  })

  it('does not mark the last paragraph when another is put behind it', () => {
    const changes = compareBodies('one two three\n', 'one two three\n\nfour five six\n')
    expect(changes.map((change) => change.kind)).toEqual(['same', 'added'])
    expect(compareBodies('one\n\ntwo', 'one\n\n\n\ntwo\n').map((change) => change.kind)).toEqual(['same'])
  })

  it('gives both bodies back, the one before but for the blanks between its paragraphs', () => {
    const words = (text: string) => text.replace(/\s/g, '')
    fc.assert(
      fc.property(arbitraryBody, arbitraryBody, (before, after) => {
        const changes = compareBodies(before, after)
        expect(words(side(changes, textBefore))).toBe(words(before))
        expect(side(changes, textAfter)).toBe(after)
      }),
    )
  })

  it.each([
    ['all paragraphs differ', (n: number) => `word${n} `.repeat(8) + '\n\n'],
    ['one enormous paragraph', (n: number) => `word${n} `],
    ['thousands of one-word paragraphs', (n: number) => `${n}\n\n`],
    ['one heading full of blanks', (n: number) => (n % 1_000_000 === 0 ? '## a' : '\t '.repeat(500)) + (n % 1_000_000 === 64 ? 'b' : '')],
  ])('compares two 64 KiB bodies in bounded time: %s', (_name, part) => {
    const text = (offset: number) => {
      let body = ''
      for (let n = offset; body.length < 65_000; n++) body += part(n)
      return body
    }
    const [before, after] = [text(0), text(1_000_000)]
    const start = process.cpuUsage()
    const changes = compareBodies(before, after)
    const milliseconds = process.cpuUsage(start).user / 1000
    expect(side(changes, textAfter)).toBe(after)
    // The aim is 200 ms; the rest is room for a slow machine and a cold start.
    expect(milliseconds).toBeLessThan(600)
  })
})

describe('compareGuides', () => {
  it('finds no change between a guide and itself', () => {
    fc.assert(
      fc.property(arbitraryGuide, (same) => {
        const changes = compareGuides(same, same)
        expect(changes.counts).toEqual({ words: 0, fields: 0, effects: 0, calculators: 0, pictures: 0, sources: 0 })
        expect(changes.effectsReordered).toBe(false)
      }),
    )
  })

  it('gives every field back on both sides', () => {
    fc.assert(
      fc.property(arbitraryGuide, arbitraryGuide, (before, after) => {
        const { fields } = compareGuides(before, after)
        const old = guideTextFields(before)
        guideTextFields(after).forEach(({ field, text }, at) => {
          const change = fields.find((entry) => entry.field === field)
          expect(change === undefined ? old[at]!.text : textAfter(change.words)).toBe(text)
          expect(change === undefined ? text : textBefore(change.words)).toBe(old[at]!.text)
        })
      }),
    )
  })

  it('accounts for every effect and source of both sides', () => {
    fc.assert(
      fc.property(arbitraryGuide, arbitraryGuide, (before, after) => {
        const { effects, sources } = compareGuides(before, after)
        for (const [changes, old, fresh] of [[effects, before.effects, after.effects], [sources, before.sources, after.sources]] as const) {
          const added = changes.filter((change) => change.kind === 'added').length
          const removed = changes.filter((change) => change.kind === 'removed').length
          expect(old.length - removed + added).toBe(fresh.length)
        }
      }),
    )
  })

  it('says which part of an effect changed', () => {
    const changes = compareGuides(guide({ effects: [effect] }), guide({ effects: [{ ...effect, strength: 2, note: 'felt' }] }))
    expect(changes.effects).toEqual([
      { kind: 'changed', before: effect, after: { ...effect, strength: 2, note: 'felt' }, changedKeys: ['strength', 'note'] },
    ])
  })

  it('sees an effect about another phase as one taken out and one put in', () => {
    const changes = compareGuides(guide({ effects: [effect] }), guide({ effects: [{ ...effect, phase: 'exit' }] }))
    expect(changes.effects.map((change) => change.kind)).toEqual(['added', 'removed'])
  })

  it('notices when only the order of effects changed', () => {
    const other = { ...effect, phase: 'exit' as const }
    const changes = compareGuides(guide({ effects: [effect, other] }), guide({ effects: [other, effect] }))
    expect(changes.effects).toEqual([])
    expect(changes.effectsReordered).toBe(true)
  })

  it('counts calculators that were set differently', () => {
    const body = (volume: number) => `Words.\n\n::calculator{slug=fluid-blend totalVolume=${volume}}\n\n::picture{file=a}\n`
    expect(compareGuides(guide({ body: body(10) }), guide({ body: body(12) })).counts).toMatchObject({ calculators: 1, pictures: 0 })
  })
})
