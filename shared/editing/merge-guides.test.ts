import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { emptyGuideContent, type GuideDraft } from '../schemas/guide-content.ts'
import { arbitraryNeighbours } from './guides.arbitrary.ts'
import { mergeGuides } from './merge-guides.ts'

const effect = {
  adjustable: 'rear_droop', direction: 'up', phase: 'entry', quality: 'steering', change: 'more', strength: 1,
  surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '',
} satisfies GuideDraft['effects'][number]

const base: GuideDraft = {
  ...emptyGuideContent(),
  title: 'Droop',
  inShort: 'How far a wheel hangs.',
  body: '## How\n\nOne.\n\nTwo.\n\nThree.\n',
  effects: [effect],
  sources: [{ kind: 'book', text: 'A book', url: '' }],
}

describe('mergeGuides', () => {
  it('joins changes to different parts', () => {
    const mine = { ...base, title: 'Rear droop', body: base.body.replace('One.', 'One, mine.') }
    const theirs = { ...base, inShort: 'How far a wheel can hang.', body: base.body.replace('Three.', 'Three, theirs.') }
    expect(mergeGuides(base, mine, theirs)).toEqual({
      conflicts: [],
      merged: { ...base, title: 'Rear droop', inShort: 'How far a wheel can hang.', body: '## How\n\nOne, mine.\n\nTwo.\n\nThree, theirs.\n' },
    })
  })

  it('reports the same lines changed differently, with the heading they stand under', () => {
    const mine = { ...base, body: base.body.replace('Two.', 'Two, mine.') }
    const theirs = { ...base, body: base.body.replace('Two.', 'Two, theirs.') }
    const { merged, conflicts } = mergeGuides(base, mine, theirs)
    expect(conflicts).toEqual([
      { field: 'body', label: 'Body, under “How”', base: 'Two.\n', mine: 'Two, mine.\n', theirs: 'Two, theirs.\n' },
    ])
    expect(merged.body).toBe(mine.body)
  })

  it('reports a field that both changed, and takes it when both changed it alike', () => {
    const conflict = mergeGuides(base, { ...base, title: 'Mine' }, { ...base, title: 'Theirs' })
    expect(conflict.conflicts).toEqual([{ field: 'title', label: 'Title', base: 'Droop', mine: 'Mine', theirs: 'Theirs' }])
    expect(mergeGuides(base, { ...base, title: 'Same' }, { ...base, title: 'Same' })).toEqual({ conflicts: [], merged: { ...base, title: 'Same' } })
  })

  it('joins effects about different things', () => {
    const mine = { ...base, effects: [effect, { ...effect, phase: 'exit' as const }] }
    const theirs = { ...base, effects: [{ ...effect, strength: 2 as const }, { ...effect, phase: 'bumps' as const }] }
    const { merged, conflicts } = mergeGuides(base, mine, theirs)
    expect(conflicts).toEqual([])
    expect(merged.effects).toEqual([{ ...effect, strength: 2 }, { ...effect, phase: 'bumps' }, { ...effect, phase: 'exit' }])
  })

  it('reports an effect that one side changed and the other took out', () => {
    const { conflicts } = mergeGuides(base, { ...base, effects: [] }, { ...base, effects: [{ ...effect, strength: 3 }] })
    expect(conflicts).toMatchObject([{ field: 'effects', mine: '' }])
    expect(conflicts[0]!.theirs).toContain('a lot more steering')
  })

  it('keeps a deletion that the other side did not touch', () => {
    expect(mergeGuides(base, { ...base, sources: [] }, { ...base, title: 'Other' }).merged).toEqual({ ...base, title: 'Other', sources: [] })
  })

  it('keeps a blank answer that was only opened', () => {
    const opened = { ...base, answers: [{ heading: '', text: '' }] }
    expect(mergeGuides(base, base, opened).merged).toEqual(opened)
  })

  it('gives the other side when one side changed nothing', () => {
    fc.assert(
      fc.property(arbitraryNeighbours, ({ base, mine, theirs }) => {
        expect(mergeGuides(base, mine, base)).toEqual({ merged: mine, conflicts: [] })
        expect(mergeGuides(base, base, theirs)).toEqual({ merged: theirs, conflicts: [] })
        expect(mergeGuides(base, mine, mine)).toEqual({ merged: mine, conflicts: [] })
      }),
    )
  })

  it('loses no text that either side wrote', () => {
    fc.assert(
      fc.property(arbitraryNeighbours, ({ base, mine, theirs }) => {
        const { merged, conflicts } = mergeGuides(base, mine, theirs)
        const kept = new Set([...texts(merged), ...conflicts.flatMap((one) => [one.mine, one.theirs].flatMap((text) => [text, ...text.split('\n')]))])
        const keptAll = [...kept].join('\n')
        const old = new Set(texts(base))
        for (const text of [...texts(mine), ...texts(theirs)]) {
          if (!old.has(text)) expect(kept.has(text) || keptAll.includes(text)).toBe(true)
        }
      }),
    )
  })

  it('finds the same conflicts whichever side is called mine', () => {
    fc.assert(
      fc.property(arbitraryNeighbours, ({ base, mine, theirs }) => {
        const one = mergeGuides(base, mine, theirs)
        const other = mergeGuides(base, theirs, mine)
        const fields = (merge: typeof one) => merge.conflicts.map((conflict) => conflict.field).filter((field) => field !== 'body').sort()
        expect(fields(one)).toEqual(fields(other))
        expect(one.conflicts.length === 0).toBe(other.conflicts.length === 0)
      }),
    )
  })

  it('falls back to one conflict over the whole body when it is too long to compare by lines', () => {
    const body = (word: string) => Array.from({ length: 3_000 }, (_, n) => `${word}${n}\n`).join('')
    const { conflicts } = mergeGuides({ ...base, body: body('a') }, { ...base, body: body('b') }, { ...base, body: body('c') })
    expect(conflicts).toMatchObject([{ field: 'body', mine: body('b'), theirs: body('c') }])
  })

  it.each([
    ['1,900 equal lines', (side: string) => `${side}\n${'- the same again\n'.repeat(1_900)}${side}\n`],
    ['a heading of 64 KiB of blanks', (side: string) => `${side}\n\n## a${' \t'.repeat(32_000)}${side}\n\n`],
  ])('merges in bounded time and loses neither side: %s', (_name, body) => {
    const start = process.cpuUsage()
    const { conflicts } = mergeGuides({ ...base, body: body('o') }, { ...base, body: body('a') }, { ...base, body: body('b') })
    // Without its bounds either takes many seconds; the aim is a few milliseconds.
    expect(process.cpuUsage(start).user / 1000).toBeLessThan(600)
    expect(conflicts.map((one) => one.mine).join('')).toContain('a\n')
    expect(conflicts.map((one) => one.theirs).join('')).toContain('b\n')
  })

  it('goes into lines however long the common start and end are', () => {
    const body = (side: string) => `${'- the same again\n'.repeat(1_900)}${side}\n${'- the same again\n'.repeat(1_900)}`
    const { conflicts } = mergeGuides({ ...base, body: body('o') }, { ...base, body: body('a') }, { ...base, body: body('b') })
    expect(conflicts).toEqual([{ field: 'body', label: 'Body', base: 'o\n', mine: 'a\n', theirs: 'b\n' }])
  })
})

/** Every text of a guide that a person typed; the body by lines. */
function texts(guide: GuideDraft): string[] {
  return [
    guide.title, guide.inShort, ...guide.answers.flatMap((answer) => [answer.heading, answer.text]),
    ...Object.values(guide.bench), ...guide.body.split('\n'),
    ...guide.effects.map((row) => row.note), ...guide.sources.map((source) => source.text),
  ].filter((text) => text.trim() !== '')
}
