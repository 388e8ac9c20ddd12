import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'

type Inputs = Parameters<typeof calculator.compute>[0]
type Outputs = ReturnType<typeof calculator.compute>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Partial<Inputs>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { inputs: result.inputs as Inputs, outputs: result.outputs as Outputs, warnings: result.warnings }
}
const offset = fc.double({ min: -10, max: 10, noNaN: true })
const inserts = fc.record({
  blockSpacing: fc.double({ min: 5, max: 300, noNaN: true }),
  frontOut: offset,
  frontUp: offset,
  rearOut: offset,
  rearUp: offset,
})

describe('hinge-pin-inserts', () => {
  it('changes nothing with every insert in its middle', () => {
    const { outputs } = answered({ baseToe: 2.5, baseAngle: 3 })
    expect(outputs).toEqual({ toe: 2.5, pinAngle: 3, pinHeight: 0, trackChange: 0 })
  })

  it('works the example of the guide on rear toe', () => {
    const { outputs } = answered({ rearOut: 0.5 })
    expect(outputs.toe).toBeCloseTo(0.4775, 4)
    expect(outputs.trackChange).toBe(0.5)
  })

  it('only moves the pin when both blocks get the same insert', () => {
    fc.assert(
      fc.property(offset, offset, (out, up) => {
        const { outputs } = answered({ frontOut: out, rearOut: out, frontUp: up, rearUp: up })
        expect(outputs).toEqual({ toe: 0, pinAngle: 0, pinHeight: up, trackChange: 2 * out })
      }),
    )
  })

  it('turns the other way when the inserts change blocks', () => {
    fc.assert(
      fc.property(inserts, (values) => {
        const { outputs } = answered(values)
        const swapped = answered({
          ...values,
          frontOut: values.rearOut,
          rearOut: values.frontOut,
          frontUp: values.rearUp,
          rearUp: values.frontUp,
        }).outputs
        expect(swapped.toe).toBeCloseTo(-outputs.toe, 12)
        expect(swapped.pinAngle).toBeCloseTo(-outputs.pinAngle, 12)
        expect(swapped.pinHeight).toBe(outputs.pinHeight)
        expect(swapped.trackChange).toBe(outputs.trackChange)
      }),
    )
  })

  it('keeps toe and tilt apart: out does not tilt, up does not steer', () => {
    fc.assert(
      fc.property(inserts, (values) => {
        const { outputs } = answered(values)
        expect(answered({ ...values, frontUp: 0, rearUp: 0 }).outputs.toe).toBe(outputs.toe)
        expect(answered({ ...values, frontOut: 0, rearOut: 0 }).outputs.pinAngle).toBe(outputs.pinAngle)
      }),
    )
  })

  it('adds what hubs and blocks have built in', () => {
    fc.assert(
      fc.property(inserts, fc.double({ min: -20, max: 20, noNaN: true }), (values, base) => {
        const { outputs } = answered(values)
        const on = answered({ ...values, baseToe: base, baseAngle: base }).outputs
        expect(on.toe - outputs.toe).toBeCloseTo(base, 9)
        expect(on.pinAngle - outputs.pinAngle).toBeCloseTo(base, 9)
      }),
    )
  })

  it.each([
    [
      { frontOut: 11 },
      'Front block: hole out must be between −10\u00A0mm and 10\u00A0mm: no insert moves its hole further than that.',
    ],
    [
      { blockSpacing: 0 },
      'Front block to rear block must be between 5\u00A0mm and 300\u00A0mm: that is the range of hinge pins from the smallest cars to the largest.',
    ],
    [
      { baseAngle: 31 },
      'Pin angle without inserts must be between −30° and 30°: no block or hub is made with more than that.',
    ],
    [{ rearUp: Infinity }, 'Hole up must'],
  ])('refuses %j with its reason', (values, words) => {
    const result = run(values)
    const message = result.ok ? '' : plainSentence(result.errors[0]?.message ?? [])
    expect(message.replace('Rear block: hole up', 'Hole up').startsWith(words)).toBe(true)
  })

  it.each([
    [{ rearOut: 6 }, []],
    [{ rearOut: 7 }, ['rearOut']],
    [{ baseAngle: 16 }, ['rearUp']],
    [{ blockSpacing: 20, frontUp: 4, rearUp: -2 }, ['rearUp', 'blockSpacing']],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it.each([
    [
      { rearOut: 0.5, frontUp: 1 },
      'These inserts give 0.477° of toe-in at each wheel and a pin tilted by 0.955°, front end higher.',
    ],
    [
      { frontOut: 1, rearUp: 1 },
      'These inserts give 0.955° of toe-out at each wheel and a pin tilted by 0.955°, rear end higher.',
    ],
    [{}, 'These inserts give 0° of toe at each wheel and a level pin.'],
  ])('says what %j gives', (values, words) => {
    const { inputs, outputs } = answered(values)
    const { says } = calculator.answer(inputs, outputs)
    expect(plainSentence(says)).toBe(words)
    expect(says.filter((part) => typeof part !== 'string' && part.main)).toHaveLength(1)
  })

  it('says where the pin and the track went', () => {
    const more = (values: Partial<Inputs>) => {
      const { inputs, outputs } = answered(values)
      return plainSentence(calculator.answer(inputs, outputs).more[0] ?? [])
    }
    expect(more({ rearOut: 1, frontUp: -1 })).toBe(
      'The pin is 0.5\u00A0mm lower, and the track is 1\u00A0mm wider.',
    )
    expect(more({ rearOut: 1, frontOut: 1 })).toBe(
      'The pin stays as it was, and the track is 2\u00A0mm wider.',
    )
    expect(more({})).toBe('Pin height and track stay as they were.')
  })

  it.each([
    [{ rearOut: 0.5 }, 'These inserts turn each wheel 0.477° in.'],
    [
      { frontOut: 0.5, rearUp: 0.5 },
      'These inserts turn each wheel 0.477° out and tilt the pin by 0.477°, rear end up.',
    ],
    [{ frontUp: 0.5 }, 'These inserts tilt the pin by 0.477°, front end up.'],
    [{ baseToe: 2 }, 'These inserts change neither toe nor pin angle.'],
  ])('says the difference %j makes', (values, words) => {
    const { inputs, outputs } = answered(values)
    expect(plainSentence(calculator.comparison!(inputs, outputs).says)).toBe(words)
  })

  it('draws both ends of the pin at five times their offset, from above and from the side', () => {
    fc.assert(
      fc.property(inserts, (values) => {
        const { inputs, outputs } = answered(values)
        const [above, side] = calculator.drawings!(inputs, outputs, 0).map(({ shapes, frame }) => {
          const holes = shapes.flatMap((shape) => (shape.kind === 'point' ? [shape.at] : []))
          for (const [, y] of holes) {
            expect(y).toBeGreaterThan(frame.bottom)
            expect(y).toBeLessThan(frame.top)
          }
          return holes
        })
        expect(above).toEqual([
          [0, 5 * values.frontOut],
          [values.blockSpacing, 5 * values.rearOut],
        ])
        expect(side).toEqual([
          [0, 5 * values.frontUp],
          [values.blockSpacing, 5 * values.rearUp],
        ])
      }),
    )
  })
})
