import { scaleLinear, scaleLog } from 'd3-scale'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plotScale } from './plot-scale.ts'

const domain = fc
  .tuple(fc.double({ min: 0.01, max: 1e5, noNaN: true }), fc.double({ min: 1.05, max: 1e4, noNaN: true }))
  .map(([min, times]): [number, number] => [min, min * times])

describe('plotScale', () => {
  it('puts values where d3-scale puts them', () => {
    fc.assert(
      fc.property(domain, fc.double({ min: 0, max: 1, noNaN: true }), ([min, max], share) => {
        const value = min + (max - min) * share
        expect(plotScale('linear', [min, max], [200, 10]).at(value)).toBeCloseTo(
          scaleLinear([min, max], [200, 10])(value),
          6,
        )
        expect(plotScale('log', [min, max], [200, 10]).at(value)).toBeCloseTo(
          scaleLog([min, max], [200, 10])(value),
          6,
        )
      }),
    )
  })

  it('marks a linear axis where d3-scale marks it', () => {
    fc.assert(
      fc.property(domain, ([min, max]) => {
        // A mark on the very end of an axis may fall to either side by rounding; only those inside are
        // compared.
        const inside = (ticks: number[]) =>
          ticks.filter((tick) => tick - min > 1e-6 * (max - min) && max - tick > 1e-6 * (max - min))
        const theirs = inside(scaleLinear([min, max], [0, 1]).ticks(5))
        const ours = inside(plotScale('linear', [min, max], [0, 1]).ticks)
        expect(ours).toHaveLength(theirs.length)
        ours.forEach((tick, index) => expect(tick).toBeCloseTo(theirs[index] ?? NaN, 6))
      }),
    )
  })

  it('marks a logarithmic axis with 1, 2 and 5 of each decade', () => {
    expect(plotScale('log', [900, 21000], [0, 1]).ticks).toEqual([1000, 2000, 5000, 10000, 20000])
    expect(plotScale('log', [0.5, 1e6], [0, 1]).ticks).toEqual([1, 10, 100, 1000, 1e4, 1e5, 1e6])
    expect(plotScale('log', [5100, 9900], [0, 1]).ticks).toEqual([6000, 7000, 8000, 9000])
  })
})
