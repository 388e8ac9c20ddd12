import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { plainSentence } from '../sentence.ts'
import { runDefinition } from '../run-definition.ts'
import { blendLogLinear, blendRefutas } from './blend.ts'
import { calculator } from './index.ts'

const run = (values: Record<string, unknown>) => runDefinition(calculator, values)
const answered = (values: Record<string, unknown>) => {
  const result = run(values)
  if (!result.ok) throw new Error(result.errors.map(({ message }) => plainSentence(message)).join(' '))
  return result
}
const refused = (values: Record<string, unknown>) => {
  const result = run(values)
  return result.ok
    ? []
    : result.errors.map(({ field, message }) => ({ field, message: plainSentence(message) }))
}

/** Two different fluids, a share of the second, and what they blend to by the log-linear rule. */
const blend = fc
  .tuple(
    fc.double({ min: 1, max: 1e5, noNaN: true }),
    fc.double({ min: 1.01, max: 50, noNaN: true }),
    fc.double({ min: 0, max: 1, noNaN: true }),
  )
  .map(([low, times, share]) => {
    const high = low * times
    const target = blendLogLinear([
      { share: 1 - share, viscosity: low },
      { share, viscosity: high },
    ])
    return { low, high, share, target: Math.min(high, Math.max(low, target)) }
  })

describe('fluid-blend', () => {
  it('mixes the default fluids', () => {
    const { outputs, warnings } = answered({})
    expect(outputs.highFraction).toBeCloseTo(0.48542683, 8)
    expect(outputs.highVolume).toBeCloseTo(4.8542683, 7)
    expect(outputs.lowVolume).toBeCloseTo(5.1457317, 7)
    expect(outputs.highFractionVbn).toBeCloseTo(0.49519226, 8)
    expect(warnings).toEqual([])
  })

  it('needs none of the other fluid when the target is one of the two', () => {
    expect(answered({ targetViscosity: 5000 }).outputs).toMatchObject({
      highFraction: 0,
      highVolume: 0,
      lowVolume: 10,
      highFractionVbn: 0,
    })
    expect(answered({ targetViscosity: 10000 }).outputs).toMatchObject({
      highFraction: 1,
      highVolume: 10,
      lowVolume: 0,
      highFractionVbn: 1,
    })
  })

  it('finds the share that a blend was made with', () => {
    fc.assert(
      fc.property(blend, ({ low, high, share, target }) => {
        const { outputs } = answered({ lowViscosity: low, highViscosity: high, targetViscosity: target })
        expect(outputs.highFraction).toBeCloseTo(share, 6)
      }),
    )
  })

  it('is the same mix when the two bottles change places', () => {
    fc.assert(
      fc.property(blend, ({ low, high, target }) => {
        const one = answered({ lowViscosity: low, highViscosity: high, targetViscosity: target }).outputs
        const other = answered({ lowViscosity: high, highViscosity: low, targetViscosity: target }).outputs
        expect(other.highFraction).toBeCloseTo(1 - (one.highFraction ?? NaN), 9)
        expect(other.highFractionVbn).toBeCloseTo(1 - (one.highFractionVbn ?? NaN), 9)
      }),
    )
  })

  it('needs more of the thicker fluid for a thicker mix', () => {
    fc.assert(
      fc.property(blend, blend, ({ low, high, target }, { share }) => {
        const thicker = Math.min(high, target + (high - target) * share)
        fc.pre(thicker > target * (1 + 1e-9))
        const less = answered({ lowViscosity: low, highViscosity: high, targetViscosity: target }).outputs
        const more = answered({ lowViscosity: low, highViscosity: high, targetViscosity: thicker }).outputs
        expect(more.highFraction).toBeGreaterThan(less.highFraction ?? NaN)
        expect(more.highFractionVbn).toBeGreaterThan(less.highFractionVbn ?? NaN)
      }),
    )
  })

  it('always measures out the amount that was asked for', () => {
    fc.assert(
      fc.property(blend, fc.double({ min: 0.1, max: 1000, noNaN: true }), ({ low, high, target }, total) => {
        const { outputs } = answered({
          lowViscosity: low,
          highViscosity: high,
          targetViscosity: target,
          totalVolume: total,
        })
        expect((outputs.highVolume ?? NaN) + (outputs.lowVolume ?? NaN)).toBeCloseTo(total, 9)
        expect(outputs.highVolume).toBeGreaterThanOrEqual(0)
        expect(outputs.lowVolume).toBeGreaterThanOrEqual(-1e-9)
      }),
    )
  })

  it('gives the second rule the blend that rule itself predicts', () => {
    fc.assert(
      fc.property(blend, ({ low, high, share }) => {
        const target = Math.min(
          high,
          Math.max(
            low,
            blendRefutas([
              { share: 1 - share, viscosity: low },
              { share, viscosity: high },
            ]),
          ),
        )
        expect(
          answered({ lowViscosity: low, highViscosity: high, targetViscosity: target }).outputs
            .highFractionVbn,
        ).toBeCloseTo(share, 5)
      }),
    )
  })

  it('refuses a target outside the two fluids instead of an extrapolated share', () => {
    expect(refused({ targetViscosity: 12000 })).toEqual([
      {
        field: 'targetViscosity',
        message:
          '12,000\u00A0cSt cannot be reached: a mix always lies between its two fluids, here 5,000\u00A0cSt and 10,000\u00A0cSt.',
      },
    ])
    expect(refused({ targetViscosity: 4999 })).toHaveLength(1)
  })

  it('has an answer for two equal fluids only when they are the target', () => {
    const same = answered({ lowViscosity: 7000, highViscosity: 7000, targetViscosity: 7000 })
    expect(same.outputs).toMatchObject({
      highFraction: 0.5,
      highVolume: 5,
      lowVolume: 5,
      highFractionVbn: 0.5,
    })
    expect(same.warnings.map(({ field }) => field)).toEqual(['highViscosity'])
    expect(refused({ lowViscosity: 7000, highViscosity: 7000, targetViscosity: 7001 })[0]?.message).toContain(
      'both fluids are 7,000\u00A0cSt',
    )
  })

  it('warns when one fluid is more than ten times as thick', () => {
    expect(answered({ lowViscosity: 100, highViscosity: 1000, targetViscosity: 500 }).warnings).toEqual([])
    expect(answered({ lowViscosity: 100, highViscosity: 1001, targetViscosity: 500 }).warnings).toHaveLength(
      1,
    )
  })

  it('refuses fluids thinner than the blending numbers reach', () => {
    expect(refused({ lowViscosity: 0.4 })[0]).toMatchObject({ field: 'lowViscosity' })
    expect(
      answered({ lowViscosity: 0.5, highViscosity: 0.6, targetViscosity: 0.55 }).outputs.highFractionVbn,
    ).toBeGreaterThan(0)
  })

  it('says the answer first, with the main figure marked', () => {
    const { inputs, outputs } = answered({})
    const { says } = calculator.answer(inputs as never, outputs as never)
    expect(plainSentence(says)).toBe(
      'For 7,000\u00A0cSt, mix 4.85\u00A0mL of the 10,000\u00A0cSt with 5.15\u00A0mL of the 5,000\u00A0cSt.',
    )
    expect(says.filter((part) => typeof part !== 'string' && part.main)).toHaveLength(1)
  })
})
