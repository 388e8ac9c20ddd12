import { describe, expect, it } from 'vitest'
import { emptyGuideContent, GuideDraft } from '#shared/schemas/guide-content.ts'
import { draftContent, editableDraft, moveRow, newEffect, sameDraft } from './draft-model.ts'

const effect: GuideDraft['effects'][number] = {
  adjustable: 'rear_droop', direction: 'down', phase: 'entry', quality: 'steering', change: 'more', strength: 1,
  surfaces: ['loam'], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '',
}
const guide: GuideDraft = {
  ...emptyGuideContent(), title: 'Droop', body: 'Words.', answers: [{ heading: 'Go lower', text: 'It turns in.' }], effects: [effect],
}

describe('a draft as the page edits it', () => {
  it('has room for both answers and gives back what was put in', () => {
    const draft = editableDraft(guide)
    expect(draft.answers).toHaveLength(2)
    expect(draftContent(draft)).toEqual(guide)
  })

  it('shares nothing with what it was made from or gave out', () => {
    const draft = editableDraft(guide)
    const before = draftContent(draft)
    draft.effects[0]!.surfaces.push('wet')
    draft.bench.takes = 'Long'
    expect(guide.effects[0]!.surfaces).toEqual(['loam'])
    expect(before.effects[0]!.surfaces).toEqual(['loam'])
    expect(before.bench.takes).toBe('')
  })

  it('numbers rows once, so that moving keeps which is which', () => {
    const draft = editableDraft({ ...guide, effects: [effect, { ...effect, phase: 'exit' }] })
    draft.effects.push(newEffect(draft.effects))
    moveRow(draft.effects, 2, -1)
    expect(draft.effects.map(({ row }) => row)).toEqual([0, 2, 1])
    moveRow(draft.effects, 0, -1)
    moveRow(draft.effects, 2, 1)
    expect(draft.effects.map(({ row }) => row)).toEqual([0, 2, 1])
  })

  it('starts a new effect without any claim, and keeps it as unfinished as it is', () => {
    const draft = editableDraft(guide)
    draft.effects.push(newEffect(draft.effects))
    const { row, ...added } = draft.effects[1]!
    expect(row).toBe(1)
    expect(added).toEqual({
      adjustable: '', direction: '', phase: '', quality: '', change: '', strength: '', basis: '', note: '',
      surfaces: [], bites: [], carClasses: [], mirrors: false,
    })
    expect(GuideDraft.parse(draftContent(draft)).effects).toEqual([effect, added])
  })
})

describe('sameDraft', () => {
  it('passes over spaces at the ends and blank rows, and nothing else', () => {
    const blank = { kind: 'from_memory' as const, text: '', url: '' }
    expect(sameDraft(guide, { ...guide, title: 'Droop ', sources: [blank] })).toBe(true)
    expect(sameDraft(guide, { ...guide, body: 'Words' })).toBe(false)
    expect(sameDraft(guide, { ...guide, effects: [] })).toBe(false)
  })
})
