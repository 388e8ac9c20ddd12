import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'

type Inputs = Record<'wheelbase' | 'frontWeight' | 'rearAxleBack', number>
type Outputs = Record<'newWheelbase' | 'newFrontWeight' | 'rearLoadChange', number>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { ...result, inputs: result.inputs as Inputs, outputs: result.outputs as Outputs }
}
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const car = fc.record({
  wheelbase: between(120, 580),
  frontWeight: between(35, 65),
  rearAxleBack: between(-15, 15),
})

describe('wheelbase-shims', () => {
  it('moves the default axle', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.newWheelbase).toBe(327)
    expect(outputs.newFrontWeight).toBeCloseTo((100 * 158) / 327, 10)
    expect(outputs.rearLoadChange).toBeCloseTo(48 - (100 * 158) / 327, 10)
    expect(warnings).toEqual([])
  })

  it('is undone by moving the axle forward again', () => {
    fc.assert(
      fc.property(car, ({ wheelbase, frontWeight, rearAxleBack }) => {
        const there = answered({ wheelbase, frontWeight, rearAxleBack }).outputs
        const back = answered({
          wheelbase: there.newWheelbase,
          frontWeight: there.newFrontWeight,
          rearAxleBack: -rearAxleBack,
        }).outputs
        expect(back.newWheelbase).toBeCloseTo(wheelbase, 9)
        expect(back.newFrontWeight).toBeCloseTo(frontWeight, 9)
      }),
    )
  })

  it('leaves the centre of gravity where it was behind the front axle', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { newWheelbase, newFrontWeight } = answered(values).outputs
        const behindFront = (length: number, share: number) => length * (1 - share / 100)
        expect(behindFront(newWheelbase, newFrontWeight)).toBeCloseTo(
          behindFront(values.wheelbase, values.frontWeight),
          9,
        )
      }),
    )
  })

  it('puts more on the front the further the axle goes back', () => {
    fc.assert(
      fc.property(car, between(0.01, 5), (values, further) => {
        fc.pre(values.rearAxleBack + further <= 15)
        const { newFrontWeight } = answered(values).outputs
        const more = answered({ ...values, rearAxleBack: values.rearAxleBack + further }).outputs
        expect(more.newFrontWeight).toBeGreaterThan(newFrontWeight)
      }),
    )
  })

  it('stays inside the car at every end of its ranges', () => {
    for (const wheelbase of [100, 600])
      for (const frontWeight of [20, 80])
        for (const rearAxleBack of [-15, 15]) {
          const { newFrontWeight } = answered({ wheelbase, frontWeight, rearAxleBack }).outputs
          expect(newFrontWeight).toBeGreaterThan(0)
          expect(newFrontWeight).toBeLessThan(100)
        }
  })

  it('changes nothing without a shim', () => {
    const { inputs, outputs } = answered({ rearAxleBack: 0 })
    expect(outputs).toMatchObject({ newWheelbase: 325, newFrontWeight: 48 })
    expect(plainSentence(calculator.answer(inputs, outputs).says)).toBe(
      'Nothing moves: the front wheels keep 48\u00A0% of the weight.',
    )
  })

  it.each([
    [
      { rearAxleBack: 16 },
      'rearAxleBack',
      'Rear axle moves back must be between −15\u00A0mm and 15\u00A0mm: no rear hub has room for more shims than that.',
    ],
    [
      { frontWeight: 140 },
      'frontWeight',
      'Weight on the front wheels must be between 20\u00A0% and 80\u00A0%: a car with less at one end lifts that end as soon as it accelerates or brakes.',
    ],
    [
      { wheelbase: 0 },
      'wheelbase',
      'Wheelbase must be between 100\u00A0mm and 600\u00A0mm: R/C cars are not built shorter or longer than that.',
    ],
    [
      { rearAxleBack: '2' },
      'rearAxleBack',
      'Rear axle moves back must be a number, between −15\u00A0mm and 15\u00A0mm.',
    ],
  ])('refuses %j', (values, field, message) => {
    const result = run(values)
    expect(
      result.ok ? [] : result.errors.map((error) => [error.field, plainSentence(error.message)]),
    ).toEqual([[field, message]])
  })

  it.each([
    [6, []],
    [6.5, ['rearAxleBack']],
    [-6.5, ['rearAxleBack']],
  ])('%d mm warns at %j', (rearAxleBack, fields) => {
    expect(answered({ rearAxleBack }).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it.each([
    [
      2,
      '2\u00A0mm longer takes 0.32\u00A0% of the car’s weight off the rear wheels.',
      'takes weight off the rear wheels',
    ],
    [
      -2,
      '2\u00A0mm shorter puts 0.32\u00A0% of the car’s weight on the rear wheels.',
      'puts weight on the rear wheels',
    ],
    [0, 'Without a shim nothing changes.', undefined],
  ])('moved back %d mm: %s', (rearAxleBack, comparison, sense) => {
    const { inputs, outputs } = answered({ rearAxleBack })
    expect(plainSentence(calculator.comparison?.(inputs, outputs).says ?? [])).toBe(comparison)
    const more = calculator
      .answer(inputs, outputs)
      .more.map((sentence) => plainSentence(sentence))
      .join(' ')
    if (sense === undefined) expect(more).not.toContain('Moving the axle')
    else expect(more).toContain(sense)
  })

  it('draws both axles where they are and the centre of gravity in one place', () => {
    const drawn = (rearAxleBack: number) => {
      const { inputs, outputs } = answered({ rearAxleBack })
      const points = (calculator.drawings?.(inputs, outputs, 0)[0]?.shapes ?? []).flatMap((shape) =>
        shape.kind === 'point' ? [[shape.style, shape.at[0]]] : [],
      )
      return { points, frame: calculator.drawings?.(inputs, outputs, 0)[0]?.frame }
    }
    expect(drawn(10).points).toEqual([
      ['before', -325],
      ['own', -335],
      ['part', 0],
      ['part', -169],
    ])
    expect(drawn(0).points).toEqual([
      ['own', -325],
      ['part', 0],
      ['part', -169],
    ])
    expect(drawn(10).frame).toEqual(drawn(-15).frame)
  })
})
