import { describe, expect, it } from 'vitest'
import { CAR_CLASSES } from '#shared/vocabulary/conditions.ts'
import { classWords } from './class-words.ts'

describe('classWords', () => {
  it('names few classes, in the order of the vocabulary', () => {
    expect(classWords(['truggy_8', 'buggy_8e'])).toBe('1/8 electric buggy, 1/8 truggy')
  })

  it('names what is left out when that is shorter', () => {
    expect(classWords(CAR_CLASSES.filter((carClass) => carClass !== 'truck_10'))).toBe('all classes but 1/10 stadium truck')
  })

  it('says nothing when it holds for every car', () => {
    expect(classWords([])).toBe('')
    expect(classWords(CAR_CLASSES)).toBe('')
  })
})
