import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'
import { barPushed } from './drawings.ts'

const answered = (values: Record<string, unknown>) => {
  const result = runDefinition(calculator, values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return result
}
const refused = (values: Record<string, unknown>) => {
  const result = runDefinition(calculator, values)
  return result.ok ? [] : result.errors.map(({ field, message }) => [field, plainSentence(message)])
}
const rateOf = (values: Record<string, unknown>) => answered(values).outputs.endRate ?? NaN
const saysWith = (values: Record<string, unknown>) => {
  const { inputs, outputs } = answered(values)
  return plainSentence(calculator.comparison?.(inputs as never, outputs as never).says ?? [])
}

const wire = fc.double({ min: 0.3, max: 10, noNaN: true })
const bar = fc.record({
  diameter: wire,
  comparisonDiameter: wire,
  middleLength: fc.double({ min: 11, max: 400, noNaN: true }),
  armLength: fc.double({ min: 11, max: 200, noNaN: true }),
  shearModulus: fc.double({ min: 15, max: 100, noNaN: true }),
  youngsModulus: fc.double({ min: 40, max: 250, noNaN: true }),
})

describe('sway-bar', () => {
  it('works out the default bar and the one beside it', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.endRate).toBeCloseTo(6.7272, 4)
    expect(outputs.ratio).toBeCloseTo((2.6 / 2.4) ** 4, 12)
    expect(warnings).toEqual([])
  })

  it('goes by the fourth power of the diameter, whatever the shape', () => {
    fc.assert(
      fc.property(bar, (values) => {
        const { outputs } = answered(values)
        expect((outputs.ratio ?? NaN) / (values.comparisonDiameter / values.diameter) ** 4).toBeCloseTo(1, 9)
        expect(
          rateOf({ ...values, diameter: values.comparisonDiameter }) / (outputs.comparisonEndRate ?? NaN),
        ).toBeCloseTo(1, 12)
      }),
    )
  })

  it('gets softer with every millimetre of arm and of middle', () => {
    fc.assert(
      fc.property(bar, fc.double({ min: 1.001, max: 1.5, noNaN: true }), (values, times) => {
        fc.pre(values.armLength * times <= 200 && values.middleLength * times <= 400)
        expect(rateOf({ ...values, armLength: values.armLength * times })).toBeLessThan(rateOf(values))
        expect(rateOf({ ...values, middleLength: values.middleLength * times })).toBeLessThan(rateOf(values))
      }),
    )
  })

  it('is as soft as its twist and the bending of its arms together', () => {
    fc.assert(
      fc.property(bar, (values) => {
        const polar = (Math.PI * values.diameter ** 4) / 32
        const twistOnly =
          (2 * values.shearModulus * 1000 * polar) / (values.armLength ** 2 * values.middleLength)
        const bendingOnly = (3 * values.youngsModulus * 1000 * (polar / 2)) / values.armLength ** 3
        expect(rateOf(values) * (1 / twistOnly + 1 / bendingOnly)).toBeCloseTo(1, 10)
      }),
    )
  })

  it('scales like a spring: twice the size all over is twice as stiff', () => {
    fc.assert(
      fc.property(bar, (values) => {
        fc.pre(
          values.diameter <= 5 &&
            values.comparisonDiameter <= 5 &&
            values.middleLength <= 200 &&
            values.armLength <= 100,
        )
        const { diameter, comparisonDiameter, middleLength, armLength } = values
        const large = {
          ...values,
          diameter: diameter * 2,
          comparisonDiameter: comparisonDiameter * 2,
          middleLength: middleLength * 2,
          armLength: armLength * 2,
        }
        expect(rateOf(large) / rateOf(values)).toBeCloseTo(2, 9)
      }),
    )
  })

  it('refuses a block, and what is no bar', () => {
    expect(refused({ diameter: 8, armLength: 8 })).toEqual([
      ['diameter', '8\u00A0mm is no thinner than the arm is long, 8\u00A0mm. That is a block, not a bar.'],
    ])
    expect(refused({ comparisonDiameter: 7, middleLength: 6 }).map(([field]) => field)).toEqual([
      'comparisonDiameter',
    ])
    expect(refused({ diameter: 0 })).toEqual([
      [
        'diameter',
        'Your bar must be between 0.3\u00A0mm and 10\u00A0mm: bars of model cars are bent from wire of that size.',
      ],
    ])
    expect(refused({ diameter: NaN, armLength: null, middleLength: -70 }).map(([field]) => field)).toEqual([
      'diameter',
      'middleLength',
      'armLength',
    ])
  })

  it.each([
    [{ armLength: 13 }, []],
    [{ armLength: 12.9 }, ['armLength']],
    [{ middleLength: 12 }, ['middleLength']],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says what the other bar changes, both ways', () => {
    expect(saysWith({})).toBe('0.2\u00A0mm thicker makes this bar 38\u00A0% stiffer.')
    expect(saysWith({ comparisonDiameter: 2.2 })).toBe('0.2\u00A0mm thinner makes this bar 29\u00A0% softer.')
    expect(saysWith({ comparisonDiameter: 2.4 })).toBe('Both bars are equally thick and equally stiff.')
  })

  it('says the rate first, then where the give is and what the links do', () => {
    const { inputs, outputs } = answered({})
    const { says, more } = calculator.answer(inputs as never, outputs as never)
    expect(plainSentence(says)).toBe(
      'Each end of your 2.4\u00A0mm bar has a rate of 6.73\u00A0N/mm when the wheels move opposite ways.',
    )
    expect(plainSentence(more[0] ?? [])).toBe(
      '82\u00A0% of the give is the middle twisting, 18\u00A0% is the arms bending.',
    )
    expect(plainSentence(more[1] ?? [])).toMatch(
      /^Links moved 3\u00A0mm in along the arms make it 2\d\u00A0% stiffer\.$/,
    )
  })

  it('draws both bars under one force, with ends where the formula puts them', () => {
    fc.assert(
      fc.property(bar, (values) => {
        const drawing = barPushed(values)
        const ends = drawing.shapes.flatMap((shape) =>
          shape.kind === 'line' && (shape.style === 'own' || shape.style === 'thought')
            ? [shape.points.at(-1)?.[1] ?? NaN]
            : [],
        )
        const own = values.armLength / 6
        const other = own * (values.diameter / values.comparisonDiameter) ** 4
        const expected = other < values.armLength ? [other, -other, own, -own] : [own, -own]
        ends.forEach((end, index) => expect(end).toBeCloseTo(expected[index] ?? NaN, 9))
        expect(ends.length).toBe(expected.length)
        for (const end of ends) expect(Math.abs(end)).toBeLessThan(drawing.frame.top)
      }),
    )
  })
})
