import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
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
const rateOf = (values: Record<string, unknown>) => answered(values).outputs.rate ?? NaN
const compared = (values: Record<string, unknown>) => {
  const { inputs, outputs } = answered(values)
  return calculator.comparison?.(inputs as never, outputs as never)
}

/** Springs with a hole in them, all in range. */
const spring = fc
  .record({
    wireDiameter: fc.double({ min: 0.2, max: 10, noNaN: true }),
    times: fc.double({ min: 2.1, max: 9, noNaN: true }),
    activeCoils: fc.double({ min: 0.5, max: 30, noNaN: true }),
    shearModulus: fc.double({ min: 15, max: 100, noNaN: true }),
  })
  .map(({ times, ...rest }) => ({ ...rest, outsideDiameter: Math.max(2, rest.wireDiameter * times) }))

describe('spring-rate', () => {
  it('works out the default spring', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.rate).toBeCloseTo(0.8838133, 6)
    expect(outputs.springIndex).toBeCloseTo(13.375, 12)
    expect(warnings).toEqual([])
  })

  it('is half as stiff with twice the coils', () => {
    fc.assert(
      fc.property(spring, (values) => {
        const double = rateOf({ ...values, activeCoils: values.activeCoils * 2 })
        expect(double / rateOf(values)).toBeCloseTo(0.5, 12)
      }),
    )
  })

  it('is as stiff as its metal', () => {
    fc.assert(
      fc.property(spring, fc.double({ min: 15, max: 100, noNaN: true }), (values, shearModulus) => {
        const ratio = rateOf({ ...values, shearModulus }) / rateOf(values)
        expect(ratio / (shearModulus / values.shearModulus)).toBeCloseTo(1, 12)
      }),
    )
  })

  it('follows the fourth power of the wire and the third of the coil', () => {
    fc.assert(
      fc.property(spring, fc.double({ min: 1.01, max: 3, noNaN: true }), (values, times) => {
        const wire = values.wireDiameter
        const mean = values.outsideDiameter - wire
        fc.pre(wire * times <= 10 && wire * times < mean && mean * times + wire <= 100)
        const thick = { ...values, wireDiameter: wire * times, outsideDiameter: mean + wire * times }
        expect(rateOf(thick) / rateOf(values) / times ** 4).toBeCloseTo(1, 10)
        const wide = { ...values, outsideDiameter: mean * times + wire }
        expect((rateOf(wide) / rateOf(values)) * times ** 3).toBeCloseTo(1, 10)
      }),
    )
  })

  it('says the same rate in three units', () => {
    fc.assert(
      fc.property(spring, (values) => {
        const { outputs } = answered(values)
        expect((outputs.rateLbfPerIn ?? NaN) / (outputs.rate ?? NaN)).toBeCloseTo(5.710147154732646, 9)
        expect((outputs.rateGfPerMm ?? NaN) / (outputs.rate ?? NaN)).toBeCloseTo(101.97162129779284, 8)
      }),
    )
  })

  it('refuses coils without a hole, and what is no spring', () => {
    expect(refused({ wireDiameter: 3, outsideDiameter: 6 })).toEqual([
      [
        'outsideDiameter',
        'A spring of 3\u00A0mm wire must be more than 6\u00A0mm across: two wires side by side leave no hole.',
      ],
    ])
    expect(refused({ wireDiameter: 0 })).toEqual([
      [
        'wireDiameter',
        'Wire must be between 0.2\u00A0mm and 10\u00A0mm: springs of model cars are wound from wire of that size.',
      ],
    ])
    expect(refused({ activeCoils: Infinity, shearModulus: '79' }).map(([field]) => field)).toEqual([
      'activeCoils',
      'shearModulus',
    ])
  })

  it.each([
    [{ wireDiameter: 5, outsideDiameter: 24.9 }, ['outsideDiameter']],
    [{ wireDiameter: 5, outsideDiameter: 25 }, []],
    [{ activeCoils: 2.75 }, ['activeCoils']],
    [{ activeCoils: 3 }, []],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the rate in every unit that labels use', () => {
    const { inputs, outputs } = answered({})
    const { says, more } = calculator.answer(inputs as never, outputs as never)
    expect(plainSentence(says)).toBe('This spring has a rate of 0.884\u00A0N/mm.')
    expect(plainSentence(more[0] ?? [])).toBe(
      'Labels may call it 0.884\u00A0N/mm, 5.05\u00A0lbf/in or 90.1\u00A0gf/mm.',
    )
    expect(plainSentence(more[1] ?? [])).toContain('0.02\u00A0mm of paint makes it read 5.4\u00A0% too stiff')
  })

  it('compares with thicker wire, or with thinner where thicker leaves no hole', () => {
    expect(plainSentence(compared({})?.says ?? [])).toBe(
      '0.1\u00A0mm thicker wire, with the same outside and coils, makes the spring 29\u00A0% stiffer.',
    )
    const tight = compared({ wireDiameter: 2, outsideDiameter: 4.1 })
    expect(plainSentence(tight?.says ?? [])).toContain('thinner wire')
    expect(plainSentence(tight?.says ?? [])).toMatch(/softer\.$/)
  })

  it('draws a curve that passes through the reader’s spring', () => {
    fc.assert(
      fc.property(spring, (values) => {
        const { inputs, outputs } = answered(values)
        for (const plot of calculator.plots?.(inputs as never, outputs as never, 0) ?? []) {
          const [point] = plot.points
          expect(point?.x).toBeGreaterThanOrEqual(plot.x.min)
          expect(point?.x).toBeLessThanOrEqual(plot.x.max * (1 + 1e-9))
          expect(point?.y).toBeLessThanOrEqual(plot.y.max * (1 + 1e-9))
          expect(plot.lines.flatMap(({ points }) => points.flat()).every(Number.isFinite)).toBe(true)
        }
      }),
    )
  })
})
