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
const outputsOf = (values: Record<string, unknown>) => answered(values).outputs as Record<string, number>
const ratioOf = (key: string, one: Record<string, unknown>, other: Record<string, unknown>) =>
  (outputsOf(one)[key] ?? NaN) / (outputsOf(other)[key] ?? NaN)
const saysWith = (values: Record<string, unknown>) => {
  const { inputs, outputs } = answered(values)
  return plainSentence(calculator.comparison?.(inputs as never, outputs as never).says ?? [])
}

const hole = fc.double({ min: 0.2, max: 2, noNaN: true })
const count = fc.integer({ min: 1, max: 12 })
const shock = fc.record({
  holes: count,
  holeDiameter: hole,
  newHoles: count,
  newHoleDiameter: hole,
  pistonThickness: fc.double({ min: 0.5, max: 10, noNaN: true }),
  boreDiameter: fc.double({ min: 15, max: 60, noNaN: true }),
  rodDiameter: fc.double({ min: 0.5, max: 10, noNaN: true }),
  viscosity: fc.double({ min: 1, max: 10_000, noNaN: true }),
  density: fc.double({ min: 700, max: 1300, noNaN: true }),
  shaftSpeed: fc.double({ min: 1, max: 5000, noNaN: true }),
})

describe('shock-pack', () => {
  it('works out the default shock', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.damping).toBeCloseTo((73.957843 * 450) / 350, 5)
    expect(outputs.viscosityToMatch).toBeCloseTo((450 * 8 * 1.2 ** 4) / (6 * 1.3 ** 4), 9)
    expect(warnings).toEqual([])
  })

  it('damps in proportion to the oil and the thickness, and against the number of holes', () => {
    fc.assert(
      fc.property(shock, (values) => {
        fc.pre(values.holes <= 6 && values.pistonThickness <= 5)
        expect(ratioOf('damping', { ...values, viscosity: values.viscosity * 2 }, values)).toBeCloseTo(2, 10)
        expect(
          ratioOf('damping', { ...values, pistonThickness: values.pistonThickness * 2 }, values),
        ).toBeCloseTo(2, 10)
        expect(ratioOf('damping', { ...values, holes: values.holes * 2 }, values)).toBeCloseTo(0.5, 10)
      }),
    )
  })

  it('damps against the fourth power of the hole', () => {
    fc.assert(
      fc.property(shock, hole, (values, holeDiameter) => {
        const share = holeDiameter / values.holeDiameter
        expect(ratioOf('damping', { ...values, holeDiameter }, values) * share ** 4).toBeCloseTo(1, 9)
      }),
    )
  })

  it('names an oil with which the new piston damps like the old', () => {
    fc.assert(
      fc.property(shock, (values) => {
        const { damping = NaN, viscosityToMatch = NaN } = outputsOf(values)
        fc.pre(viscosityToMatch >= 0.5 && viscosityToMatch <= 100_000)
        const { newDamping = NaN } = outputsOf({ ...values, viscosity: viscosityToMatch })
        expect(newDamping / damping).toBeCloseTo(1, 10)
      }),
    )
  })

  it('comes back to the first oil when the pistons change places', () => {
    fc.assert(
      fc.property(shock, (values) => {
        const { viscosityToMatch = NaN } = outputsOf(values)
        fc.pre(viscosityToMatch >= 0.5 && viscosityToMatch <= 100_000)
        const back = outputsOf({
          ...values,
          holes: values.newHoles,
          holeDiameter: values.newHoleDiameter,
          newHoles: values.holes,
          newHoleDiameter: values.holeDiameter,
          viscosity: viscosityToMatch,
        })
        expect((back.viscosityToMatch ?? NaN) / values.viscosity).toBeCloseTo(1, 10)
      }),
    )
  })

  it('pushes harder than viscosity alone, by the square of the speed', () => {
    fc.assert(
      fc.property(shock, (values) => {
        fc.pre(values.shaftSpeed <= 2500)
        const rest = (speed: number) => {
          const { force = NaN, damping = NaN } = outputsOf({ ...values, shaftSpeed: speed })
          return force - (damping * speed) / 1000
        }
        const { force = NaN } = outputsOf(values)
        // Where the orifice part is a vanishing share of the force, the difference has no digits left.
        fc.pre(rest(values.shaftSpeed) > 1e-6 * force)
        expect(rest(values.shaftSpeed * 2) / rest(values.shaftSpeed)).toBeCloseTo(4, 5)
      }),
    )
  })

  it('refuses what does not go together, and what is no shock', () => {
    expect(refused({ rodDiameter: 16 })).toEqual([
      ['rodDiameter', 'A rod of 16\u00A0mm does not go into a bore of 16\u00A0mm.'],
    ])
    expect(refused({ newHoles: 40, newHoleDiameter: 3 })).toEqual([
      [
        'newHoleDiameter',
        '40 holes of 3\u00A0mm are larger than the piston round its rod: nothing would be left of it.',
      ],
    ])
    expect(refused({ holes: 2.5 })).toEqual([['holes', 'Holes now must be a whole number.']])
    expect(
      refused({ holes: 0, viscosity: -450, shaftSpeed: 0, density: '970' }).map(([field]) => field),
    ).toEqual(['holes', 'viscosity', 'shaftSpeed', 'density'])
  })

  it.each([
    [{ viscosity: 1.1 }, []],
    [{ viscosity: 1 }, ['shaftSpeed']],
    [{ pistonThickness: 1.25 }, ['holeDiameter']],
    [{ pistonThickness: 1.3 }, []],
  ])('%j warns at %j', (values, fields) => {
    expect(answered({ shaftSpeed: 70, ...values }).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the oil first, then the bottles, then how little the newtons are worth', () => {
    const { inputs, outputs } = answered({})
    const { says, more } = calculator.answer(inputs as never, outputs as never)
    expect(plainSentence(says)).toBe(
      'To damp like 6 × 1.3\u00A0mm in 450\u00A0cSt, a piston of 8 × 1.2\u00A0mm needs about 436\u00A0cSt.',
    )
    expect(plainSentence(more[0] ?? [])).toBe(
      'That lies between the 400\u00A0cSt and 450\u00A0cSt bottles; two of them can be mixed.',
    )
    expect(plainSentence(more[1] ?? [])).toContain('adds about 31\u00A0% to the real damping')
  })

  it('compares slow and fast, both ways and not at all', () => {
    // More and smaller holes: stiffer against viscosity, yet more area for a fast shaft.
    expect(saysWith({})).toBe(
      'In the same oil the new piston damps 3.3\u00A0% more when the shaft moves slowly, and 2.7\u00A0% less at 200\u00A0mm/s.',
    )
    expect(saysWith({ newHoles: 6, newHoleDiameter: 1.4 })).toContain('damps 26\u00A0% less when')
    expect(saysWith({ newHoles: 6, newHoleDiameter: 1.3 })).toBe(
      'In the same oil the new piston damps just as much when the shaft moves slowly, and just as much at 200\u00A0mm/s.',
    )
  })

  it('draws both oils within its frame', () => {
    fc.assert(
      fc.property(shock, (values) => {
        const { inputs, outputs } = answered(values)
        for (const { x, y, lines, points } of calculator.plots?.(inputs as never, outputs as never, 0) ??
          []) {
          const drawn = lines.flatMap((line) => line.points)
          expect(drawn.every(([px]) => px <= x.max * (1 + 1e-9))).toBe(true)
          expect(drawn.every(([, py]) => py >= y.min && py <= y.max)).toBe(true)
          expect(points[0]?.x).toBe(values.shaftSpeed)
        }
      }),
    )
  })
})
