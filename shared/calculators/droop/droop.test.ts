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
const refused = (values: Record<string, unknown>) => {
  const result = run(values)
  return result.ok ? undefined : plainSentence(result.errors[0]?.message ?? [])
}
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const car = fc.record({
  armLength: between(10, 300),
  screwRadius: between(2, 150),
  screwPitch: between(0.1, 3),
  turns: between(-20, 20),
})

describe('droop', () => {
  it('works the guide’s example', () => {
    const { outputs } = answered({})
    expect(outputs.screwTravel).toBeCloseTo(0.7, 12)
    expect(outputs.armAngle).toBeCloseTo(2.0045, 4)
    expect(outputs.wheelTravel).toBeCloseTo(3.4979, 4)
  })

  it('takes away turning in what it gave turning out', () => {
    fc.assert(
      fc.property(car, (values) => {
        const out = answered(values).outputs.wheelTravel
        expect(answered({ ...values, turns: -values.turns }).outputs.wheelTravel).toBeCloseTo(-out, 9)
      }),
    )
  })

  it('moves the wheel further with every turn, and never by more than the arm is long', () => {
    fc.assert(
      fc.property(car, between(0.01, 1), (values, further) => {
        fc.pre(values.turns + further <= 20)
        const { wheelTravel } = answered(values).outputs
        expect(answered({ ...values, turns: values.turns + further }).outputs.wheelTravel).toBeGreaterThan(
          wheelTravel,
        )
        expect(Math.abs(wheelTravel)).toBeLessThanOrEqual(values.armLength)
      }),
    )
  })

  it('grows with the arm in proportion, and stays when arm, radius and pitch all double', () => {
    fc.assert(
      fc.property(car, (values) => {
        fc.pre(values.armLength <= 150 && values.screwRadius <= 75 && values.screwPitch <= 1.5)
        const { wheelTravel, armAngle } = answered(values).outputs
        const longer = answered({ ...values, armLength: 2 * values.armLength }).outputs
        expect(longer.wheelTravel).toBeCloseTo(2 * wheelTravel, 9)
        const larger = answered({
          ...values,
          armLength: 2 * values.armLength,
          screwRadius: 2 * values.screwRadius,
          screwPitch: 2 * values.screwPitch,
        }).outputs
        expect(larger.armAngle).toBeCloseTo(armAngle, 9)
        expect(larger.wheelTravel).toBeCloseTo(2 * wheelTravel, 9)
      }),
    )
  })

  it.each([
    [
      { screwRadius: 1 },
      'Inner pin to droop screw must be between 2\u00A0mm and 150\u00A0mm: closer to the pin the screw would foul it, and further out it would miss the chassis.',
    ],
    [
      { screwPitch: 0 },
      'Pitch of the screw must be between 0.1\u00A0mm and 3\u00A0mm: no screw of a model car is finer or coarser.',
    ],
    [{ turns: 21 }, 'Turns out must be between −20 and 20: no droop screw has more thread than that.'],
    [
      { armLength: '100' },
      'Arm, inner pin to outer pin must be a number, between 10\u00A0mm and 300\u00A0mm.',
    ],
  ])('refuses %j with its reason', (values, words) => {
    expect(refused(values)).toBe(words)
  })

  it.each([
    [{}, []],
    [{ turns: 10 }, []],
    [{ turns: 11 }, ['turns']],
    [{ turns: -11 }, ['turns']],
    [{ screwRadius: 100 }, ['screwRadius']],
    [{ screwRadius: 99 }, []],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it.each([
    [1, 'Turning the screw one turn out adds 3.5\u00A0mm of droop at the wheel.'],
    [0.5, 'Turning the screw half a turn out adds 1.75\u00A0mm of droop at the wheel.'],
    [-0.25, 'Turning the screw 0.25 turns in takes away 0.875\u00A0mm of droop at the wheel.'],
    [0, 'Without turning the screw droop stays as it is: 0\u00A0mm.'],
  ])('says what %d turns do', (turns, words) => {
    const { inputs, outputs } = answered({ turns })
    const { says } = calculator.answer(inputs, outputs)
    expect(plainSentence(says)).toBe(words)
    expect(says.filter((part) => typeof part !== 'string' && part.main)).toHaveLength(1)
  })

  it('says what another half turn does, and lists the turns as it would compute them', () => {
    const { inputs, outputs } = answered({})
    expect(plainSentence(calculator.comparison!(inputs, outputs).says)).toBe(
      'Another half turn out adds 1.74\u00A0mm of droop.',
    )
    const [table] = calculator.tables!(inputs, outputs)
    expect(table?.rows[0]?.cells[2]).toBe(outputs.wheelTravel)
    expect(table?.rows[0]?.cells[3]).toBe(answered({ turns: 2 }).outputs.wheelTravel)
  })

  it('draws the outer end as far below level as it says, inside a picture that stands still', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { inputs, outputs } = answered(values)
        const [drawing] = calculator.drawings!(inputs, outputs, 0)
        const points = drawing!.shapes.flatMap((shape) =>
          shape.kind === 'point' && shape.style === 'part' ? [shape.at] : [],
        )
        const [, outer = [NaN, NaN]] = points
        expect(-outer[1]).toBeCloseTo(outputs.wheelTravel, 9)
        expect(Math.hypot(...outer)).toBeCloseTo(values.armLength, 9)
        expect(outer[1]).toBeGreaterThan(drawing!.frame.bottom)
        expect(outer[1]).toBeLessThan(drawing!.frame.top)
      }),
    )
    const frameAt = (turns: number) => {
      const { inputs, outputs } = answered({ turns })
      return calculator.drawings!(inputs, outputs, 0)[0]?.frame
    }
    expect(frameAt(0.25)).toEqual(frameAt(3))
  })
})
