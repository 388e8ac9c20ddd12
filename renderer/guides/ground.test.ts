import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { LapEffect } from '#shared/effects/lap-rows.ts'
import { BITES, SURFACES } from '#shared/vocabulary/conditions.ts'
import { groundNames, groundsNamed, isGround, onGround, type Ground } from './ground.ts'

const effect = (given: Partial<LapEffect> = {}): LapEffect => ({
  adjustable: 'rear_toe', direction: 'up', phase: 'exit', quality: 'rear_grip', change: 'more', strength: 2,
  surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '', ...given,
})

describe('the ground of an effects table', () => {
  it('offers only grounds that make a difference, in the order of the vocabulary', () => {
    expect(groundsNamed([effect({ bites: ['high'] }), effect({ surfaces: ['carpet', 'loose'] }), effect()])).toEqual([
      'loose', 'carpet', 'high_bite',
    ])
    expect(groundsNamed([effect()])).toEqual([])
  })

  it('leaves out what holds elsewhere only, and keeps what holds anywhere', () => {
    const shown = onGround([effect({ surfaces: ['loose'] }), effect({ surfaces: ['carpet'] }), effect({ strength: 1 })], 'loose')
    expect(shown.map(({ surfaces, strength }) => ({ surfaces, strength }))).toEqual([
      { surfaces: [], strength: 2 },
      { surfaces: [], strength: 1 },
    ])
  })

  it('says nothing about bite when the reader chose a surface', () => {
    expect(onGround([effect({ bites: ['low'], surfaces: ['wet'] })], 'wet')[0]).toMatchObject({ bites: ['low'], surfaces: [] })
  })

  it('knows every ground it names, and nothing else', () => {
    for (const ground of Object.keys(groundNames)) expect(isGround(ground)).toBe(true)
    for (const other of ['', 'gravel', 'high', 'constructor', undefined]) expect(isGround(other)).toBe(false)
  })

  it('keeps every effect that names the chosen ground', () => {
    const effects = fc.array(
      fc.record({ surfaces: fc.subarray([...SURFACES]), bites: fc.subarray([...BITES]) }).map(effect),
    )
    fc.assert(
      fc.property(effects, fc.constantFrom(...(Object.keys(groundNames) as Ground[])), (given, ground) => {
        const named = given.filter((each) =>
          [...each.surfaces, ...each.bites.map((bite) => `${bite}_bite`)].includes(ground))
        expect(onGround(given, ground).length).toBeGreaterThanOrEqual(named.length)
      }),
    )
  })
})
