import { describe, expect, it } from 'vitest'
import { carValueByKey } from '#shared/cars/car-values.ts'
import { enteredFor } from '#shared/cars/derived-values.ts'
import type { CarKey } from '#shared/cars/car-values.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import { endsOf } from '#shared/calculators/ends.ts'
import { carKeyOf, endOf, fromCar } from './car-inputs.ts'

const definitions = Object.values(
  import.meta.glob<CalculatorDefinition>('../../shared/calculators/*/index.ts', { import: 'calculator', eager: true }),
)
const derivedUnits: Partial<Record<CarKey, string>> = {
  tyreRadius: 'mm', frontContactY: 'mm', rearContactY: 'mm', frontWheelRate: 'N/mm', rearWheelRate: 'N/mm',
}
const asked = definitions.flatMap(({ slug, inputs }) =>
  inputs.flatMap((input) => {
    const { carKey = {} } = input
    return (typeof carKey === 'string' ? [carKey] : Object.values(carKey)).map((key) => ({ what: `${slug}.${input.key} from ${key}`, input, key }))
  }),
)

describe('what calculators ask a car for', () => {
  it.each(asked.map(({ what, ...rest }) => [what, rest] as const))('%s is the same quantity in the same unit', (_what, { input, key }) => {
    expect(enteredFor(key).every((part) => carValueByKey(part) !== undefined)).toBe(true)
    expect(derivedUnits[key] ?? carValueByKey(key)?.unit).toBe(input.unit)
  })

  it('is something, for most calculators', () => {
    expect(new Set(asked.map(({ what }) => what.split('.')[0])).size).toBeGreaterThan(definitions.length / 2)
  })
})

describe('what a car says about an input', () => {
  const input = { carKey: 'mass', min: 0.5, max: 12 } as const
  const scales = (each: number) => ({ cornerFrontLeft: each, cornerFrontRight: each, cornerRearLeft: each, cornerRearRight: each })
  const says = (values: object) => fromCar(input, { car: { id: 'c', name: 'Kestrel', values } })

  it('is passed over where it only follows from others and cannot be; what was entered is the reader’s own', () => {
    expect(says(scales(900))).toBe(3.6)
    expect(says(scales(5000))).toBeUndefined()
    expect(says({ mass: 20 })).toBe(20)
  })
})

describe('which end of the car an instrument is about', () => {
  const definition = { inputs: [{ carKey: 'mass' }, { carKey: { front: 'frontToe', rear: 'rearToe' } }] } as unknown as CalculatorDefinition

  it('is the address’s, else the guide’s, else the first that is named; never one it cannot be about', () => {
    expect(endsOf(definition)).toEqual(['front', 'rear'])
    expect(endOf(definition, {})).toBe('front')
    expect(endOf(definition, { end: 'rear' })).toBe('rear')
    expect(endOf(definition, { end: 'rear', values: { end: 'front' } })).toBe('front')
    expect(endOf(definition, { end: 'centre', values: { end: 'top' } })).toBe('front')
  })

  it('chooses the key', () => {
    expect(carKeyOf({ carKey: 'mass' }, undefined)).toBe('mass')
    expect(carKeyOf({ carKey: { rear: 'rearToe' } }, 'front')).toBeUndefined()
    expect(carKeyOf({}, 'front')).toBeUndefined()
  })
})
