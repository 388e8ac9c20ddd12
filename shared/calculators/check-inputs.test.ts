import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkInputs } from './check-inputs.ts'
import { calculator as blend } from './fluid-blend/index.ts'
import { plainSentence } from './sentence.ts'
import { runDefinition } from './run-definition.ts'

const problems = (values: Record<string, unknown>) => {
  const checked = checkInputs(blend, values)
  return checked.ok ? [] : checked.errors.map(({ field, message }) => `${field}: ${plainSentence(message)}`)
}

describe('checkInputs', () => {
  it('takes the listed default only for a key that is absent', () => {
    expect(checkInputs(blend, { totalVolume: 20 })).toEqual({
      ok: true,
      inputs: { lowViscosity: 5000, highViscosity: 10000, targetViscosity: 7000, totalVolume: 20 },
    })
  })

  it.each([[null], [undefined], ['7000'], [true], [NaN], [Infinity], [-Infinity], [[7000]], [{}]])(
    'refuses %j as a value',
    (value) => {
      expect(problems({ lowViscosity: value })).toEqual([
        'lowViscosity: Thinner fluid must be a number, between 0.5\u00A0cSt and 10,000,000\u00A0cSt.',
      ])
    },
  )

  it('names the field, the range and the reason', () => {
    expect(problems({ totalVolume: 0 })).toEqual([
      'totalVolume: How much you need must be between 0.1\u00A0mL and 1,000\u00A0mL: less cannot be measured at a pit table, and more is not one batch.',
    ])
  })

  it('refuses keys the calculator does not have, whatever they are called', () => {
    expect(problems({ volume: 3 })[0]).toContain('“volume” is not an input of fluid-blend')
    expect(problems(JSON.parse('{"__proto__": 3}'))).toHaveLength(1)
    expect(problems({ constructor: 3 })).toHaveLength(1)
  })

  it('reports every field at once, in the order of the fields', () => {
    expect(problems({ totalVolume: -1, lowViscosity: null }).map((line) => line.split(':')[0])).toEqual([
      'lowViscosity',
      'totalVolume',
    ])
  })

  it('lets nothing through that is not a finite number', () => {
    const anything = fc.oneof(fc.double(), fc.string(), fc.constantFrom(null, undefined, true, []))
    const values = fc.record(
      { lowViscosity: anything, highViscosity: anything, targetViscosity: anything, totalVolume: anything },
      { requiredKeys: [] },
    )
    fc.assert(
      fc.property(values, (given) => {
        const run = runDefinition(blend, given)
        const numbers = run.ok ? [...Object.values(run.inputs), ...Object.values(run.outputs)] : []
        expect(numbers.every(Number.isFinite)).toBe(true)
        expect(run.ok || run.errors.length > 0).toBe(true)
      }),
    )
  })
})
