import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { GuideDraft, emptyGuideContent } from '../schemas/guide-content.ts'
import { fieldsToGuide, guideToFields } from './form-fields.ts'
import { changeRows, rowAction } from './form-rows.ts'
import { arbitraryGuide } from './guides.arbitrary.ts'

describe('the write form’s fields', () => {
  it('give the guide back, there and back again', () => {
    fc.assert(
      fc.property(arbitraryGuide, (guide) => {
        const back = GuideDraft.parse(fieldsToGuide(guideToFields(guide)))
        const sorted = (draft: GuideDraft) => ({
          ...draft,
          effects: draft.effects.map((effect) => ({
            ...effect, surfaces: [...effect.surfaces].sort(), bites: [...effect.bites].sort(), carClasses: [...effect.carClasses].sort(),
          })),
        })
        expect(sorted(back)).toEqual(sorted(guide))
        expect(guideToFields(back)).toEqual(guideToFields(guide))
      }),
    )
  })

  it('survive a real posted form, with the line ends that browsers send', () => {
    const posted = new URLSearchParams({ ...guideToFields(emptyGuideContent()), body: 'one\r\ntwo' }).toString()
    expect(GuideDraft.parse(fieldsToGuide(Object.fromEntries(new URLSearchParams(posted)))).body).toBe('one\ntwo')
  })

  it('say at the field what is wrong with an effect', () => {
    const parsed = GuideDraft.safeParse(fieldsToGuide({ 'effects.4.adjustable': 'rear_droop', 'effects.4.strength': 'lots' }))
    expect(parsed.error!.issues.map((issue) => issue.path.join('.'))).toContain('effects.0.strength')
  })

  it('never throw, whatever is posted', () => {
    fc.assert(fc.property(fc.dictionary(fc.string(), fc.string()), (fields) => void GuideDraft.safeParse(fieldsToGuide(fields))))
  })
})

describe('adding and removing rows', () => {
  it('reads the buttons', () => {
    expect(rowAction('add-effect')).toEqual({ list: 'effects', deed: 'add' })
    expect(rowAction('remove-source:3')).toEqual({ list: 'sources', deed: 'remove', row: 3 })
    for (const other of ['save', 'add-effect:1', 'remove-effect', 'remove-effect:x', 'add-body']) expect(rowAction(other)).toBeNull()
  })

  it('adds a row that can be saved, and takes the right one out', () => {
    const one = changeRows(guideToFields(emptyGuideContent()), { list: 'effects', deed: 'add' })
    const two = changeRows({ ...one, 'effects.0.note': 'first' }, { list: 'effects', deed: 'add' })
    expect(GuideDraft.parse(fieldsToGuide(two)).effects).toHaveLength(2)
    const left = GuideDraft.parse(fieldsToGuide(changeRows(two, { list: 'effects', deed: 'remove', row: 1 }))).effects
    expect(left.map((effect) => effect.note)).toEqual(['first'])
  })
})
