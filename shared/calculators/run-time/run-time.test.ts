import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { calculator } from './index.ts'

type Inputs = Record<'capacity' | 'usableShare' | 'averageCurrent' | 'cells' | 'chargeRate', number>
type Outputs = Record<
  'runTime' | 'energy' | 'power' | 'dischargeRate' | 'chargeCurrent' | 'chargeTime',
  number
>
const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return { ...result, inputs: result.inputs as Inputs, outputs: result.outputs as Outputs }
}
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const pack = fc.record({
  capacity: between(100, 30_000),
  usableShare: between(1, 100),
  averageCurrent: between(0.1, 300),
  cells: fc.integer({ min: 1, max: 14 }),
  chargeRate: between(0.1, 10),
})

describe('run-time', () => {
  it('works out the default pack', () => {
    const { outputs, warnings } = answered({})
    expect(outputs).toEqual({
      runTime: 8,
      energy: 74,
      power: 444,
      dischargeRate: 6,
      chargeCurrent: 5,
      chargeTime: 60,
    })
    expect(warnings).toEqual([])
  })

  it('takes out as much charge as the run needs', () => {
    fc.assert(
      fc.property(pack, (values) => {
        const { runTime, energy, power } = answered(values).outputs
        const driven = (values.capacity * values.usableShare) / 100
        expect((runTime / 60) * values.averageCurrent * 1000).toBeCloseTo(driven, 6)
        // Energy driven is the same share of the energy in the pack.
        expect((power * runTime) / 60 / energy).toBeCloseTo(values.usableShare / 100, 9)
      }),
    )
  })

  it('puts back the whole capacity with the current and in the time it names', () => {
    fc.assert(
      fc.property(pack, (values) => {
        const { chargeCurrent, chargeTime } = answered(values).outputs
        expect((chargeCurrent * chargeTime * 1000) / 60).toBeCloseTo(values.capacity, 6)
      }),
    )
  })

  it('is over in 60 minutes by the C rate when all of it is driven', () => {
    fc.assert(
      fc.property(pack, (values) => {
        const { runTime, dischargeRate } = answered({ ...values, usableShare: 100 }).outputs
        expect(runTime * dischargeRate).toBeCloseTo(60, 9)
      }),
    )
  })

  it('runs half as long at twice the current, and no longer with more cells', () => {
    fc.assert(
      fc.property(pack, (values) => {
        const { runTime } = answered(values).outputs
        expect(
          answered({ ...values, averageCurrent: values.averageCurrent / 2 + 0.05 }).outputs.runTime,
        ).toBeGreaterThanOrEqual(runTime)
        expect(answered({ ...values, cells: 1 }).outputs.runTime).toBe(runTime)
      }),
    )
  })

  it.each([
    [
      { averageCurrent: 0 },
      'averageCurrent',
      'Average current must be between 0.1\u00A0A and 300\u00A0A: without current there is no run time to give, and no R/C car draws more on average.',
    ],
    [{ cells: 4.5 }, 'cells', 'Cells in a row must be a whole number.'],
    [
      { chargeRate: 0 },
      'chargeRate',
      'Charge rate must be between 0.1\u00A0C and 10\u00A0C: slower takes most of a day, and no maker’s leaflet allows faster.',
    ],
    [
      { usableShare: 101 },
      'usableShare',
      'How much of it you drive must be between 1\u00A0% and 100\u00A0%: a pack gives something, and not more than it holds.',
    ],
    [
      { capacity: Infinity },
      'capacity',
      'Battery capacity must be a number, between 100\u00A0mAh and 30,000\u00A0mAh.',
    ],
  ])('refuses %j', (values, field, message) => {
    const result = run(values)
    expect(
      result.ok ? [] : result.errors.map((error) => [error.field, plainSentence(error.message)]),
    ).toEqual([[field, message]])
  })

  it.each([
    [{ usableShare: 81 }, ['usableShare']],
    [{ chargeRate: 1.1 }, ['chargeRate']],
    [{ averageCurrent: 150 }, []],
    [{ averageCurrent: 151 }, ['averageCurrent']],
    [{ usableShare: 100, chargeRate: 2 }, ['usableShare', 'chargeRate']],
  ])('%j warns at %j', (values, fields) => {
    expect(answered(values).warnings.map(({ field }) => field)).toEqual(fields)
  })

  it('says the minutes first, and the charger’s setting with the leaflet before it', () => {
    const { inputs, outputs } = answered({})
    const { says, more } = calculator.answer(inputs, outputs)
    expect(plainSentence(says)).toBe('It runs about 8\u00A0min at 30\u00A0A on average.')
    expect(more.map((sentence) => plainSentence(sentence)).slice(0, 2)).toEqual([
      'The pack holds 74\u00A0Wh and gives 444\u00A0W on average, at 6\u00A0C.',
      'Charge it with at most 5\u00A0A, if its leaflet allows that.',
    ])
    expect(plainSentence(more[2] ?? [])).toContain('puts back 80\u00A0% in about 48\u00A0min')
    expect(plainSentence(calculator.comparison?.(inputs, outputs).says ?? [])).toBe(
      'A tenth less current, from gearing or a calmer thumb, runs 0.89\u00A0min longer.',
    )
  })

  it('keeps its curves and the point inside the picture', () => {
    fc.assert(
      fc.property(pack, (values) => {
        const { inputs, outputs } = answered(values)
        const [plot] = calculator.plots?.(inputs, outputs, 0) ?? []
        const points = plot?.lines.flatMap((line) => line.points) ?? []
        expect(Math.min(...points.map(([x]) => x))).toBeGreaterThan(0)
        expect(Math.max(...points.map(([x]) => x))).toBeLessThanOrEqual((plot?.x.max ?? 0) * (1 + 1e-12))
        expect(Math.max(...points.map(([, y]) => y))).toBeLessThanOrEqual(plot?.y.max ?? 0)
        expect(plot?.lines.every((line) => line.points.length > 5)).toBe(true)
        expect(plot?.points[0]?.y).toBe(outputs.runTime)
        expect(outputs.runTime).toBeLessThan(plot?.y.max ?? 0)
      }),
    )
  })

  it('warns of charging, puncture, storage and the maker’s limits, those first', () => {
    const orders = calculator.cautions.map(({ order }) => order)
    expect(calculator.cautions.every(({ kind }) => kind === 'lithium')).toBe(true)
    expect(orders[0]).toContain('leaflets of your pack and charger')
    expect(orders.join(' ')).toMatch(
      /Never leave a charging pack alone.*punctured.*store packs about half full/,
    )
  })
})
