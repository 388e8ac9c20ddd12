import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { byLetter } from './by-letter.ts'

const named = (...terms: string[]) => terms.map((term) => ({ term }))

describe('byLetter', () => {
  it('groups by first letter whatever its case, in alphabetical order', () => {
    expect(byLetter(named('push', 'Ackermann', 'anti-squat', 'Pinion'))).toEqual([
      { letter: 'A', terms: named('Ackermann', 'anti-squat') },
      { letter: 'P', terms: named('Pinion', 'push') },
    ])
  })

  it('puts figures and signs under one sign, before A', () => {
    expect(byLetter(named('droop', '4WD')).map(({ letter }) => letter)).toEqual(['#', 'D'])
  })

  it('files an accented letter under the plain one', () => {
    expect(byLetter(named('épreuve'))[0]?.letter).toBe('E')
  })

  it('loses no term and repeats no letter', () => {
    fc.assert(
      fc.property(fc.array(fc.string({ minLength: 1 })), (terms) => {
        const groups = byLetter(named(...terms))
        expect(groups.flatMap((group) => group.terms.map(({ term }) => term)).sort()).toEqual([...terms].sort())
        expect(new Set(groups.map(({ letter }) => letter)).size).toBe(groups.length)
      }),
    )
  })
})
