import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'
import {
  ackermannShares,
  idealInnerAngle,
  idealOuterAngle,
  largestOuterAngle,
  turnRadius,
} from './steering.ts'

type Inputs = Parameters<typeof calculator.compute>[0]
type Outputs = ReturnType<typeof calculator.compute>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Partial<Inputs>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { inputs: result.inputs as Inputs, outputs: result.outputs as Outputs, warnings: result.warnings }
}
const refused = (values: Record<string, unknown>) => {
  const result = run(values)
  return result.ok ? [] : result.errors.map(({ field, message }) => `${field}: ${plainSentence(message)}`)
}
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
/** Cars whose outer wheel can turn as far as the pair does. */
const pair = fc
  .record({
    wheelbase: between(100, 600),
    kingpinSpacing: between(20, 500),
    share: between(0.02, 0.98),
    innerAngle: between(0.5, 75),
  })
  .map(({ share, ...size }) => ({ ...size, outerAngle: Math.max(0.5, share * largestOuterAngle(size)) }))
  .filter((steering) => steering.outerAngle < largestOuterAngle(steering) && steering.outerAngle <= 75)

describe('ackermann', () => {
  it('finds the outer angle again that an ideal inner one came from', () => {
    fc.assert(
      fc.property(pair, (steering) => {
        const inner = idealInnerAngle(steering, steering.outerAngle)
        expect(inner).toBeGreaterThan(steering.outerAngle)
        expect(idealOuterAngle(steering, inner)).toBeCloseTo(steering.outerAngle, 9)
      }),
    )
  })

  it('is 0 for parallel wheels and 100 for the ideal pair by every definition', () => {
    fc.assert(
      fc.property(pair, (steering) => {
        const shares = (innerAngle: number) => Object.values(ackermannShares({ ...steering, innerAngle }))
        for (const share of shares(steering.outerAngle)) expect(share).toBeCloseTo(0, 8)
        for (const share of shares(idealInnerAngle(steering, steering.outerAngle))) {
          expect(Math.abs(share - 100)).toBeLessThan(1e-6)
        }
      }),
    )
  })

  it('grows with the inner angle, and falls below zero when the outer wheel turns further', () => {
    fc.assert(
      fc.property(pair, between(0.01, 5), (steering, further) => {
        fc.pre(steering.innerAngle + further <= 75)
        const { ackermann } = answered(steering).outputs
        expect(
          answered({ ...steering, innerAngle: steering.innerAngle + further }).outputs.ackermann,
        ).toBeGreaterThan(ackermann)
        expect(Math.sign(ackermann)).toBe(Math.sign(steering.innerAngle - steering.outerAngle))
      }),
    )
  })

  it('does not depend on the size of the car, and its radius grows with it', () => {
    fc.assert(
      fc.property(pair, between(1, 5), (steering, times) => {
        const one = answered(steering).outputs
        const other = answered({
          ...steering,
          wheelbase: times * steering.wheelbase,
          kingpinSpacing: times * steering.kingpinSpacing,
        }).outputs
        expect(other.idealInnerAngle).toBeCloseTo(one.idealInnerAngle, 8)
        expect(Math.abs(other.turnRadius - times * one.turnRadius)).toBeLessThan(
          1e-6 * (1 + Math.abs(other.turnRadius)),
        )
      }),
    )
  })

  it('puts the turn’s centre on both axles of an ideal pair', () => {
    fc.assert(
      fc.property(pair, (steering) => {
        const inner = idealInnerAngle(steering, steering.outerAngle)
        fc.pre(inner < 89)
        const fromInner = steering.wheelbase / Math.tan((inner * Math.PI) / 180) + steering.kingpinSpacing / 2
        expect(Math.abs(fromInner - turnRadius(steering))).toBeLessThan(1e-6 * steering.wheelbase)
      }),
    )
  })

  it('refuses an outer angle that no inner one can follow', () => {
    expect(refused({ outerAngle: 59 })).toEqual([
      'outerAngle: With these lengths the outer wheel must stay below 58.4°: there the inner wheel would stand square to the car, and no angle of it follows the turn.',
    ])
    expect(answered({ outerAngle: 58 }).outputs.idealInnerAngle).toBeLessThan(90)
  })

  it.each([
    [
      { outerAngle: 0 },
      'outerAngle: Outer wheel must be between 0.5° and 75°: straight wheels make no turn to compare, and no joint steers further.',
    ],
    [
      { innerAngle: 90 },
      'innerAngle: Inner wheel must be between 0.5° and 75°: straight wheels make no turn to compare, and no joint steers further.',
    ],
    [
      { wheelbase: -325 },
      'wheelbase: Wheelbase must be between 100\u00A0mm and 5,000\u00A0mm: that is the range from the smallest model to a full-size car.',
    ],
    [
      { kingpinSpacing: NaN },
      'kingpinSpacing: Between the steering pivots must be a number, between 20\u00A0mm and 2,500\u00A0mm.',
    ],
  ])('refuses %j with its reason', (values, words) => {
    expect(refused(values)).toEqual([words])
  })

  it.each([
    [{}, []],
    [{ outerAngle: 4 }, ['outerAngle']],
    [{ innerAngle: 20 }, ['innerAngle']],
    [{ innerAngle: 25 }, []],
    [{ kingpinSpacing: 400, outerAngle: 38, innerAngle: 60 }, []],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the share first, then the ideal angle', () => {
    const says = (values: Partial<Inputs>) => {
      const { inputs, outputs } = answered(values)
      const { says: first, more } = calculator.answer(inputs, outputs)
      expect(first.filter((part) => typeof part !== 'string' && part.main)).toHaveLength(1)
      return [first, more[0] ?? []].map((sentence) => plainSentence(sentence))
    }
    expect(says({})).toEqual([
      'With 25° outside and 30° inside, your steering has 61.1\u00A0% Ackermann.',
      'To follow the turn without scrubbing the inner wheel would stand at 33.2°: yours is 3.2° short of it.',
    ])
    expect(says({ innerAngle: 36 })[1]).toContain('yours is 2.8° past it')
    expect(says({ innerAngle: idealInnerAngle({ wheelbase: 325, kingpinSpacing: 200 }, 25) })[1]).toBe(
      'That is the pair of angles that follows the turn without scrubbing.',
    )
  })

  it('says what one degree more does', () => {
    const { inputs, outputs } = answered({})
    expect(plainSentence(calculator.comparison!(inputs, outputs).says)).toBe(
      '1° more at the inner wheel adds 12.2\u00A0% of Ackermann.',
    )
  })

  it('plots the reader’s pair and keeps every line inside its axes', () => {
    fc.assert(
      fc.property(pair, (steering) => {
        const { inputs, outputs } = answered(steering)
        const [plot] = calculator.plots!(inputs, outputs, 0)
        expect(plot!.points[0]).toMatchObject({ x: steering.outerAngle, y: steering.innerAngle })
        for (const [x, y] of plot!.lines.flatMap(({ points }) => points)) {
          expect(x).toBeLessThanOrEqual(plot!.x.max + 1e-9)
          expect(y).toBeGreaterThanOrEqual(0)
          expect(y).toBeLessThanOrEqual(plot!.y.max + 1e-9)
        }
      }),
    )
  })

  it('draws both axles to the line of the rear axle, or to the edge of the picture', () => {
    fc.assert(
      fc.property(pair, (steering) => {
        const { inputs, outputs } = answered(steering)
        const [drawing] = calculator.drawings!(inputs, outputs, 0)
        const axle = drawing!.shapes.find((shape) => shape.kind === 'line' && shape.style === 'own')
        const [from = [NaN, NaN], to = [NaN, NaN]] = axle?.kind === 'line' ? axle.points : []
        const angle = (Math.atan2(from[1] - to[1], from[0] - to[0]) * 180) / Math.PI
        expect(angle).toBeCloseTo(steering.innerAngle, 6)
        expect(Math.abs(to[1]) < 1e-9 || Math.abs(to[0] - drawing!.frame.left) < 1e-9).toBe(true)
      }),
    )
  })
})
