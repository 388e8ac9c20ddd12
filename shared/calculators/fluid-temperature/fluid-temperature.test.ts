import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'

const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return result
}
const temperature = fc.double({ min: -25, max: 100, noNaN: true })
const bottle = fc.double({ min: 0.5, max: 1e7, noNaN: true })

describe('fluid-temperature', () => {
  it('gives back the number on the bottle at 25 °C', () => {
    fc.assert(
      fc.property(bottle, (viscosityAt25) => {
        expect(answered({ viscosityAt25, temperature: 25 }).outputs.viscosity).toBe(viscosityAt25)
      }),
    )
  })

  it('gets thinner with every degree', () => {
    fc.assert(
      fc.property(bottle, temperature, temperature, (viscosityAt25, one, other) => {
        fc.pre(Math.abs(one - other) > 1e-6)
        const [cold, hot] = [Math.min(one, other), Math.max(one, other)]
        const { outputs } = answered({ viscosityAt25, referenceTemperature: cold, temperature: hot })
        expect(outputs.ratio).toBeLessThan(1)
        expect(outputs.viscosity).toBeLessThan(outputs.viscosityAtReference ?? NaN)
      }),
    )
  })

  it('changes every fluid by the same ratio', () => {
    fc.assert(
      fc.property(bottle, bottle, temperature, temperature, (one, other, referenceTemperature, now) => {
        const first =
          answered({ viscosityAt25: one, referenceTemperature, temperature: now }).outputs.ratio ?? NaN
        const second =
          answered({ viscosityAt25: other, referenceTemperature, temperature: now }).outputs.ratio ?? NaN
        expect(Math.abs(first / second - 1)).toBeLessThan(1e-12)
      }),
    )
  })

  it('names a fluid that is as thick now as this one was then', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 10, max: 5e5, noNaN: true }),
        temperature,
        temperature,
        (viscosityAt25, referenceTemperature, now) => {
          const { outputs } = answered({ viscosityAt25, referenceTemperature, temperature: now })
          const matched = answered({
            viscosityAt25: outputs.fluidToMatch,
            referenceTemperature,
            temperature: now,
          })
          expect(
            Math.abs((matched.outputs.viscosity ?? NaN) / (outputs.viscosityAtReference ?? NaN) - 1),
          ).toBeLessThan(1e-12)
        },
      ),
    )
  })

  it.each([[-25.01], [100.01], [-273], [-300]])('refuses %d °C', (value) => {
    const result = run({ temperature: value })
    expect(result.ok).toBe(false)
    const message = result.ok ? '' : plainSentence(result.errors[0]?.message ?? [])
    expect(message).toBe(
      'Temperature now must be between −25\u00A0°C and 100\u00A0°C: the formula was not made for anything colder or hotter.',
    )
  })

  it.each([
    [{ temperature: 60 }, []],
    [{ temperature: 61 }, ['temperature']],
    [{ referenceTemperature: -1 }, ['referenceTemperature']],
    [{ viscosityAt25: 49 }, ['viscosityAt25']],
    [{ viscosityAt25: 50 }, []],
    [{ viscosityAt25: 100_000 }, []],
    [{ viscosityAt25: 100_001 }, ['viscosityAt25']],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the answer first and names the bottles on either side of a match', () => {
    const { inputs, outputs } = answered({ temperature: 55 })
    const { says, more } = calculator.answer(inputs as never, outputs as never)
    expect(plainSentence(says)).toMatch(
      /^Your 7,000\u00A0cSt fluid acts like about 4,080\u00A0cSt at 55\u00A0°C\.$/,
    )
    expect(more.map((sentence) => plainSentence(sentence)).join(' ')).toContain(
      'between the 10,000\u00A0cSt and 12,500\u00A0cSt bottles',
    )
    expect(plainSentence(says, { temperature: '°F' })).toContain('131\u00A0°F')
  })
})
