import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'
import { angleOfToe } from './toe.ts'

const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, number>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  const inputs = result.inputs as { toeAngle: number; rimDiameter: number }
  const outputs = result.outputs as { toeDistance: number; totalToe: number }
  return { inputs, outputs, warnings: result.warnings }
}
const refused = (values: Record<string, unknown>) => {
  const result = run(values)
  return result.ok ? undefined : plainSentence(result.errors[0]?.message ?? [])
}
const angle = fc.double({ min: -20, max: 20, noNaN: true })
const diameter = fc.double({ min: 10, max: 1000, noNaN: true })

describe('toe', () => {
  it('gives back the angle that a distance came from', () => {
    fc.assert(
      fc.property(angle, diameter, (toeAngle, rimDiameter) => {
        const { toeDistance } = answered({ toeAngle, rimDiameter }).outputs
        expect(angleOfToe(toeDistance, rimDiameter)).toBeCloseTo(toeAngle, 9)
      }),
    )
  })

  it('is as much out as in, and twice as much for both wheels', () => {
    fc.assert(
      fc.property(angle, diameter, (toeAngle, rimDiameter) => {
        const { toeDistance, totalToe } = answered({ toeAngle, rimDiameter }).outputs
        expect(answered({ toeAngle: -toeAngle, rimDiameter }).outputs.toeDistance).toBeCloseTo(
          -toeDistance,
          12,
        )
        expect(totalToe).toBe(2 * toeDistance)
      }),
    )
  })

  it('doubles on a rim of twice the diameter', () => {
    fc.assert(
      fc.property(angle, fc.double({ min: 10, max: 250, noNaN: true }), (toeAngle, rimDiameter) => {
        const { toeDistance } = answered({ toeAngle, rimDiameter }).outputs
        expect(answered({ toeAngle, rimDiameter: 2 * rimDiameter }).outputs.toeDistance).toBeCloseTo(
          2 * toeDistance,
          9,
        )
      }),
    )
  })

  it.each([
    [
      { toeAngle: 21 },
      'Toe of one wheel must be between −20° and 20°: a wheel turned further than that is steering, not toe.',
    ],
    [
      { rimDiameter: 0 },
      'Rim diameter must be between 10\u00A0mm and 1,000\u00A0mm: that is the range of what one holds a toe gauge to, from a small rim to a full-size one.',
    ],
    [{ rimDiameter: NaN }, 'Rim diameter must be a number, between 10\u00A0mm and 1,000\u00A0mm.'],
  ])('refuses %j with its reason', (values, words) => {
    expect(refused(values)).toBe(words)
  })

  it.each([
    [6, 0],
    [6.1, 1],
    [-6.1, 1],
  ])('warns at %d° %d times', (toeAngle, count) => {
    expect(answered({ toeAngle }).warnings).toHaveLength(count)
  })

  it.each([
    [
      2,
      'At 2° of toe-in, the front edge of the rim stands 2.9\u00A0mm nearer to the centre line than its back edge.',
    ],
    [
      -1,
      'At 1° of toe-out, the front edge of the rim stands 1.45\u00A0mm further from the centre line than its back edge.',
    ],
    [0, 'With no toe both edges of the rim stand equally far from the centre line: 0\u00A0mm.'],
  ])('says what %d° is', (toeAngle, words) => {
    const { inputs, outputs } = answered({ toeAngle })
    const { says } = calculator.answer(inputs, outputs)
    expect(plainSentence(says)).toBe(words)
    expect(says.filter((part) => typeof part !== 'string' && part.main)).toHaveLength(1)
  })

  it('says what half a degree more does', () => {
    const { inputs, outputs } = answered({})
    const { says, rows } = calculator.comparison!(inputs, outputs)
    expect(plainSentence(says)).toBe(
      'Half a degree more toe-in brings the front edge 0.72\u00A0mm further in, at each wheel.',
    )
    expect(rows[1]?.cells[1]).toBeCloseTo(3.6204, 4)
  })

  it('draws the rim as long as it is and its front edge as far in as it says', () => {
    fc.assert(
      fc.property(angle, diameter, (toeAngle, rimDiameter) => {
        const { inputs, outputs } = answered({ toeAngle, rimDiameter })
        const [drawing] = calculator.drawings!(inputs, outputs, 0)
        const points = drawing!.shapes.flatMap((shape) => (shape.kind === 'point' ? [shape.at] : []))
        const [front = [NaN, NaN], back = [NaN, NaN]] = points
        expect(Math.hypot(front[0] - back[0], front[1] - back[1])).toBeCloseTo(rimDiameter, 9)
        expect(back[0] - front[0]).toBeCloseTo(outputs.toeDistance, 9)
      }),
    )
  })
})
