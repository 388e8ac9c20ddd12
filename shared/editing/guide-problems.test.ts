import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { EffectDraft } from '../schemas/effect.ts'
import { emptyGuideContent, GuideContent, GuideDraft } from '../schemas/guide-content.ts'
import { guideProblems, typedProblems } from './guide-problems.ts'
import { arbitraryGuide } from './guides.arbitrary.ts'
import { withoutEmptyRows } from './whole-rows.ts'

const whole: GuideDraft = {
  ...emptyGuideContent(), title: 'Front droop', inShort: 'How far the front wheels hang when the car is lifted.', body: 'Words.',
}

describe('what keeps a draft from being a guide', () => {
  it('is nothing exactly for a guide, and names each field once', () => {
    fc.assert(
      fc.property(arbitraryGuide, (draft) => {
        const problems = guideProblems(draft)
        expect(problems.length === 0).toBe(GuideContent.safeParse(withoutEmptyRows(draft)).success)
        expect(new Set(problems.map(({ field }) => field)).size).toBe(problems.length)
      }),
    )
  })

  it('names every open choice of an unfinished effect', () => {
    const problems = guideProblems({ ...whole, effects: [EffectDraft.parse({ adjustable: 'rear_droop', phase: 'entry' })] })
    expect(problems.map(({ field }) => field)).toEqual(['direction', 'quality', 'change', 'strength', 'basis'].map((key) => `effects.0.${key}`))
  })

  it('says of words that stand there what is wrong, and nothing of what is still to be written', () => {
    const typed = { ...whole, title: 'x'.repeat(91), inShort: '', bench: { ...whole.bench, takes: 'Ten minutes,\nor fifteen' } }
    expect(typedProblems(typed).map(({ field }) => field)).toEqual(['title', 'bench.takes'])
    expect(typedProblems({ ...whole, inShort: 'Not yet', effects: [EffectDraft.parse({})] })).toEqual([])
  })
})

describe('a draft', () => {
  it('is kept as it was typed, over every limit of a guide', () => {
    const typed = {
      ...whole,
      title: 'x'.repeat(500),
      inShort: 'Two\nlines',
      answers: [{ heading: 'y'.repeat(300), text: 'z' }],
      effects: [EffectDraft.parse({ note: 'n'.repeat(900) })],
      sources: [{ kind: 'book' as const, text: '', url: 'javascript:alert(1)' }],
    }
    expect(GuideDraft.parse(typed)).toEqual(typed)
  })

  it('has hard caps all the same', () => {
    expect(GuideDraft.safeParse({ ...whole, title: 'x'.repeat(4_001) }).success).toBe(false)
    expect(GuideDraft.safeParse({ ...whole, title: 'a\u0000b' }).success).toBe(false)
    expect(GuideDraft.safeParse({ ...whole, effects: [{ direction: 'sideways' }] }).success).toBe(false)
    const full = { ...whole, body: 'é'.repeat(32_768), sources: Array.from({ length: 40 }, () => ({ kind: 'book', text: 'é'.repeat(4_000), url: '' })) }
    expect(GuideDraft.safeParse(full).error?.issues).toMatchObject([{ path: ['body'] }])
  })
})
