import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { roundedUp, windowAround } from './plot-window.ts'

describe('the ends of a plot', () => {
  it('stand still while the value moves, then jump by a step', () => {
    expect(windowAround(1.6, 0.5)).toEqual([1, 2])
    expect(windowAround(1.74, 0.5)).toEqual([1, 2])
    expect(windowAround(1.76, 0.5)).toEqual([1.5, 2.5])
  })

  it('go up to the next round number, never below the value and never far above', () => {
    expect([0.9, 1, 1.2, 7, 8.1, 420].map(roundedUp)).toEqual([1, 1, 1.5, 8, 10, 500])
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1e9, noNaN: true }), (value) => {
        expect(roundedUp(value)).toBeGreaterThanOrEqual(value * (1 - 1e-5))
        expect(roundedUp(value)).toBeLessThanOrEqual(value * 1.5 * (1 + 1e-5))
      }),
    )
  })
})
