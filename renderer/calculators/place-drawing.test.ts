import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { armDrawing } from './drawing-fixture.ts'
import { letter } from './figure-size.ts'
import { keepApart, type PlacedText } from './keep-apart.ts'
import { placeDrawing } from './place-drawing.ts'

const placed = placeDrawing(armDrawing(), {})

describe('placeDrawing', () => {
  it('draws a millimetre as long up as across, y upwards', () => {
    const [x, y] = placed.at([0, 0])
    expect(placed.at([10, 0])[0] - x).toBeCloseTo(10 * placed.scale, 0)
    expect(y - placed.at([0, 10])[1]).toBeCloseTo(10 * placed.scale, 0)
  })

  it('keeps the frame inside the picture, whatever its shape', () => {
    const size = fc.double({ min: 0.5, max: 5000, noNaN: true })
    fc.assert(
      fc.property(size, size, size, (left, across, up) => {
        const frame = { left: -left, right: across, bottom: -up / 2, top: up }
        const { at, width, height } = placeDrawing({ ...armDrawing(), frame }, {})
        for (const [x, y] of [at([frame.left, frame.top]), at([frame.right, frame.bottom])]) {
          expect(x).toBeGreaterThanOrEqual(11)
          expect(x).toBeLessThanOrEqual(width - 11)
          expect(y).toBeGreaterThanOrEqual(11)
          expect(y).toBeLessThanOrEqual(height - 11)
        }
      }),
    )
  })

  it('draws every shape with its style, and nothing that is no number', () => {
    const looks = placed.strokes.map(({ look }) => look)
    expect(looks).toEqual([
      'ground', 'hatch', 'part', 'frame', 'thought', 'before', 'thought', 'own', 'own tip', 'own joint', 'dim', 'dim',
    ])
    for (const { d } of placed.strokes) expect(d).toMatch(/^M[-\d. MLAazlhvZ]+$/)
    expect(placed.texts.map(({ text }) => text)).toEqual(['100 mm', 'outer pin', 'the same place'])
  })

  it('puts a dimension to the left of the way it measures', () => {
    const [, y] = placed.at([50, 50])
    const words = placed.texts.find(({ text }) => text === '100 mm')
    expect(words?.y).toBeCloseTo(y + 5, 0)
  })

  it('turns arcs the way the drawing says', () => {
    const arcs = placed.strokes.filter(({ d }) => d.includes('A'))
    expect(arcs).toHaveLength(1)
    const [x, y] = placed.at([0, 10])
    // From the right, clockwise, to straight below the pin.
    expect(arcs[0]?.d).toMatch(/A\S+ \S+ 0 0 1 /)
    expect(arcs[0]?.d.endsWith(`${x} ${y}`)).toBe(true)
  })
})

describe('keepApart', () => {
  it('moves words off one another and into the picture', () => {
    const word = fc.record({
      x: fc.integer({ min: 0, max: 360 }),
      y: fc.integer({ min: 20, max: 280 }),
      text: fc.constantFrom('a', 'outer pin', '100 mm', 'lower arm'),
      anchor: fc.constantFrom('start' as const, 'middle' as const, 'end' as const),
      look: fc.constant(''),
    })
    const from = ({ x, anchor, text }: PlacedText) => x - text.length * letter * { start: 0, middle: 0.5, end: 1 }[anchor]
    fc.assert(
      fc.property(fc.array(word, { maxLength: 4 }), (words) => {
        const apart = keepApart(words, 360, 300)
        apart.forEach((one, index) => {
          expect(from(one)).toBeGreaterThanOrEqual(1.99)
          for (const other of apart.slice(index + 1)) {
            const touch =
              Math.abs(one.y - other.y) < 15 &&
              from(one) < from(other) + other.text.length * letter &&
              from(other) < from(one) + one.text.length * letter
            expect(touch).toBe(false)
          }
        })
      }),
    )
  })
})
