import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { overshoot, released } from './corner.ts'
import { calculator } from './index.ts'

const answered = (values: Record<string, unknown>) => {
  const result = runDefinition(calculator, values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return result
}
const refused = (values: Record<string, unknown>) => {
  const result = runDefinition(calculator, values)
  return result.ok ? [] : result.errors.map(({ field, message }) => [field, plainSentence(message)])
}
const outputsOf = (values: Record<string, number>) => answered(values).outputs as Record<string, number>
const ratioOf = (key: string, one: Record<string, number>, other: Record<string, number>) =>
  (outputsOf(one)[key] ?? NaN) / (outputsOf(other)[key] ?? NaN)
const saysWith = (values: Record<string, unknown>) => {
  const { inputs, outputs } = answered(values)
  return plainSentence(calculator.comparison?.(inputs as never, outputs as never).says ?? [])
}

const corner = fc.record({
  springRate: fc.double({ min: 0.01, max: 50, noNaN: true }),
  motionRatio: fc.double({ min: 0.05, max: 2, noNaN: true }),
  sprungMass: fc.double({ min: 0.05, max: 5, noNaN: true }),
  damping: fc.double({ min: 0, max: 5000, noNaN: true }),
})

describe('wheel-rate', () => {
  it('works out the default corner', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.wheelRate).toBeCloseTo(0.359125, 9)
    expect(outputs.rideFrequency).toBeCloseTo(3.3721, 4)
    expect(outputs.criticalDamping).toBeCloseTo(33.8999, 3)
    expect(outputs.staticDeflection).toBeCloseTo(21.8456, 3)
    expect(outputs.dampingRatio).toBeCloseTo(0.49853, 4)
    expect(warnings).toEqual([])
  })

  it('takes the motion ratio twice', () => {
    fc.assert(
      fc.property(corner, fc.double({ min: 0.05, max: 2, noNaN: true }), (values, motionRatio) => {
        const moved = { ...values, motionRatio }
        const share = motionRatio / values.motionRatio
        expect(ratioOf('wheelRate', moved, values) / share ** 2).toBeCloseTo(1, 10)
        expect(ratioOf('rideFrequency', moved, values) / share).toBeCloseTo(1, 10)
      }),
    )
  })

  it('bounces half as fast with four times the weight, and sags four times as far', () => {
    fc.assert(
      fc.property(corner, (values) => {
        fc.pre(values.sprungMass <= 1.25)
        const heavy = { ...values, sprungMass: values.sprungMass * 4 }
        expect(ratioOf('rideFrequency', heavy, values)).toBeCloseTo(0.5, 12)
        expect(ratioOf('staticDeflection', heavy, values)).toBeCloseTo(4, 12)
        expect(ratioOf('criticalDamping', heavy, values)).toBeCloseTo(2, 12)
      }),
    )
  })

  it('ties frequency to sag and nothing else', () => {
    fc.assert(
      fc.property(corner, (values) => {
        const { rideFrequency = NaN, staticDeflection = NaN } = outputsOf(values)
        expect((rideFrequency * 2 * Math.PI) / Math.sqrt(9806.65 / staticDeflection)).toBeCloseTo(1, 10)
      }),
    )
  })

  it('is a solution of the motion: inertia, damping and spring add up to nothing', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 3, noNaN: true }).filter((ratio) => Math.abs(ratio - 1) > 0.01),
        fc.double({ min: 0.01, max: 2, noNaN: true }),
        (ratio, swings) => {
          const step = 1e-4
          const omega = 2 * Math.PI
          const [before, now, after] = [swings - step, swings, swings + step].map((at) =>
            released(ratio, at),
          ) as [number, number, number]
          const balance =
            (after - 2 * now + before) / step ** 2 +
            (2 * ratio * omega * (after - before)) / (2 * step) +
            omega ** 2 * now
          expect(Math.abs(balance)).toBeLessThan(2e-4 * omega ** 2)
        },
      ),
    )
    expect(released(1, 0.3)).toBeCloseTo(released(1.0002, 0.3), 3)
    expect(released(0.5, 0)).toBe(1)
  })

  it('swings past rest as far as its curve says', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 0.95, noNaN: true }), (ratio) => {
        const turning = 0.5 / Math.sqrt(1 - ratio ** 2)
        expect(released(ratio, turning)).toBeCloseTo(-overshoot(ratio), 9)
      }),
    )
    expect(overshoot(1)).toBe(0)
  })

  it('refuses what is no suspension', () => {
    expect(refused({ springRate: 0 })).toEqual([
      [
        'springRate',
        'Spring rate must be between 0.01\u00A0N/mm and 50\u00A0N/mm: no spring of a model car is softer or stiffer.',
      ],
    ])
    expect(refused({ motionRatio: -0.65, sprungMass: NaN, damping: -1 }).map(([field]) => field)).toEqual([
      'motionRatio',
      'sprungMass',
      'damping',
    ])
  })

  it.each([
    [{ damping: 80 }, []],
    [{ damping: 81 }, ['damping']],
    [{ motionRatio: 1 }, []],
    [{ motionRatio: 1.05, damping: 0 }, ['motionRatio']],
    [{ springRate: 0.3, damping: 0 }, ['springRate']],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the rate at the wheel first, then bounce, sag and damping', () => {
    const { inputs, outputs } = answered({})
    const { says, more } = calculator.answer(inputs as never, outputs as never)
    expect(plainSentence(says)).toBe('At the wheel your 0.85\u00A0N/mm spring is worth 0.359\u00A0N/mm.')
    expect(more.map((sentence) => plainSentence(sentence))).toEqual([
      'Without a damper that corner would bounce at 3.37\u00A0Hz, and under the car’s weight it gives 21.8\u00A0mm.',
      'The shock gives 50\u00A0% of critical damping: after a bump the wheel swings past rest by 16\u00A0% of it.',
    ])
  })

  it('compares with a shock moved out, or in where out there is no more', () => {
    expect(saysWith({})).toBe('0.05 more motion ratio makes the wheel 16\u00A0% stiffer on the same spring.')
    expect(saysWith({ motionRatio: 2 })).toBe(
      '0.05 less motion ratio makes the wheel 4.9\u00A0% softer on the same spring.',
    )
  })
})
