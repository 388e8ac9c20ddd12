import { describe, expect, it } from 'vitest'
import { workedWords } from './worked-words.ts'

const example = {
  n: 1, calculator: 'Mix two fluids', inputs: {}, output: 'Thicker fluid', unit: 'mL', says: 4.854, gives: 4.85427, allowed: 0.01,
  offBy: 0.00006, matches: true,
}

describe('workedWords', () => {
  it('shows both numbers with their unit', () => {
    expect(workedWords(example)).toEqual({
      verdict: 'Matches',
      words: 'Mix two fluids, thicker fluid: the page says 4.854\u00A0mL; the formula gives 4.8543\u00A0mL.',
    })
  })

  it('says how far off and how much is allowed', () => {
    const { verdict, words } = workedWords({ ...example, says: 5.34, offBy: 0.1001, matches: false })
    expect(verdict).toBe('Off by 10\u00A0%')
    expect(words).toContain('Allowed: 1\u00A0%.')
    expect(workedWords({ ...example, says: 4.95, offBy: 0.0197, matches: false }).verdict).toBe('Off by 2\u00A0%')
  })

  it('says when the formula has no answer', () => {
    expect(workedWords({ ...example, gives: null, offBy: null, matches: false }).verdict).toBe('No answer')
  })
})
