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
const tableOf = (values: Record<string, unknown>) => {
  const { inputs, outputs } = answered(values)
  const [table] = calculator.tables?.(inputs as never, outputs as never) ?? []
  if (table === undefined) throw new Error('There is no table.')
  return table
}
const saysWith = (values: Record<string, unknown>) => {
  const { inputs, outputs } = answered(values)
  return plainSentence(calculator.comparison?.(inputs as never, outputs as never).says ?? [])
}

const gears = fc.record({
  spurTeeth: fc.integer({ min: 10, max: 200 }),
  pinionTeeth: fc.integer({ min: 5, max: 80 }),
  ringTeeth: fc.integer({ min: 1, max: 200 }),
  diffPinionTeeth: fc.integer({ min: 1, max: 100 }),
  tyreDiameter: fc.double({ min: 20, max: 300, noNaN: true }),
  motorKv: fc.double({ min: 100, max: 20000, noNaN: true }),
  cells: fc.integer({ min: 1, max: 14 }),
  voltsPerCell: fc.double({ min: 1, max: 4.5, noNaN: true }),
})

describe('gearing', () => {
  it('works out the default car', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.finalDriveRatio).toBeCloseTo((46 * 43) / (15 * 11), 12)
    expect(outputs.motorSpeed).toBeCloseTo(30340, 9)
    expect(outputs.speed).toBeCloseTo(54.86, 2)
    expect(warnings).toEqual([])
  })

  it('rolls one circumference in as many motor turns as the final drive', () => {
    fc.assert(
      fc.property(gears, (values) => {
        const { rollout, finalDriveRatio } = outputsOf(values) as { rollout: number; finalDriveRatio: number }
        expect((rollout * finalDriveRatio) / (Math.PI * values.tyreDiameter)).toBeCloseTo(1, 12)
      }),
    )
  })

  it('is the same with both gears of a step doubled, and turned over when they change places', () => {
    fc.assert(
      fc.property(gears, (values) => {
        fc.pre(values.ringTeeth <= 100 && values.diffPinionTeeth <= 50)
        const one = outputsOf(values).finalDriveRatio ?? NaN
        const doubled = {
          ...values,
          ringTeeth: values.ringTeeth * 2,
          diffPinionTeeth: values.diffPinionTeeth * 2,
        }
        expect((outputsOf(doubled).finalDriveRatio ?? NaN) / one).toBeCloseTo(1, 12)
        const swapped = { ...values, ringTeeth: values.diffPinionTeeth, diffPinionTeeth: values.ringTeeth }
        const step = values.ringTeeth / values.diffPinionTeeth
        expect(((outputsOf(swapped).finalDriveRatio ?? NaN) * step * step) / one).toBeCloseTo(1, 12)
      }),
    )
  })

  it('is twice as fast on twice the tyre, twice the kV or twice the cells', () => {
    fc.assert(
      fc.property(gears, (values) => {
        fc.pre(values.tyreDiameter <= 150 && values.motorKv <= 10000 && values.cells <= 7)
        const speed = outputsOf(values).speed ?? NaN
        for (const key of ['tyreDiameter', 'motorKv', 'cells'] as const) {
          expect((outputsOf({ ...values, [key]: values[key] * 2 }).speed ?? NaN) / speed).toBeCloseTo(2, 12)
        }
      }),
    )
  })

  it('marks the reader’s own cell, which holds the reader’s own final drive', () => {
    fc.assert(
      fc.property(gears, (values) => {
        const table = tableOf(values)
        const own = table.rows.find((row) => row.own)
        expect(own?.cells[table.ownColumn ?? -1]).toBe(outputsOf(values).finalDriveRatio)
        expect(table.rows.filter((row) => row.own)).toHaveLength(1)
        expect(table.columns[table.ownColumn ?? -1]).toBe(String(values.pinionTeeth))
      }),
    )
  })

  it('shows the neighbours that exist, shorter to the left and to the bottom', () => {
    const table = tableOf({})
    expect(table.columns).toEqual(['13', '14', '15', '16', '17'])
    expect(table.rows.map(({ label }) => plainSentence(label))).toEqual(['42', '44', '46', '48', '50'])
    expect(tableOf({ pinionTeeth: 5, spurTeeth: 11 }).columns).toEqual(['5', '6', '7'])
    for (const { cells } of table.rows) expect([...cells].sort((a, b) => b - a)).toEqual(cells)
  })

  it('refuses what is no gear', () => {
    expect(refused({ pinionTeeth: 14.5 })).toEqual([['pinionTeeth', 'Pinion must be a whole number.']])
    expect(refused({ pinionTeeth: 0 })).toEqual([
      ['pinionTeeth', 'Pinion must be between 5 and 80: no gear of a model car has fewer or more.'],
    ])
    expect(
      refused({ spurTeeth: -46, ringTeeth: '43', motorKv: Infinity, cells: null }).map(([field]) => field),
    ).toEqual(['spurTeeth', 'ringTeeth', 'motorKv', 'cells'])
  })

  it.each([
    [{ spurTeeth: 16 }, []],
    [{ spurTeeth: 15 }, ['pinionTeeth']],
    [{ tyreDiameter: 300 }, ['tyreDiameter']],
    [{ ringTeeth: 1, diffPinionTeeth: 1, motorKv: 500 }, []],
    [{ ringTeeth: 11, diffPinionTeeth: 12, motorKv: 500 }, ['diffPinionTeeth']],
    [{ motorKv: 4055, pinionTeeth: 8 }, ['motorKv']],
    [{ motorKv: 4050, pinionTeeth: 8 }, []],
  ])('%j warns at %j', (values, fields) => {
    const found = answered({ tyreDiameter: 50, ...values }).warnings.map(({ field }) => field)
    expect(found).toEqual(fields)
  })

  it('says final drive and distance first', () => {
    const { inputs, outputs } = answered({})
    const { says } = calculator.answer(inputs as never, outputs as never)
    expect(plainSentence(says)).toBe(
      'Your final drive is 11.99 to 1: each turn of the motor moves the car 30.1\u00A0mm.',
    )
    expect(plainSentence(says, { length: 'in' })).toContain('1.19\u00A0in')
  })

  it('says what one tooth does, up and at the end of the pinions down', () => {
    expect(saysWith({})).toMatch(/^One tooth more on the pinion makes the car 6\.7\u00A0% longer-legged/)
    expect(saysWith({ pinionTeeth: 80, spurTeeth: 100 })).toMatch(
      /^One tooth fewer on the pinion makes the car 1\.2\u00A0% shorter-legged/,
    )
  })

  it('warns of heat and of spinning wheels', () => {
    expect(calculator.cautions.map(({ kind }) => kind)).toEqual(['heat', 'spinning'])
  })
})
