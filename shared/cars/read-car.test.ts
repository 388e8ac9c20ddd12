import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { carValues } from './car-values.ts'
import { carText, readCarTexts } from './read-car.ts'

describe('reading what people type', () => {
  it.each([
    ['2,4', {}, 2.4],
    ['2.4', {}, 2.4],
    ['3/32 in', {}, 2.38125],
    ['3/32', { length: 'in' as const }, 2.38125],
    ['0.09375', { length: 'in' as const }, 2.38125],
    ['2.4 mm', { length: 'in' as const }, 2.4],
  ])('%s in %j', (text, units, value) => {
    const read = readCarTexts({ frontBarDiameter: text }, units)
    expect(read.problems).toEqual([])
    expect(read.values.frontBarDiameter).toBeCloseTo(value, 12)
  })

  it.each([
    ['soft', 'Type front bar diameter as a number.'],
    ['2 kg', 'Front bar diameter is measured in mm; give it in that unit.'],
    ['0', 'Front bar diameter must be between 0.3 mm and 10 mm.'],
    ['1e400', 'Type front bar diameter as a number.'],
  ])('refuses “%s” with words', (text, sentence) => {
    const { values, problems } = readCarTexts({ frontBarDiameter: text }, {})
    expect(values).toEqual({})
    expect(problems.map(({ message }) => plainSentence(message).replaceAll('\u00A0', ' '))).toEqual([sentence])
  })

  it('takes an empty field for a value that was not measured', () => {
    expect(readCarTexts({ mass: '  ', wheelbase: undefined }, {})).toEqual({ values: {}, problems: [] })
  })

  it('writes a value so that reading it gives it back, to seven digits', () => {
    fc.assert(
      fc.property(fc.constantFrom(...carValues), fc.double({ min: 0, max: 1, noNaN: true }), fc.constantFrom({}, { length: 'in' as const, weight: 'oz' as const }), (entry, share, units) => {
        const raw = entry.min + share * (entry.max - entry.min)
        const value = 'whole' in entry ? Math.round(raw) : raw
        const { values } = readCarTexts({ [entry.key]: carText(entry, value, units) }, units)
        const read = values[entry.key]
        // At the very ends seven digits may round to just outside.
        if (read !== undefined) expect(Math.abs(read - value)).toBeLessThanOrEqual(Math.abs(value) * 1e-6 + 1e-12)
        else expect(Math.min(share, 1 - share)).toBeLessThan(1e-6)
      }),
    )
  })
})
