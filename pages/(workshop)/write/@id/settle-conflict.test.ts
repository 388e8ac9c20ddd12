import { describe, expect, it } from 'vitest'
import { mergeGuides } from '#shared/editing/merge-guides.ts'
import { emptyGuideContent, type GuideDraft } from '#shared/schemas/guide-content.ts'
import { draftContent, editableDraft } from './draft-model.ts'
import { canSettle, settleConflict, type Side } from './settle-conflict.ts'

const effect: GuideDraft['effects'][number] = {
  adjustable: 'rear_droop', direction: 'up', phase: 'entry', quality: 'steering', change: 'more', strength: 1,
  surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '',
}
const base: GuideDraft = {
  ...emptyGuideContent(), title: 'Droop', body: '## One\n\nFirst words.\n\n## Two\n\nLast words.\n', effects: [effect],
  sources: [{ kind: 'book', text: 'A book of cars', url: '' }],
}
const mine: GuideDraft = {
  ...base, title: 'Rear droop', body: base.body.replace('First words', 'My words').replace('Last words', 'My last'),
  effects: [{ ...effect, strength: 2 }], sources: [{ kind: 'paper', text: 'A book of cars', url: '' }],
}
const theirs: GuideDraft = {
  ...base, title: 'Droop at both ends', body: base.body.replace('First words', 'Their words').replace('Last words', 'Their last'),
  effects: [{ ...effect, strength: 3 }], sources: [{ kind: 'standard', text: 'A book of cars', url: '' }],
}

function settled(side: Side) {
  const { merged, conflicts } = mergeGuides(base, mine, theirs)
  const draft = editableDraft(merged)
  for (const conflict of conflicts) settleConflict(draft, conflict, side, { mine, theirs })
  return { draft, conflicts }
}

describe('settling a conflict', () => {
  it('can put every place to their side', () => {
    const { draft, conflicts } = settled('theirs')
    expect(conflicts.map(({ field }) => field)).toEqual(['title', 'body', 'body', 'effects', 'sources'])
    expect(draftContent(draft)).toEqual(theirs)
  })

  it('leaves mine as it stands, and can go back to it', () => {
    expect(draftContent(settled('mine').draft)).toEqual(mine)
    const { draft, conflicts } = settled('theirs')
    for (const conflict of conflicts) settleConflict(draft, conflict, 'mine', { mine, theirs })
    expect(draftContent(draft)).toEqual(mine)
  })

  it('leaves the body alone where the writer has changed the place by hand', () => {
    const { draft, conflicts } = settled('mine')
    draft.body = 'Something else entirely.'
    const inBody = conflicts.find(({ field }) => field === 'body')!
    expect(canSettle(draft, inBody, 'theirs')).toBe(false)
    settleConflict(draft, inBody, 'theirs', { mine, theirs })
    expect(draft.body).toBe('Something else entirely.')
  })

  it('has nothing to press where a field does not exist', () => {
    expect(canSettle(editableDraft(mine), { field: 'colour', label: '', base: '', mine: '', theirs: '' }, 'theirs')).toBe(false)
  })
})
