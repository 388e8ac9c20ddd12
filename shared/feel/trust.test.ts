import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { sureOf, trustIn, type ReportCounts } from './trust.ts'
import { wilsonLowerBound } from './wilson.ts'

const counts = fc.record({ helped: fc.nat(200), same: fc.nat(200), worse: fc.nat(200) })

describe('wilsonLowerBound', () => {
  // R. G. Newcombe, “Two-sided confidence intervals for the single proportion: comparison of seven methods”,
  // Statistics in Medicine 17 (1998) 857, table I, score method without continuity correction. From memory;
  // its z is 1.95996, which moves the fourth decimal by less than half.
  it.each([
    [81, 263, 0.2553],
    [15, 148, 0.0624],
    [0, 20, 0],
    [1, 29, 0.0061],
  ])('of %d in %d is %d', (successes, n, expected) => {
    expect(wilsonLowerBound(successes, n, 1.96)).toBeCloseTo(expected, 4)
  })

  it('lies between nothing and the share itself, and is the smaller root of the score equation', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), fc.double({ min: 0, max: 1, noNaN: true }), (n, part) => {
        const successes = Math.round(part * n * 2) / 2
        const share = successes / n
        const bound = wilsonLowerBound(successes, n, 1.96)
        expect(bound).toBeGreaterThanOrEqual(0)
        expect(bound).toBeLessThanOrEqual(share)
        // (share − bound)² = z² bound (1 − bound) / n defines it.
        expect((share - bound) ** 2).toBeCloseTo((1.96 ** 2 * bound * (1 - bound)) / n, 9)
      }),
    )
  })
})

describe('trustIn', () => {
  it.each([
    ['physics', 0.7],
    ['common_practice', 0.6],
    ['reported', 0.4],
  ] as const)('begins for %s at %d', (basis, prior) => {
    expect(trustIn(basis, { helped: 0, same: 0, worse: 0 })).toBeCloseTo(prior, 12)
  })

  it('never falls when one more member says that it helped instead of worse', () => {
    fc.assert(
      fc.property(counts, (reports) => {
        fc.pre(reports.worse > 0)
        const better = { ...reports, worse: reports.worse - 1, helped: reports.helped + 1 }
        expect(trustIn('reported', better)).toBeGreaterThan(trustIn('reported', reports))
      }),
    )
  })

  it('stays between 0 and 1, and goes to the share of those who agree', () => {
    fc.assert(
      fc.property(counts, (reports) => {
        expect(trustIn('physics', reports)).toBeGreaterThanOrEqual(0)
        expect(trustIn('physics', reports)).toBeLessThanOrEqual(1)
      }),
    )
    expect(trustIn('reported', { helped: 900_000, same: 0, worse: 100_000 })).toBeCloseTo(0.9, 2)
  })
})

describe('sureOf', () => {
  it.each<[ReportCounts, string]>([
    [{ helped: 0, same: 0, worse: 0 }, 'thin'],
    [{ helped: 4, same: 0, worse: 0 }, 'thin'],
    [{ helped: 5, same: 0, worse: 0 }, 'leaning'],
    [{ helped: 3, same: 0, worse: 2 }, 'leaning'],
    [{ helped: 2, same: 1, worse: 2 }, 'split'],
    [{ helped: 9, same: 0, worse: 0 }, 'leaning'],
    [{ helped: 8, same: 0, worse: 2 }, 'settled'],
    [{ helped: 7, same: 2, worse: 1 }, 'settled'],
    [{ helped: 7, same: 1, worse: 2 }, 'leaning'],
    [{ helped: 0, same: 0, worse: 30 }, 'split'],
  ])('%j is %s', (reports, expected) => expect(sureOf(reports)).toBe(expected))
})
