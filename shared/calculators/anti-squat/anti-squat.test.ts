import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { fullAngle } from './load-sharing.ts'
import { calculator } from './index.ts'

type Inputs = Record<
  'pinAngle' | 'wheelbase' | 'cgHeight' | 'rearDriveShare' | 'mass' | 'acceleration',
  number
>
type Outputs = Record<'antiSquat' | 'loadTransfer' | 'springLoad', number>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { ...result, inputs: result.inputs as Inputs, outputs: result.outputs as Outputs }
}
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const car = fc.record({
  pinAngle: between(-30, 30),
  wheelbase: between(100, 600),
  cgHeight: between(5, 200),
  rearDriveShare: between(1, 100),
  mass: between(0.5, 12),
  acceleration: between(0.01, 3),
})

describe('anti-squat', () => {
  it('works out the default car', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.antiSquat).toBeCloseTo(15.1325, 3)
    expect(outputs.loadTransfer).toBeCloseTo(2.44411, 4)
    expect(outputs.springLoad).toBeCloseTo(2.07425, 4)
    expect(warnings).toEqual([])
  })

  it('never changes how much load moves, only who carries it', () => {
    fc.assert(
      fc.property(car, between(-30, 30), (values, pinAngle) => {
        const one = answered(values).outputs
        const other = answered({ ...values, pinAngle }).outputs
        expect(other.loadTransfer).toBe(one.loadTransfer)
        expect(other.springLoad + (other.antiSquat / 100) * other.loadTransfer).toBeCloseTo(
          one.loadTransfer,
          6,
        )
      }),
    )
  })

  it('turns its sign with the tilt, and grows with it', () => {
    fc.assert(
      fc.property(car, between(0.001, 5), (values, more) => {
        const { antiSquat } = answered(values).outputs
        expect(answered({ ...values, pinAngle: -values.pinAngle }).outputs.antiSquat).toBeCloseTo(
          -antiSquat,
          9,
        )
        fc.pre(values.pinAngle + more <= 30)
        expect(answered({ ...values, pinAngle: values.pinAngle + more }).outputs.antiSquat).toBeGreaterThan(
          antiSquat,
        )
      }),
    )
  })

  it('is in proportion to share and wheelbase, and to one over the height; weight and acceleration do not matter', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { antiSquat } = answered(values).outputs
        const tall = answered({ ...values, cgHeight: 5 }).outputs.antiSquat
        expect(tall / 200).toBeCloseTo((antiSquat * values.cgHeight) / 1000, 6)
        expect(answered({ ...values, mass: 1, acceleration: 0 }).outputs.antiSquat).toBe(antiSquat)
        const half = answered({ ...values, rearDriveShare: values.rearDriveShare / 2 }).outputs.antiSquat
        expect(half).toBeCloseTo(antiSquat / 2, 9)
      }),
    )
  })

  it('leaves the springs nothing at the tilt it names for 100 %', () => {
    fc.assert(
      fc.property(car, (values) => {
        const pinAngle = fullAngle(values)
        fc.pre(pinAngle <= 30)
        const { antiSquat, springLoad } = answered({ ...values, pinAngle }).outputs
        expect(antiSquat).toBeCloseTo(100, 9)
        expect(springLoad).toBeCloseTo(0, 9)
      }),
    )
  })

  it.each([
    [
      { cgHeight: 0 },
      'cgHeight',
      'Height of the centre of gravity must be between 5\u00A0mm and 200\u00A0mm: lower it would lie in the chassis plate, higher the car would roll over.',
    ],
    [
      { acceleration: -0.5 },
      'acceleration',
      'Acceleration must be between 0\u00A0g and 3\u00A0g: below zero the car brakes, which shares the force otherwise, and no tyre pulls harder.',
    ],
    [
      { pinAngle: 90 },
      'pinAngle',
      'Tilt of the rear hinge pins must be between −30° and 30°: pins tilted further would let the wheel move back more than up.',
    ],
    [{ rearDriveShare: 101 }, 'rearDriveShare', undefined],
    [{ wheelbase: NaN }, 'wheelbase', 'Wheelbase must be a number, between 100\u00A0mm and 600\u00A0mm.'],
  ])('refuses %j at the right field', (values, field, message) => {
    const result = run(values)
    expect(result.ok).toBe(false)
    if (result.ok) return
    expect(result.errors.map((error) => error.field)).toEqual([field])
    if (message !== undefined) expect(plainSentence(result.errors[0]?.message ?? [])).toBe(message)
  })

  it.each([
    [{ pinAngle: 10 }, []],
    [{ pinAngle: 10.5 }, ['pinAngle']],
    [{ pinAngle: -10.5 }, ['pinAngle']],
    [{ pinAngle: 20, rearDriveShare: 100 }, ['pinAngle']],
    [{ acceleration: 3, cgHeight: 44 }, ['acceleration']],
    [{ acceleration: 2.5, cgHeight: 45 }, []],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it.each([
    [
      {},
      'Anti-squat is 15.1\u00A0%: so much of the load that moves to the rear on power goes through the arms.',
    ],
    [{ pinAngle: 0 }, 'Anti-squat is 0\u00A0%: the springs carry all of the load that moves to the rear.'],
    [
      { pinAngle: -2 },
      'Anti-squat is −15.1\u00A0%: the arms pull the rear down on power, and the springs carry more than the load that moves.',
    ],
    [
      { pinAngle: 20, rearDriveShare: 100 },
      'Anti-squat is 263\u00A0%: the arms carry more than the load that moves, and the rear rises on power.',
    ],
  ])('%j: %s', (values, sentence) => {
    const { inputs, outputs } = answered(values)
    expect(plainSentence(calculator.answer(inputs, outputs).says)).toBe(sentence)
  })

  it('says what one degree more does, also where it does nothing', () => {
    const compare = (values: Record<string, unknown>) => {
      const { inputs, outputs } = answered(values)
      return plainSentence(calculator.comparison?.(inputs, outputs).says ?? [])
    }
    expect(compare({})).toBe(
      'One degree more adds 7.6\u00A0% of anti-squat and takes 0.19\u00A0N off the rear springs.',
    )
    expect(compare({ pinAngle: 30 })).toContain('One degree more adds')
    expect(compare({ rearDriveShare: 0 })).toBe(
      'With no drive at the rear, tilting the pins changes nothing.',
    )
  })

  it('draws the line with the slope of the pins, and 100 % where the rise would be enough', () => {
    const drawn = (values: Record<string, unknown>) => {
      const { inputs, outputs } = answered(values)
      const [drawing] = calculator.drawings?.(inputs, outputs, 0) ?? []
      if (drawing === undefined) throw new Error('no drawing')
      return { drawing, outputs }
    }
    const { drawing, outputs } = drawn({ pinAngle: 5 })
    const own = drawing.shapes.find((shape) => shape.kind === 'line' && shape.style === 'own')
    const [from, to] = own?.kind === 'line' ? own.points : []
    const rise = (to?.[1] ?? NaN) - (from?.[1] ?? NaN)
    expect(rise / 325).toBeCloseTo(Math.tan((5 * Math.PI) / 180), 12)
    const mark = drawing.shapes.findLast((shape) => shape.kind === 'point')
    const full = (mark?.kind === 'point' ? mark.at[1] : NaN) - (from?.[1] ?? NaN)
    expect((100 * rise) / full).toBeCloseTo(outputs.antiSquat, 9)
    expect(drawn({ pinAngle: 3 }).drawing.frame).toEqual(drawing.frame)
    expect(drawn({ rearDriveShare: 10 }).drawing.caption).toContain('above the picture')
    const falling = drawn({ pinAngle: -25 }).drawing
    expect(falling.frame.bottom).toBeLessThan(57.5 - 325 * Math.tan((25 * Math.PI) / 180))
  })
})
