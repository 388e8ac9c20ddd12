import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'

type Inputs = Record<'gauge' | 'length' | 'current' | 'temperature', number>
type Outputs = Record<'diameter' | 'resistance' | 'voltageDrop' | 'heat', number>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { ...result, inputs: result.inputs as Inputs, outputs: result.outputs as Outputs }
}
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const wire = fc.record({
  gauge: fc.integer({ min: 0, max: 40 }),
  length: between(1, 5000),
  current: between(0.1, 300),
  temperature: between(-40, 200),
})
const closeTo = (value: number, expected: number) =>
  expect(Math.abs(value / expected - 1)).toBeLessThan(1e-12)

describe('wire-drop', () => {
  it('works out the default leads', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.diameter).toBeCloseTo(2.052525, 6)
    expect(outputs.resistance).toBeCloseTo(1.56321, 5)
    expect(outputs.voltageDrop).toBeCloseTo(0.0937926, 6)
    expect(outputs.heat).toBeCloseTo(5.627549, 6)
    expect(warnings).toEqual([])
  })

  it('obeys Ohm, and heat is volts times amperes', () => {
    fc.assert(
      fc.property(wire, (values) => {
        const { resistance, voltageDrop, heat } = answered(values).outputs
        closeTo(voltageDrop, (resistance / 1000) * values.current)
        closeTo(heat, voltageDrop * values.current)
      }),
    )
  })

  it('grows with the length, and heat with the square of the current', () => {
    fc.assert(
      fc.property(wire, (values) => {
        const one = answered(values).outputs
        closeTo(
          answered({ ...values, length: values.length / 2 + 0.5 }).outputs.resistance,
          (one.resistance * (values.length / 2 + 0.5)) / values.length,
        )
        const half = values.current / 2 + 0.05
        closeTo(answered({ ...values, current: half }).outputs.heat, one.heat * (half / values.current) ** 2)
      }),
    )
  })

  it('is 92 times as thick 39 numbers lower, and has 8,464 times less resistance', () => {
    const [thick, thin] = [answered({ gauge: 0 }).outputs, answered({ gauge: 39 }).outputs]
    closeTo(thick.diameter / thin.diameter, 92)
    closeTo(thin.resistance / thick.resistance, 92 ** 2)
  })

  it('resists more with every number up and every degree warmer', () => {
    fc.assert(
      fc.property(wire, between(0.01, 10), (values, warmer) => {
        const { resistance } = answered(values).outputs
        fc.pre(values.gauge < 40 && values.temperature + warmer <= 200)
        expect(answered({ ...values, gauge: values.gauge + 1 }).outputs.resistance).toBeGreaterThan(
          resistance,
        )
        expect(
          answered({ ...values, temperature: values.temperature + warmer }).outputs.resistance,
        ).toBeGreaterThan(resistance)
      }),
    )
  })

  it.each([
    [{ gauge: 12.5 }, 'gauge', 'Wire gauge must be a whole number.'],
    [
      { gauge: -1 },
      'gauge',
      'Wire gauge must be between 0\u00A0AWG and 40\u00A0AWG: thicker does not fit and thinner is not sold for R/C.',
    ],
    [
      { current: 0 },
      'current',
      'Current must be between 0.1\u00A0A and 300\u00A0A: without current nothing is lost, and more melts the plugs first.',
    ],
    [
      { temperature: 201 },
      'temperature',
      'Temperature of the wire must be between −40\u00A0°C and 200\u00A0°C: nobody races colder, and hotter the insulation gives way.',
    ],
    [{ length: NaN }, 'length', 'Length of one lead must be a number, between 1\u00A0mm and 5,000\u00A0mm.'],
  ])('refuses %j', (values, field, message) => {
    const result = run(values)
    expect(
      result.ok ? [] : result.errors.map((error) => [error.field, plainSentence(error.message)]),
    ).toEqual([[field, message]])
  })

  it.each([
    [{ current: 75 }, []],
    [{ current: 76 }, ['current']],
    [{ temperature: 100 }, []],
    [{ temperature: 101 }, ['temperature']],
    [{ gauge: 18, temperature: 120 }, ['current', 'temperature']],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the loss first, then the heat', () => {
    const { inputs, outputs } = answered({})
    const { says, more } = calculator.answer(inputs, outputs)
    expect(plainSentence(says)).toBe('The two leads lose 0.0938\u00A0V at 60\u00A0A.')
    expect(plainSentence(more[0] ?? [])).toBe(
      'They turn 5.63\u00A0W into heat as long as that current flows.',
    )
  })

  it.each([
    [12, 'Two sizes thicker wastes 37\u00A0% less and leaves the motor 0.035\u00A0V more.'],
    [0, 'Two sizes thinner wastes 59\u00A0% more and takes 0.0034\u00A0V from the motor.'],
    [1, 'Two sizes thinner wastes 59\u00A0% more and takes 0.0043\u00A0V from the motor.'],
  ])('%d AWG: %s', (gauge, sentence) => {
    const { inputs, outputs } = answered({ gauge })
    expect(plainSentence(calculator.comparison?.(inputs, outputs).says ?? [])).toBe(sentence)
  })

  it('keeps curves and point inside the picture, also at the ends of the gauge', () => {
    fc.assert(
      fc.property(wire, (values) => {
        const { inputs, outputs } = answered(values)
        const [plot] = calculator.plots?.(inputs, outputs, 0) ?? []
        const heights = plot?.lines.flatMap(({ points }) => points.map(([, watts]) => watts)) ?? []
        expect(Math.max(...heights, outputs.heat)).toBeLessThanOrEqual(plot?.y.max ?? 0)
      }),
    )
  })

  it('warns of short circuits and of soldering', () => {
    expect(calculator.cautions.map(({ kind }) => kind)).toEqual(['lithium', 'soldering', 'heat'])
  })
})
