import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'

type Inputs = Record<
  'mass' | 'frontWeight' | 'wheelbase' | 'partMass' | 'moveForward' | 'moveLeft' | 'moveUp',
  number
>
type Outputs = Record<'newFrontWeight' | 'cgForward' | 'cgLeft' | 'cgUp', number>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { ...result, inputs: result.inputs as Inputs, outputs: result.outputs as Outputs }
}
const refused = (values: Record<string, unknown>) => {
  const result = run(values)
  return result.ok ? [] : result.errors.map(({ field, message }) => [field, plainSentence(message)])
}
const words = (values: Record<string, unknown>) => {
  const { inputs, outputs } = answered(values)
  const { says, more } = calculator.answer(inputs, outputs)
  return {
    answer: [says, ...more].map((sentence) => plainSentence(sentence)),
    comparison: plainSentence(calculator.comparison?.(inputs, outputs).says ?? []),
  }
}
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const moves = fc.record({
  mass: between(2, 12),
  frontWeight: between(35, 65),
  wheelbase: between(200, 600),
  partMass: between(1, 800),
  moveForward: between(-100, 100),
  moveLeft: between(-150, 150),
  moveUp: between(-80, 80),
})

describe('move-weight', () => {
  it('moves the default battery', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.cgForward).toBeCloseTo(10 / 9, 12)
    expect(outputs.newFrontWeight).toBeCloseTo(48.34188, 5)
    expect(outputs).toMatchObject({ cgLeft: 0, cgUp: 0 })
    expect(warnings).toEqual([])
  })

  it('is undone by moving the part back', () => {
    fc.assert(
      fc.property(moves, (values) => {
        const there = answered(values).outputs
        const back = answered({
          ...values,
          frontWeight: there.newFrontWeight,
          moveForward: -values.moveForward,
          moveLeft: -values.moveLeft,
          moveUp: -values.moveUp,
        }).outputs
        expect(back.newFrontWeight).toBeCloseTo(values.frontWeight, 9)
        expect(back.cgForward).toBeCloseTo(-there.cgForward, 9)
        expect(back.cgLeft).toBeCloseTo(-there.cgLeft, 9)
        expect(back.cgUp).toBeCloseTo(-there.cgUp, 9)
      }),
    )
  })

  it('moves the centre of gravity the way of the part, and less far', () => {
    fc.assert(
      fc.property(moves, (values) => {
        const { cgForward, cgLeft, cgUp } = answered(values).outputs
        for (const [shift, move] of [
          [cgForward, values.moveForward],
          [cgLeft, values.moveLeft],
          [cgUp, values.moveUp],
        ] as const) {
          expect(shift * move).toBeGreaterThanOrEqual(0)
          expect(Math.abs(shift)).toBeLessThanOrEqual(Math.abs(move))
        }
      }),
    )
  })

  it('is in proportion to the part and to the way', () => {
    fc.assert(
      fc.property(moves, (values) => {
        const whole = answered(values).outputs
        const half = answered({ ...values, moveForward: values.moveForward / 2 }).outputs
        const light = answered({ ...values, partMass: values.partMass / 2 + 0.5 }).outputs
        expect(half.cgForward * 2).toBeCloseTo(whole.cgForward, 9)
        expect(light.cgUp * values.partMass).toBeCloseTo(whole.cgUp * (values.partMass / 2 + 0.5), 6)
      }),
    )
  })

  it('refuses a part heavier than its car, and an axle left with nothing', () => {
    expect(refused({ partMass: 3600 })).toEqual([
      ['partMass', 'A part of 3,600\u00A0g cannot be in a car of 3.6\u00A0kg.'],
    ])
    expect(refused({ partMass: 3000, moveForward: 400 })).toEqual([
      [
        'moveForward',
        'Moved so far the rear wheels would carry nothing, and the car would stand on its other axle.',
      ],
    ])
    expect(refused({ partMass: 3000, moveForward: -400 })[0]?.[1]).toContain(
      'the front wheels would carry nothing',
    )
    expect(refused({ moveUp: 151 })).toEqual([
      [
        'moveUp',
        'Up must be between −150\u00A0mm and 150\u00A0mm: further, the part would no longer be in the car.',
      ],
    ])
    expect(refused({ partMass: 0, moveLeft: null }).map(([field]) => field)).toEqual(['partMass', 'moveLeft'])
  })

  it.each([
    [{ partMass: 1801, moveForward: 0 }, ['partMass']],
    [{ frontWeight: 34 }, ['moveForward']],
    [{ frontWeight: 65.5, moveForward: 0 }, ['moveForward']],
    [{ frontWeight: 36, moveForward: -10 }, []],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the new balance first, then what else moves', () => {
    expect(words({ moveLeft: -20, moveUp: -5 }).answer).toEqual([
      'The front wheels then carry 48.3\u00A0% of the weight instead of 48\u00A0%.',
      '12.3\u00A0g go from the rear axle to the front one.',
      'The centre of gravity moves 1.1\u00A0mm forward and 2.2\u00A0mm to the right; weigh all four wheels afterwards.',
      'It comes down by 0.56\u00A0mm: less load moves in corners, on power and on the brakes.',
    ])
    expect(words({ moveForward: 0, moveUp: 5 }).answer).toEqual([
      'The front wheels keep their 48\u00A0% of the weight.',
      'It rises by 0.56\u00A0mm: more load moves in corners, on power and on the brakes.',
    ])
  })

  it.each([
    [10, '400\u00A0g moved 10\u00A0mm forward puts 12.3\u00A0g more on the front wheels.'],
    [-10, '400\u00A0g moved 10\u00A0mm back takes 12.3\u00A0g off the front wheels.'],
    [0, 'Front and rear axle carry what they did.'],
  ])('moved %d mm: %s', (moveForward, sentence) => {
    expect(words({ moveForward }).comparison).toBe(sentence)
  })

  it('draws the shift in both views with its true length', () => {
    const { inputs, outputs } = answered({ moveLeft: 20, moveUp: -15 })
    const [drawing] = calculator.drawings?.(inputs, outputs, 0) ?? []
    const points = drawing?.shapes.filter((shape) => shape.kind === 'point') ?? []
    const [fromAbove, nowAbove, fromSide, nowSide] = points.map(({ at }) => at)
    expect((nowAbove?.[0] ?? NaN) - (fromAbove?.[0] ?? NaN)).toBeCloseTo(outputs.cgForward, 9)
    expect((nowAbove?.[1] ?? NaN) - (fromAbove?.[1] ?? NaN)).toBeCloseTo(outputs.cgLeft, 9)
    expect((nowSide?.[1] ?? NaN) - (fromSide?.[1] ?? NaN)).toBeCloseTo(outputs.cgUp, 9)
    expect(plainSentence(drawing?.alternative ?? [])).toContain(
      '1.1\u00A0mm forward, 2.2\u00A0mm left and 1.7\u00A0mm down',
    )
  })
})
