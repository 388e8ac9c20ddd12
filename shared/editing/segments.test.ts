import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { arbitraryBody } from './guides.arbitrary.ts'
import { changedWords, compareWords, textAfter, textBefore, wordCount } from './segments.ts'

describe('compareWords', () => {
  it('marks the words that were replaced and keeps the rest', () => {
    expect(compareWords('Thicker fluid gives more resistance.', 'Thicker fluid gives more torque.')).toEqual([
      { kind: 'same', text: 'Thicker fluid gives more ' },
      { kind: 'removed', text: 'resistance' },
      { kind: 'added', text: 'torque' },
      { kind: 'same', text: '.' },
    ])
  })

  it('shows neighbouring replaced words as one replacement', () => {
    expect(compareWords('it pulls the nose out', 'it drags one tyre out')).toEqual([
      { kind: 'same', text: 'it ' },
      { kind: 'removed', text: 'pulls the nose' },
      { kind: 'added', text: 'drags one tyre' },
      { kind: 'same', text: ' out' },
    ])
  })

  it('gives both texts back, whatever they are', () => {
    fc.assert(
      fc.property(fc.oneof(arbitraryBody, fc.string()), fc.oneof(arbitraryBody, fc.string()), (before, after) => {
        const segments = compareWords(before, after)
        expect(textBefore(segments)).toBe(before)
        expect(textAfter(segments)).toBe(after)
      }),
    )
  })

  it('falls back to a full replacement when more words differ than it may look at', () => {
    const segments = compareWords('a b c d e f g h', 's t u v w x y z', 3)
    expect(segments.map((segment) => segment.kind)).toEqual(['removed', 'added'])
  })
})

describe('counting words', () => {
  it('counts what a reader would call words', () => {
    expect(wordCount('- 7,000 cSt (front) … ok')).toBe(4)
  })

  it('counts a replaced word once and a changed comma as one', () => {
    expect(changedWords(compareWords('one two three', 'one four three'))).toBe(1)
    expect(changedWords(compareWords('one two', 'one, two'))).toBe(1)
    expect(changedWords(compareWords('one two', 'one two'))).toBe(0)
  })
})
