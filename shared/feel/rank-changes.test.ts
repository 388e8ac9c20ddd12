import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fitOf } from './fit.ts'
import { rankChanges, type WeighedEffect } from './rank-changes.ts'
import type { ReportCounts } from './trust.ts'

const effect = (given: Partial<WeighedEffect>): WeighedEffect => ({
  adjustable: 'front_sway_bar',
  direction: 'down',
  phase: 'entry',
  quality: 'steering',
  change: 'more',
  basis: 'physics',
  mirrors: true,
  weight: 2,
  ...given,
})
const adjustables = [
  { key: 'ackermann', minutes: 5 },
  { key: 'front_sway_bar', minutes: 5 },
  { key: 'front_toe', minutes: 4 },
]
const pushes = [{ phase: 'entry', quality: 'steering', wants: 'more' }] as const
const none = new Map<string, ReportCounts>()
const rank = (effects: WeighedEffect[], reports = none) => rankChanges(pushes, effects, adjustables, reports)
const names = (effects: WeighedEffect[], reports = none) =>
  rank(effects, reports).map(({ adjustable, direction }) => `${adjustable} ${direction}`)

describe('rankChanges', () => {
  it('gives help less 0.35 of the cost, each strength × fit × trust', () => {
    const [best] = rank([effect({}), effect({ phase: 'straight', quality: 'stability', change: 'less', weight: 1, basis: 'reported' })])
    expect(best).toMatchObject({ adjustable: 'front_sway_bar', direction: 'down', minutes: 5 })
    expect(best!.help).toBeCloseTo(2 * 0.7, 12)
    expect(best!.cost).toBeCloseTo(1 * 0.4, 12)
    expect(best!.score).toBeCloseTo(1.4 - 0.35 * 0.4, 12)
    expect(best!.trust).toBeCloseTo(0.7, 12)
  })

  it('counts an effect the other way round for the opposite direction, unless that has one of its own', () => {
    expect(names([effect({ direction: 'up', change: 'less' })])).toEqual(['front_sway_bar down'])
    expect(names([effect({ direction: 'up', change: 'less', mirrors: false })])).toEqual([])
    expect(names([effect({ direction: 'up', change: 'less' }), effect({ change: 'less', weight: 1 })])).toEqual([])
  })

  it('takes away for effects that make the complaint worse, and drops what does more harm than good', () => {
    const both = [effect({}), effect({ change: 'less', weight: 1, basis: 'reported' })]
    expect(rank(both)[0]!.help).toBeCloseTo(2 * 0.7 - 1 * 0.4, 12)
    expect(names([effect({ weight: 1 }), effect({ change: 'less', weight: 3 })])).toEqual(['front_sway_bar up'])
  })

  it('lets nothing cost that a driver wants either way, and nothing that moves the wanted way', () => {
    const free = [
      effect({ phase: 'middle', quality: 'roll', change: 'more' }),
      effect({ phase: 'jumps', quality: 'nose_up', change: 'less' }),
      effect({ phase: 'middle', quality: 'rear_grip', change: 'more' }),
      effect({ phase: 'straight', quality: 'motor_heat', change: 'less' }),
    ]
    expect(rank([effect({}), ...free])[0]!.cost).toBe(0)
    expect(rank([effect({}), effect({ phase: 'straight', quality: 'motor_heat', change: 'more' })])[0]!.cost).toBeGreaterThan(0)
  })

  it('puts equal scores in order of minutes, then of the key', () => {
    const tied = ['front_sway_bar', 'front_toe', 'ackermann'].map((adjustable) => effect({ adjustable }))
    expect(names(tied)).toEqual(['front_toe down', 'ackermann down', 'front_sway_bar down'])
  })

  it('never recommends what everybody who tried it found worse', () => {
    const reports = new Map([['front_sway_bar down', { helped: 0, same: 0, worse: 1 }]])
    expect(names([effect({})], reports)).toEqual([])
    reports.set('front_sway_bar down', { helped: 0, same: 1, worse: 9 })
    expect(names([effect({})], reports)).toEqual(['front_sway_bar down'])
  })

  it('says each term, and the terms add up', () => {
    const anyEffect = fc.record({
      adjustable: fc.constantFrom('ackermann', 'front_sway_bar', 'front_toe', 'gone'),
      direction: fc.constantFrom('up' as const, 'down' as const),
      phase: fc.constantFrom('entry' as const, 'exit' as const),
      quality: fc.constantFrom('steering' as const, 'stability' as const, 'roll' as const),
      change: fc.constantFrom('more' as const, 'less' as const),
      basis: fc.constantFrom('physics' as const, 'common_practice' as const, 'reported' as const),
      mirrors: fc.boolean(),
      weight: fc.double({ min: 0.1, max: 3, noNaN: true }),
    })
    fc.assert(
      fc.property(fc.array(anyEffect, { maxLength: 30 }), (effects) => {
        const ranked = rank(effects)
        for (const change of ranked) {
          const sum = (kind: string) => change.terms.filter((term) => term.kind === kind).reduce((total, { value }) => total + value, 0)
          expect(change.help).toBeCloseTo(sum('help'), 9)
          expect(change.score).toBeCloseTo(sum('help') - 0.35 * sum('cost'), 9)
          expect(change.help).toBeGreaterThan(0)
        }
        expect(ranked.map(({ score }) => score)).toEqual(ranked.map(({ score }) => score).toSorted((a, b) => b - a))
        expect(names(effects)).toEqual(names(effects.toReversed()))
      }),
    )
  })
})

describe('fitOf', () => {
  const turf = { surfaces: ['artificial_turf'], bites: ['high'], carClasses: [] } as const
  it.each([
    [{}, 1],
    [{ surface: 'artificial_turf' }, 1],
    [{ surface: 'loose' }, 0],
    [{ surface: 'artificial_turf', bite: 'low' }, 0],
    [{ surface: 'artificial_turf', bite: 'high', carClass: 'truggy_8' }, 0.8],
  ] as const)('for %j is %d', (conditions, expected) => expect(fitOf(turf, conditions)).toBeCloseTo(expected, 12))
  it('is 0.8 for each thing that a general effect is silent about', () => {
    const general = { surfaces: [], bites: [], carClasses: [] }
    expect(fitOf(general, { surface: 'loose', bite: 'low', carClass: 'truggy_8' })).toBeCloseTo(0.512, 12)
  })
})
