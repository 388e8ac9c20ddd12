import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { evened, type CornerInputs } from './wheel-loads.ts'
import { calculator } from './index.ts'

type Inputs = CornerInputs & Record<string, number>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return result as typeof result & { inputs: Inputs; outputs: Record<string, number> }
}
const says = (values: Partial<Inputs>) => {
  const { inputs, outputs } = answered(values)
  return {
    answer: [
      calculator.answer(inputs, outputs as never).says,
      ...calculator.answer(inputs, outputs as never).more,
    ].map((sentence) => plainSentence(sentence)),
    comparison: plainSentence(calculator.comparison?.(inputs, outputs as never).says ?? []),
  }
}

const grams = fc.double({ min: 1, max: 5000, noNaN: true })
const car = fc.record({
  frontLeft: grams,
  frontRight: grams,
  rearLeft: grams,
  rearRight: grams,
  wheelbase: fc.double({ min: 100, max: 600, noNaN: true }),
  trackFront: fc.double({ min: 80, max: 600, noNaN: true }),
  trackRear: fc.double({ min: 80, max: 600, noNaN: true }),
})

describe('corner-weights', () => {
  it('puts the centre of gravity inside the wheels', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { outputs } = answered(values)
        expect(outputs.cgFromFrontAxle).toBeGreaterThan(0)
        expect(outputs.cgFromFrontAxle).toBeLessThan(values.wheelbase)
        expect(Math.abs(outputs.cgFromCentreLine ?? NaN)).toBeLessThan(
          Math.max(values.trackFront, values.trackRear) / 2,
        )
      }),
    )
  })

  it('turns into its mirror image when left and right change places', () => {
    fc.assert(
      fc.property(car, (values) => {
        const one = answered(values).outputs
        const other = answered({
          ...values,
          frontLeft: values.frontRight,
          frontRight: values.frontLeft,
          rearLeft: values.rearRight,
          rearRight: values.rearLeft,
        }).outputs
        expect(other.frontShare).toBeCloseTo(one.frontShare ?? NaN, 9)
        expect(other.leftShare).toBeCloseTo(100 - (one.leftShare ?? NaN), 9)
        expect(other.crossWeight).toBeCloseTo(100 - (one.crossWeight ?? NaN), 9)
        expect(other.cgFromCentreLine).toBeCloseTo(-(one.cgFromCentreLine ?? NaN), 9)
      }),
    )
  })

  it('knows shares only: twice the load everywhere changes the total alone', () => {
    fc.assert(
      fc.property(car, fc.double({ min: 0.1, max: 1, noNaN: true }), (values, times) => {
        const one = answered(values).outputs
        const scaled = answered({
          ...values,
          frontLeft: values.frontLeft * times,
          frontRight: values.frontRight * times,
          rearLeft: values.rearLeft * times,
          rearRight: values.rearRight * times,
        }).outputs
        expect(scaled.total).toBeCloseTo((one.total ?? NaN) * times, 6)
        for (const key of ['frontShare', 'leftShare', 'crossWeight', 'cgFromFrontAxle', 'cgFromCentreLine'])
          expect(scaled[key]).toBeCloseTo(one[key] ?? NaN, 6)
      }),
    )
  })

  it('evens the diagonals without moving weight or centre of gravity', () => {
    fc.assert(
      fc.property(car, (values) => {
        const now = answered(values).outputs
        const { frontLeft, frontRight, rearLeft, rearRight } = evened(values)
        expect(frontRight + rearLeft).toBeCloseTo(frontLeft + rearRight, 6)
        expect(frontLeft + frontRight).toBeCloseTo(values.frontLeft + values.frontRight, 6)
        expect(rearLeft + rearRight).toBeCloseTo(values.rearLeft + values.rearRight, 6)
        const moment =
          ((frontLeft - frontRight) * values.trackFront + (rearLeft - rearRight) * values.trackRear) /
          (2 * (now.total ?? NaN))
        expect(moment).toBeCloseTo(now.cgFromCentreLine ?? NaN, 6)
      }),
    )
  })

  it('refuses a wheel that pulls, words, and an empty set of scales', () => {
    const refused = (values: Record<string, unknown>) => {
      const result = run(values)
      return result.ok ? [] : result.errors.map(({ field, message }) => [field, plainSentence(message)])
    }
    expect(refused({ rearLeft: -1 })).toEqual([
      [
        'rearLeft',
        'Rear left wheel must be between 0\u00A0g and 5,000\u00A0g: a wheel cannot pull at its scale, and no R/C car puts more on one wheel.',
      ],
    ])
    expect(refused({ frontLeft: 'heavy' })[0]?.[0]).toBe('frontLeft')
    expect(refused({ frontLeft: NaN, trackRear: Infinity }).map(([field]) => field)).toEqual([
      'frontLeft',
      'trackRear',
    ])
    expect(refused({ frontLeft: 0, frontRight: 0, rearLeft: 0, rearRight: 0 })).toEqual([
      ['frontLeft', 'All four wheels read 0\u00A0g: there is no car on the scales.'],
    ])
  })

  it.each([
    [{}, []],
    [{ frontLeft: 0 }, ['frontLeft', 'frontRight']],
    [{ frontRight: 1050, frontLeft: 650 }, ['frontRight']],
    [{ frontRight: 1020, frontLeft: 680 }, []],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says that an even car is even', () => {
    const { answer, comparison } = says({})
    expect(answer[0]).toBe('Cross weight is 50\u00A0%: both diagonals carry the same.')
    expect(answer[1]).toBe('Leave the spring collars where they are.')
    expect(answer[3]).toBe(
      'The centre of gravity lies 172\u00A0mm behind the front axle, on the centre line.',
    )
    expect(comparison).toBe('The diagonals are even already.')
  })

  it('says what to do about too much and too little cross weight', () => {
    const heavy = says({ frontLeft: 800, frontRight: 900, rearLeft: 1000, rearRight: 900 })
    expect(heavy.answer[0]).toBe(
      'Cross weight is 52.8\u00A0%: front right and rear left together carry 200\u00A0g more than the other two.',
    )
    expect(heavy.answer[1]).toContain('a quarter turn off the spring collars front right and rear left')
    expect(heavy.comparison).toBe(
      'Even diagonals move 50\u00A0g from front right to front left, and 50\u00A0g from rear left to rear right.',
    )
    const light = says({ frontLeft: 900, frontRight: 800, rearLeft: 900, rearRight: 1000 })
    expect(light.answer[0]).toContain('carry 200\u00A0g less')
    expect(light.answer[1]).toContain('a quarter turn off the spring collars front left and rear right')
    expect(light.comparison).toBe(
      'Even diagonals move 50\u00A0g from front left to front right, and 50\u00A0g from rear right to rear left.',
    )
    expect(says({ frontRight: 855, rearRight: 945 }).answer[1]).toContain('Leave it')
  })

  it('sends the battery to the lighter side, which no spring replaces', () => {
    expect(says({ frontLeft: 900, rearLeft: 1000 }).answer[2]).toContain(
      'move the battery or ballast to the right',
    )
    expect(says({ frontRight: 900, rearRight: 1000 }).answer[2]).toContain('ballast to the left')
  })

  it('says so when no spring can even the diagonals', () => {
    expect(says({ frontLeft: 100, frontRight: 0, rearLeft: 1000, rearRight: 100 }).comparison).toContain(
      'bent or binds',
    )
  })

  it('draws circles whose areas are the loads, and the centre of gravity where it is', () => {
    const { inputs, outputs } = answered({
      frontLeft: 400,
      frontRight: 1600,
      rearLeft: 900,
      rearRight: 900,
      trackRear: 250,
    })
    const [drawing] = calculator.drawings?.(inputs, outputs as never, 0) ?? []
    const circles = drawing?.shapes.filter((shape) => shape.kind === 'circle') ?? []
    expect(circles.map(({ at }) => at)).toEqual([
      [-127.5, 0],
      [127.5, 0],
      [-125, -325],
      [125, -325],
    ])
    expect(((circles[1]?.radius ?? 0) / (circles[0]?.radius ?? 1)) ** 2).toBeCloseTo(4, 9)
    expect(circles.map(({ style }) => style)).toEqual(['part', 'own', 'own', 'part'])
    expect(drawing?.shapes.find((shape) => shape.kind === 'point')).toMatchObject({
      at: [-(outputs.cgFromCentreLine ?? NaN), -(outputs.cgFromFrontAxle ?? NaN)],
    })
  })

  it('keeps the picture still while the readings move', () => {
    const frameOf = (values: Partial<Inputs>) => {
      const { inputs, outputs } = answered(values)
      return calculator.drawings?.(inputs, outputs as never, 0)[0]?.frame
    }
    expect(frameOf({ frontLeft: 400, wheelbase: 330 })).toEqual(frameOf({}))
  })
})
