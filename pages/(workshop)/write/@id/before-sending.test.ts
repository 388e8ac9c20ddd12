import { describe, expect, it } from 'vitest'
import { EffectDraft } from '#shared/schemas/effect.ts'
import { emptyGuideContent, type GuideDraft } from '#shared/schemas/guide-content.ts'
import { beforeSending } from './before-sending.ts'

const nothing = { problems: [], missed: [] }

const whole: GuideDraft = {
  ...emptyGuideContent(),
  title: 'Front droop',
  inShort: 'How far the front wheels hang when the car is lifted.',
  body: 'Words.',
}

describe('what is missing before sending', () => {
  it('is nothing for a guide with all it needs', () => {
    expect(beforeSending(whole, 'Adds a caution', nothing)).toEqual([])
  })

  it('names each empty field and where it is', () => {
    const missing = beforeSending({ ...whole, title: '', body: ' ', answers: [{ heading: 'Go thicker', text: '' }] }, 'Adds', nothing)
    expect(missing.map(({ field }) => field)).toEqual(['title', 'answers.0.text', 'body'])
    expect(missing[0]!.message).toContain('Title')
  })

  it('names what the renderer found, with its line', () => {
    expect(beforeSending(whole, 'Adds', { problems: [{ line: 12, message: 'There is no such calculator.' }], missed: ['Off by 10 %'] })).toEqual([
      { message: 'There is no such calculator.', line: 12 },
      { message: 'Off by 10 %', field: 'body' },
    ])
  })

  it('passes over blank rows and still names the right one', () => {
    const blank = { kind: 'from_memory', text: '', url: '' } as const
    const missing = beforeSending({ ...whole, sources: [blank, { ...blank, text: 'x' }] }, 'Adds', nothing)
    expect(missing.map(({ field }) => field)).toEqual(['sources.1.text'])
  })

  it('asks for the one line that the moderator reads first, and for no more than a line', () => {
    expect(beforeSending(whole, '  ', nothing)).toMatchObject([{ field: 'summary' }])
    expect(beforeSending(whole, 'x'.repeat(141), nothing)).toMatchObject([{ field: 'summary' }])
  })

  it('has one message a field', () => {
    const missing = beforeSending({ ...emptyGuideContent(), title: `\n${'x'.repeat(91)}\u0007`, effects: [EffectDraft.parse({})] }, '', nothing)
    const fields = missing.map(({ field }) => field)
    expect(fields).toEqual([...new Set(fields)])
    expect(fields).toEqual(expect.arrayContaining(['title', 'inShort', 'body', 'summary', 'effects.0.adjustable', 'effects.0.strength']))
  })
})
