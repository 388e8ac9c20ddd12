import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { sampled, type PlotSpec } from '#shared/calculators/plot.ts'
import { say } from '#shared/calculators/sentence.ts'
import { letter } from './figure-size.ts'
import { drawPlot } from './plot-drawing.ts'
import { clippedPath } from './plot-path.ts'
import type { PlacedText } from './keep-apart.ts'

function plotOf(y: (x: number) => number, [min, max]: [number, number], label = 'camber'): PlotSpec {
  return {
    alternative: say`A line.`,
    x: { label: 'travel', unit: 'mm', min: -20, max: 25, scale: 'linear' },
    y: { label: 'camber', unit: 'deg', min, max, scale: 'linear' },
    lines: [{ kind: 'main', label: say`${label}`, points: sampled(-20, 25, y) }],
    points: [{ x: 5, y: y(5), label: say`yours at 5 mm` }],
  }
}
const from = ({ x, anchor, text }: PlacedText) => x - text.length * letter * { start: 0, middle: 0.5, end: 1 }[anchor]
function collisions(words: readonly PlacedText[]): string[] {
  return words.flatMap((one, index) =>
    words.slice(index + 1).flatMap((other) => {
      const apart =
        Math.abs(one.y - other.y) >= 13 ||
        from(one) >= from(other) + other.text.length * letter ||
        from(other) >= from(one) + one.text.length * letter
      return apart ? [] : [`${one.text} / ${other.text}`]
    }),
  )
}

describe('drawPlot', () => {
  it.each<[string, (x: number) => number, [number, number]]>([
    ['rising', (x) => x / 10, [-3, 3]],
    ['falling', (x) => -x / 10, [-3, 3]],
    ['all negative', (x) => -5 + x / 50, [-6, -4]],
    ['flat on an axis without height', () => 2, [2, 2]],
    ['flat at the top', () => 3, [-3, 3]],
    ['flat at the bottom', () => -3, [-3, 3]],
  ])('keeps the words of a %s line readable', (_what, y, range) => {
    for (const width of [360, 250]) {
      for (const label of ['camber', '', 'with the longer link']) {
        const drawing = drawPlot(plotOf(y, range, label), {}, true, width)
        expect(collisions(drawing.words), label).toEqual([])
        for (const word of drawing.words) {
          expect(from(word)).toBeGreaterThanOrEqual(0)
          expect(from(word) + word.text.length * letter).toBeLessThanOrEqual(width + 2)
        }
        expect(JSON.stringify(drawing)).not.toMatch(/NaN|null|Infinity/)
      }
    }
  })

  it('marks zero only where an axis goes through it', () => {
    expect(drawPlot(plotOf((x) => x / 10, [-3, 3]), {}).zero.match(/M/g)).toHaveLength(2)
    expect(drawPlot(plotOf((x) => x / 10 + 5, [0, 8]), {}).zero.match(/M/g)).toHaveLength(1)
  })

  it('leaves the reader’s point out while there is no answer', () => {
    const drawing = drawPlot(plotOf((x) => x / 10, [-3, 3]), {}, false)
    expect(drawing.points).toEqual([])
    expect(drawing.words.some(({ text }) => text.includes('yours'))).toBe(false)
  })
})

describe('clippedPath', () => {
  it('never leaves the plot and never draws what is no number', () => {
    const place = fc.tuple(fc.integer({ min: 0, max: 360 }), fc.oneof(fc.integer({ min: -500, max: 700 }), fc.constant(NaN)))
    fc.assert(
      fc.property(fc.array(place, { minLength: 1 }), (places) => {
        const path = clippedPath(places, 20, 200)
        expect(path).toMatch(/^(M|$)/)
        expect(path).not.toContain('NaN')
        for (const [, y] of path.matchAll(/[ML]\S+ (-?[\d.]+)/g)) {
          expect(Number(y)).toBeGreaterThanOrEqual(19.5)
          expect(Number(y)).toBeLessThanOrEqual(200.5)
        }
      }),
    )
  })

  it('goes to the very edge where a line leaves', () => {
    expect(clippedPath([[0, 100], [100, 300]], 0, 200)).toBe('M0 100L50 200')
    expect(clippedPath([[0, 300], [100, 100]], 0, 200)).toBe('M50 200L100 100')
  })
})
