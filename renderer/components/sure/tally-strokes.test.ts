import { describe, expect, it } from 'vitest'
import { tallyStrokes } from './tally-strokes.ts'

const strokes = (path: string) => path.split('M').length - 1

describe('tallyStrokes', () => {
  it('draws one stroke for each member', () => {
    for (let agree = 0; agree <= 40; agree++) {
      const tally = tallyStrokes(agree, 40 - agree)
      expect(strokes(tally.agree)).toBe(agree)
      expect(strokes(tally.others)).toBe(40 - agree)
    }
  })

  it('lays the fifth across the four before it', () => {
    expect(tallyStrokes(5, 0).agree).toBe('M2 3.5L2.8 18M7 3.5L7.8 18M12 3.5L12.8 18M17 3.5L17.8 18M0 15L21 6')
  })
})
