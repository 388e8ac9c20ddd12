import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { rollAxisDrawing } from './drawing.ts'
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
const answerOf = (values: Record<string, unknown>) => {
  const { inputs, outputs } = answered(values)
  const { says, more } = calculator.answer(inputs as never, outputs as never)
  return [says, ...more].map((sentence) => plainSentence(sentence))
}

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true })
/** Cars stiff enough to stand; tracks and roll centres as they are built. */
const car = fc.record({
  mass: number(0.5, 12),
  frontWeight: number(20, 80),
  wheelbase: number(100, 600),
  cgHeight: number(30, 200),
  trackFront: number(200, 600),
  trackRear: number(200, 600),
  rollCentreFront: number(-20, 29),
  rollCentreRear: number(-20, 29),
  wheelRateFront: number(1, 200),
  wheelRateRear: number(1, 200),
  barRateFront: number(0, 200),
  barRateRear: number(0, 200),
  lateralAcceleration: number(0.1, 5),
})

describe('roll-balance', () => {
  it('works out the default car', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.rollStiffnessFront).toBeCloseTo(0.28373, 4)
    expect(outputs.rollAngle).toBeCloseTo(1.8937, 3)
    expect(outputs.frontShare).toBeCloseTo(48.82, 1)
    expect(outputs.insideLoadFront).toBeCloseTo(5.37, 1)
    expect(warnings).toEqual([])
  })

  it('moves as much across as side force and leaning weight tip', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { loadTransferFront = NaN, loadTransferRear = NaN, rollAngle = NaN } = outputsOf(values)
        const share = values.frontWeight / 100
        const lever = values.cgHeight - values.rollCentreFront * share - values.rollCentreRear * (1 - share)
        const weight = values.mass * 9.80665
        const tipped =
          weight * values.lateralAcceleration * values.cgHeight +
          weight * lever * ((rollAngle * Math.PI) / 180)
        expect(
          (loadTransferFront * values.trackFront + loadTransferRear * values.trackRear) / tipped,
        ).toBeCloseTo(1, 9)
      }),
    )
  })

  it('is the same car turned round when front and rear change places', () => {
    fc.assert(
      fc.property(car, (values) => {
        const turned = outputsOf({
          ...values,
          frontWeight: 100 - values.frontWeight,
          trackFront: values.trackRear,
          trackRear: values.trackFront,
          rollCentreFront: values.rollCentreRear,
          rollCentreRear: values.rollCentreFront,
          wheelRateFront: values.wheelRateRear,
          wheelRateRear: values.wheelRateFront,
          barRateFront: values.barRateRear,
          barRateRear: values.barRateFront,
        })
        const { frontShare = NaN, rollAngle = NaN, insideLoadRear = NaN } = outputsOf(values)
        expect(turned.frontShare).toBeCloseTo(100 - frontShare, 7)
        expect((turned.rollAngle ?? NaN) / rollAngle).toBeCloseTo(1, 9)
        expect(turned.insideLoadFront).toBeCloseTo(insideLoadRear, 6)
      }),
    )
  })

  it('cannot tell a bar from a spring in a corner', () => {
    fc.assert(
      fc.property(car, number(0, 1), (values, part) => {
        const together = values.wheelRateFront + values.barRateFront
        fc.pre(together <= 200 && together * part > 0.01)
        const other = outputsOf({
          ...values,
          wheelRateFront: together * part,
          barRateFront: together * (1 - part),
        })
        expect(other.frontShare).toBeCloseTo(outputsOf(values).frontShare ?? NaN, 6)
      }),
    )
  })

  it('gives the stiffer end more of it and leans less', () => {
    fc.assert(
      fc.property(car, number(1, 50), (values, added) => {
        fc.pre(values.barRateFront + added <= 200)
        const before = outputsOf(values)
        const after = outputsOf({ ...values, barRateFront: values.barRateFront + added })
        expect(after.frontShare).toBeGreaterThan(before.frontShare ?? NaN)
        expect(after.rollAngle).toBeLessThan(before.rollAngle ?? NaN)
        expect(after.insideLoadRear).toBeGreaterThan(before.insideLoadRear ?? NaN)
      }),
    )
  })

  it('leans and shares in proportion to the corner', () => {
    fc.assert(
      fc.property(car, number(0.1, 5), (values, lateralAcceleration) => {
        const times = lateralAcceleration / values.lateralAcceleration
        const [one, other] = [outputsOf(values), outputsOf({ ...values, lateralAcceleration })]
        expect((other.rollAngle ?? NaN) / (one.rollAngle ?? NaN) / times).toBeCloseTo(1, 9)
        expect((other.loadTransferRear ?? NaN) - (one.loadTransferRear ?? NaN) * times).toBeCloseTo(0, 6)
        expect(other.frontShare).toBeCloseTo(one.frontShare ?? NaN, 7)
      }),
    )
  })

  it('refuses a car that does not stand, and what is no car', () => {
    expect(
      refused({ wheelRateFront: 0.01, wheelRateRear: 0.01, barRateFront: 0, barRateRear: 0, cgHeight: 60 }),
    ).toEqual([
      [
        'wheelRateFront',
        'Springs and bars this soft do not hold the car up: it falls onto its side at rest. Stiffen them, widen the track or lower the centre of gravity.',
      ],
    ])
    expect(refused({ barRateFront: -0.1 })).toEqual([
      [
        'barRateFront',
        'Front sway bar must be between 0\u00A0N/mm and 200\u00A0N/mm: less than no bar there is not, and more no car carries.',
      ],
    ])
    expect(
      refused({ lateralAcceleration: 0, frontWeight: 140, mass: NaN, trackRear: '255' }).map(
        ([field]) => field,
      ),
    ).toEqual(['lateralAcceleration', 'mass', 'frontWeight', 'trackRear'])
  })

  it('refuses roll centres that move no load outward', () => {
    const odd = {
      cgHeight: 5,
      trackFront: 80,
      trackRear: 600,
      rollCentreFront: -150,
      rollCentreRear: 155,
      frontWeight: 50,
      wheelRateFront: 0.3,
      wheelRateRear: 200,
    }
    expect(refused(odd).map(([field]) => field)).toEqual(['rollCentreFront'])
  })

  it.each([
    [{}, []],
    [{ lateralAcceleration: 3 }, ['lateralAcceleration']],
    [{ wheelRateFront: 0.05, wheelRateRear: 0.05, barRateFront: 0, barRateRear: 0 }, ['wheelRateFront']],
    [{ rollCentreFront: 60, rollCentreRear: 60 }, ['cgHeight']],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says who takes the load, which way that goes and when a wheel would lift', () => {
    expect(answerOf({})).toEqual([
      'In a corner of 1\u00A0g the front tyres take 48.8\u00A0% of what moves from the inside to the outside.',
      'The car leans 1.9° and 6.36\u00A0N moves across in all.',
      'That is about its 48\u00A0% of the weight, so neither end is asked to give up grip first.',
      'The first wheel to lift would be the inside front, at 2.73\u00A0g.',
    ])
    expect(answerOf({ barRateFront: 1 })[2]).toContain('the car pushes more')
    expect(answerOf({ barRateRear: 1 })[2]).toContain('the car turns in harder')
  })

  it('says first of all that a wheel lifts, or two', () => {
    const lifted = answerOf({ barRateFront: 2, lateralAcceleration: 2.4 })
    expect(lifted[0]).toMatch(
      /^The inside front wheel lifts: it carries nothing from \d(\.\d+)?\u00A0g on, and you asked for 2\.4\u00A0g\.$/,
    )
    expect(answerOf({ barRateRear: 2, lateralAcceleration: 2.4 })[0]).toContain('inside rear wheel lifts')
    expect(answerOf({ lateralAcceleration: 4 })[0]).toMatch(
      /^Both inside wheels lift at 4\u00A0g: the car rolls over/,
    )
  })

  it('lifts the wheel exactly where it said', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { inputs, outputs } = answered(values)
        const { says } = calculator.answer(inputs as never, outputs as never)
        fc.pre(plainSentence(says).startsWith('The inside'))
        const at = says.find((part) => typeof part !== 'string' && part.main && part.unit === 'g0')
        fc.pre(at !== undefined && typeof at !== 'string' && at.value >= 0.1)
        const there = outputsOf({ ...values, lateralAcceleration: typeof at === 'object' ? at.value : NaN })
        expect(
          Math.min(Math.abs(there.insideLoadFront ?? NaN), Math.abs(there.insideLoadRear ?? NaN)),
        ).toBeLessThan(1e-9 * values.mass * 10)
      }),
    )
  })

  it('goes over where the moments of both axles say, though one end may lift long before', () => {
    // m a h about the outer tyres against m g t/2: with a stiff car (no lean to speak of) and equal tracks at a = g t/(2 h).
    const stiff = { wheelRateFront: 40, wheelRateRear: 40, barRateFront: 3, cgHeight: 45, trackFront: 255, trackRear: 255 }
    const over = 255 / (2 * 45)
    const says = (lateralAcceleration: number) => answerOf({ ...stiff, lateralAcceleration })[0]
    expect(says(over * 1.01)).toMatch(/the car rolls over, from about 2\.8\d\u00A0g on\.$/)
    expect(says(over * 0.97)).not.toContain('rolls over')
    expect(answerOf({ barRateFront: 3, lateralAcceleration: 2 }).join(' ')).toMatch(/^The inside front wheel lifts.*goes over from about 2\.8\d\u00A0g on/)
    expect(answerOf({ barRateFront: 3, lateralAcceleration: 3.5 })[0]).toContain('rolls over')
  })

  it('prints no share where one end moves load the other way', () => {
    const odd = { rollCentreFront: -150, rollCentreRear: 100, cgHeight: 10 }
    const { inputs, outputs } = answered(odd)
    expect(answerOf(odd).join(' ')).not.toMatch(/%/)
    expect(plainSentence(calculator.comparison?.(inputs as never, outputs as never).says ?? [])).not.toMatch(/share/)
  })

  it('compares with a stiffer front bar', () => {
    const { inputs, outputs } = answered({})
    expect(plainSentence(calculator.comparison?.(inputs as never, outputs as never).says ?? [])).toMatch(
      /^0\.1\u00A0N\/mm more front bar takes the front’s share from 48\.8\u00A0% to 5\d(\.\d)?\u00A0%, and the car leans \d+(\.\d)?\u00A0% less\.$/,
    )
  })

  it('says that nothing leans where the mass lies on the roll axis', () => {
    const level = { rollCentreFront: 45, rollCentreRear: 45 }
    const { inputs, outputs } = answered(level)
    expect(plainSentence(calculator.comparison?.(inputs as never, outputs as never).says ?? [])).toMatch(
      /and the car leans just as much\.$/,
    )
    expect(answerOf(level)[1]).toMatch(/^The car leans 0°/)
  })

  it('keeps both lines and the point in the frame, also where a wheel gains load', () => {
    fc.assert(
      fc.property(car, (values) => {
        const odd = { ...values, rollCentreFront: -150, rollCentreRear: 28, trackRear: values.trackFront }
        for (const each of [values, odd]) {
          const { inputs, outputs } = answered(each)
          const [plot] = calculator.plots?.(inputs as never, outputs as never, 0) ?? []
          const loads = [
            ...(plot?.lines.flatMap(({ points }) => points.map(([, load]) => load)) ?? []),
            ...(plot?.points.map(({ y }) => y) ?? []),
          ]
          expect(loads.every((load) => load >= -1e-6 && load <= (plot?.y.max ?? NaN))).toBe(true)
        }
      }),
    )
  })

  it('draws the axis through both roll centres and the lever up to the mass', () => {
    fc.assert(
      fc.property(car, (values) => {
        const { shapes, frame } = rollAxisDrawing(values)
        const axis = shapes.find((shape) => shape.kind === 'line' && shape.style === 'thought')
        const lever = shapes.find((shape) => shape.kind === 'arrow')
        if (axis?.kind !== 'line' || lever?.kind !== 'arrow') throw new Error('A line is missing.')
        const [[, rear] = [], [, front] = []] = axis.points
        expect([rear, front]).toEqual([values.rollCentreRear, values.rollCentreFront])
        const across = lever.from[0] / values.wheelbase
        expect(lever.from[1]).toBeCloseTo(
          values.rollCentreRear * (1 - across) + values.rollCentreFront * across,
          9,
        )
        expect(lever.to[1]).toBeLessThan(frame.top)
        expect(Math.min(values.rollCentreFront, values.rollCentreRear)).toBeGreaterThan(frame.bottom)
      }),
    )
  })
})
