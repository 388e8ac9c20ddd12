import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'

type Inputs = Record<'mass' | 'wheelbase' | 'frontLevel' | 'frontRaised' | 'raisedBy' | 'tyreRadius', number>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { ...result, inputs: result.inputs as Inputs, outputs: result.outputs as { cgHeight: number } }
}
const refused = (values: Record<string, unknown>) => {
  const result = run(values)
  return result.ok ? [] : result.errors.map(({ field, message }) => [field, plainSentence(message)])
}
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
/** A car whose centre of gravity is known, and what a scale would read under its front axle when raised. */
const weighed = fc
  .record({
    mass: between(1, 12),
    wheelbase: between(200, 600),
    tilt: between(6, 44),
    share: between(0.25, 0.75),
    tyreRadius: between(20, 120),
    height: between(0.1, 1.9),
  })
  .map(({ mass, wheelbase, tilt, share, tyreRadius, height }) => {
    const angle = (tilt * Math.PI) / 180
    const cgHeight = tyreRadius * height
    const lever = share * wheelbase * Math.cos(angle) - (cgHeight - tyreRadius) * Math.sin(angle)
    return {
      cgHeight,
      values: {
        mass,
        wheelbase,
        tyreRadius,
        raisedBy: wheelbase * Math.sin(angle),
        frontLevel: 1000 * mass * share,
        frontRaised: (1000 * mass * lever) / (wheelbase * Math.cos(angle)),
      },
    }
  })

describe('cg-height', () => {
  it('works out the default car, whose front gets heavier when raised', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.cgHeight).toBeCloseTo(44.9376, 3)
    expect(warnings).toEqual([])
  })

  it('finds the height that the readings were made from', () => {
    fc.assert(
      fc.property(weighed, ({ cgHeight, values }) => {
        fc.pre(values.frontRaised > 1 && values.frontRaised < values.mass * 1000)
        expect(answered(values).outputs.cgHeight).toBeCloseTo(cgHeight, 6)
      }),
    )
  })

  it('puts it at the height of the axles when raising changes nothing', () => {
    fc.assert(
      fc.property(weighed, ({ values }) => {
        const { cgHeight } = answered({ ...values, frontRaised: values.frontLevel }).outputs
        expect(cgHeight).toBe(values.tyreRadius)
      }),
    )
  })

  it('gets lower with every gram that the raised front reads more', () => {
    fc.assert(
      fc.property(between(1400, 1800), between(0.5, 20), (frontRaised, more) => {
        const one = answered({ frontRaised }).outputs.cgHeight
        expect(answered({ frontRaised: frontRaised + more }).outputs.cgHeight).toBeLessThan(one)
      }),
    )
  })

  it('is one car in all sizes', () => {
    fc.assert(
      fc.property(between(0.6, 1.5), (size) => {
        const scaled = answered({ wheelbase: 325 * size, raisedBy: 100 * size, tyreRadius: 57.5 * size })
        expect(scaled.outputs.cgHeight / size).toBeCloseTo(answered({}).outputs.cgHeight, 8)
      }),
    )
  })

  it('refuses readings that put the centre of gravity under the ground', () => {
    expect(refused({ frontRaised: 1950 })).toEqual([
      [
        'frontRaised',
        'These readings would put the centre of gravity 12.3\u00A0mm below the ground, which cannot be. Weigh again, and check that both readings are of the front axle.',
      ],
    ])
  })

  it('refuses an axle that carries more than the car, and a car on its tail', () => {
    expect(refused({ frontLevel: 3600 })).toEqual([
      [
        'frontLevel',
        '3,600\u00A0g on the front axle would leave the rear axle nothing: the whole car weighs 3.6\u00A0kg.',
      ],
    ])
    expect(refused({ frontLevel: 4000, frontRaised: 4100 }).map(([field]) => field)).toEqual([
      'frontLevel',
      'frontRaised',
    ])
    expect(refused({ raisedBy: 230 })).toEqual([
      [
        'raisedBy',
        'Raised by 230\u00A0mm a car of 325\u00A0mm wheelbase stands steeper than 45°. It would roll or tip; raise it by a third of its wheelbase.',
      ],
    ])
    expect(refused({ raisedBy: 0 })).toEqual([
      [
        'raisedBy',
        'Front axle raised by must be between 10\u00A0mm and 500\u00A0mm: less changes the readings too little to see, and more is no tilt but a car on its tail.',
      ],
    ])
    expect(refused({ raisedBy: '100', mass: -3.6 }).map(([field]) => field)).toEqual(['mass', 'raisedBy'])
  })

  it.each([
    [{}, []],
    [{ frontRaised: 1700 }, []],
    [{ frontRaised: 1690 }, []],
    [{ frontRaised: 1550 }, ['frontRaised']],
    [{ frontRaised: 1860 }, ['frontRaised']],
    [{ raisedBy: 28, frontRaised: 1712 }, ['raisedBy']],
    [{ frontLevel: 700, frontRaised: 745 }, ['frontLevel']],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the height, its place and what a gram is worth', () => {
    const words = (values: Record<string, unknown>) => {
      const { inputs, outputs } = answered(values)
      const { says, more } = calculator.answer(inputs, outputs)
      return [says, ...more].map((sentence) => plainSentence(sentence))
    }
    expect(words({})[0]).toBe('The centre of gravity is 44.9\u00A0mm above the ground.')
    expect(words({})[1]).toContain('12.6\u00A0mm below the axles')
    expect(words({})[2]).toContain('One gram of error on the scale moves that by 0.28\u00A0mm.')
    expect(words({ frontRaised: 1690 })[1]).toBe(
      'That is 2.79\u00A0mm above the axles: raised, the front reads less.',
    )
    expect(words({ frontRaised: 1700 })[1]).toContain('level with the axles')
  })

  it('draws the car raised, and the point in the car where the readings put it', () => {
    const { inputs, outputs } = answered({})
    const [drawing] = calculator.drawings?.(inputs, outputs, 0) ?? []
    const wheels = drawing?.shapes.filter((shape) => shape.kind === 'circle') ?? []
    const [rear = [0, 0], front = [0, 0]] = wheels.map(({ at }) => at)
    expect(front[1] - rear[1]).toBe(100)
    expect(Math.hypot(front[0] - rear[0], front[1] - rear[1])).toBeCloseTo(325, 9)
    const point = drawing?.shapes.find((shape) => shape.kind === 'point')
    const [x = NaN, y = NaN] = point?.kind === 'point' ? point.at : []
    const angle = Math.asin(100 / 325)
    // Distance from the line through the axles, below counting minus.
    const offLine = (y - rear[1]) * Math.cos(angle) - x * Math.sin(angle)
    expect(57.5 + offLine).toBeCloseTo(outputs.cgHeight, 9)
    expect(x / Math.cos(angle)).toBeGreaterThan(0)
  })
})
