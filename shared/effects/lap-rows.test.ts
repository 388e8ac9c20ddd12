import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { CAR_CLASSES, SURFACES } from '../vocabulary/conditions.ts'
import { PHASES } from '../vocabulary/phases.ts'
import { QUALITIES } from '../vocabulary/qualities.ts'
import { buildLapRows, type LapEffect } from './lap-rows.ts'

const fluid = { key: 'front_diff_fluid', name: 'Front diff fluid', unit: 'cSt', up: 'thicker', down: 'thinner', smallStep: 2000 }
const toe = { key: 'rear_toe', name: 'Rear toe', unit: 'deg', up: 'more toe-in', down: 'less toe-in', smallStep: 0.5 }

function effect(given: Partial<LapEffect> = {}): LapEffect {
  return {
    adjustable: 'front_diff_fluid', direction: 'up', phase: 'entry', quality: 'steering', change: 'less', strength: 2,
    surfaces: [], bites: [], carClasses: [], mirrors: true, basis: 'physics', note: '', ...given,
  }
}

const cell = (rows: ReturnType<typeof buildLapRows>, row: number, phase: (typeof PHASES)[number]) =>
  rows[row]!.cells.find((candidate) => candidate.phase === phase)!

describe('buildLapRows', () => {
  it('makes a row for each way a change can go, with its small step', () => {
    const rows = buildLapRows([effect()], [fluid])
    expect(rows.map(({ name, size, mirrored }) => ({ name, size, mirrored }))).toEqual([
      { name: 'Thicker', size: '2,000\u00A0cSt at a time', mirrored: false },
      { name: 'Thinner', size: '2,000\u00A0cSt at a time', mirrored: true },
    ])
  })

  it('names the adjustable when the table is about more than one', () => {
    const rows = buildLapRows([effect(), effect({ adjustable: 'rear_toe', mirrors: false })], [fluid, toe])
    expect(rows.map((row) => row.name)).toEqual(['Front diff fluid: thicker', 'Front diff fluid: thinner', 'Rear toe: more toe-in'])
    expect(rows[2]!.size).toBe('0.5° at a time')
  })

  it('shows the opposite of an effect that mirrors, without the note that explains it', () => {
    const rows = buildLapRows([effect({ note: 'the pair works against the turn' })], [fluid])
    expect(cell(rows, 0, 'entry').lead[0]).toMatchObject({ change: 'less', degree: 'Clearly less', name: 'steering' })
    expect(cell(rows, 0, 'entry').lead[0]!.grounds).toMatchObject([{ surface: null, place: '', note: 'the pair works against the turn' }])
    expect(cell(rows, 1, 'entry').lead[0]).toMatchObject({ change: 'more', degree: 'Clearly more', grounds: [] })
  })

  it('lets an effect of the other direction itself stand against the mirrored one', () => {
    const rows = buildLapRows([effect(), effect({ direction: 'down', change: 'more', strength: 3 })], [fluid])
    expect(cell(rows, 1, 'entry').lead).toHaveLength(1)
    expect(cell(rows, 1, 'entry').lead[0]).toMatchObject({ change: 'more', strength: 3 })
    expect(rows[1]!.mirrored).toBe(false)
  })

  it('has no row for the other direction when nothing mirrors', () => {
    expect(buildLapRows([effect({ mirrors: false })], [fluid])).toHaveLength(1)
  })

  it('leads with the two strongest and lists the rest', () => {
    const rows = buildLapRows(
      [
        effect({ quality: 'stability', change: 'more', strength: 1 }),
        effect({ quality: 'drive', change: 'more', strength: 3 }),
        effect({ quality: 'steering', strength: 2 }),
      ],
      [fluid],
    )
    expect(cell(rows, 0, 'entry').lead.map((mark) => mark.quality)).toEqual(['drive', 'steering'])
    expect(cell(rows, 0, 'entry').rest.map((mark) => mark.quality)).toEqual(['stability'])
  })

  it('says where an effect is stronger than elsewhere', () => {
    const rows = buildLapRows(
      [effect({ strength: 1 }), effect({ strength: 3, surfaces: ['loose'], note: 'the inside wheel lets go sooner' })],
      [fluid],
    )
    const mark = cell(rows, 0, 'entry').lead[0]!
    expect(mark.strength).toBe(1)
    expect(mark.grounds).toEqual([
      {
        surface: 'loose',
        place: 'A lot on loose',
        note: 'the inside wheel lets go sooner',
        words: 'A lot on loose: the inside wheel lets go sooner',
      },
    ])
  })

  it('names the classes an effect is for, a long list by what it leaves out', () => {
    const places = (carClasses: LapEffect['carClasses']) =>
      cell(buildLapRows([effect({ carClasses, bites: ['low'] })], [fluid]), 0, 'entry').lead[0]!.grounds[0]!.place
    expect(places(['truggy_8'])).toBe('On low bite for 1/8 truggy')
    expect(places(CAR_CLASSES.filter((carClass) => carClass !== 'buggy_8n'))).toBe('On low bite for all but 1/8 nitro buggy')
    expect(places(CAR_CLASSES)).toBe('On low bite for every class')
  })

  it('keeps both ways apart when the ground decides, and calls it split when nothing does', () => {
    const onGround = buildLapRows([effect({ surfaces: ['loose'] }), effect({ change: 'more', surfaces: ['carpet'] })], [fluid])
    expect(cell(onGround, 0, 'entry').lead.map((mark) => mark.change).sort()).toEqual(['less', 'more'])
    const split = buildLapRows([effect(), effect({ change: 'more' })], [fluid])
    expect(cell(split, 0, 'entry').lead.map((mark) => mark.change)).toEqual(['split'])
    const withGround = buildLapRows([effect(), effect({ change: 'more' }), effect({ surfaces: ['loose'] })], [fluid])
    expect(cell(withGround, 0, 'entry').lead[0]!.grounds.map((ground) => ground.place)).toEqual(['On loose'])
  })

  it('still shows a change whose adjustable it does not know', () => {
    expect(buildLapRows([effect({ adjustable: 'unheard_of', mirrors: false })], [fluid])[0]).toMatchObject({ name: 'Up', size: '' })
  })

  it('loses no quality of any effect and always has the six parts of the lap in order', () => {
    const effects = fc.array(
      fc.record({
        adjustable: fc.constantFrom('front_diff_fluid', 'rear_toe'),
        direction: fc.constantFrom('up' as const, 'down' as const),
        phase: fc.constantFrom(...PHASES),
        quality: fc.constantFrom(...QUALITIES),
        change: fc.constantFrom('more' as const, 'less' as const),
        strength: fc.constantFrom(1 as const, 2 as const, 3 as const),
        surfaces: fc.uniqueArray(fc.constantFrom(...SURFACES), { maxLength: 2 }),
        bites: fc.constant([]),
        carClasses: fc.constant([]),
        mirrors: fc.boolean(),
        basis: fc.constantFrom('physics' as const, 'reported' as const),
        note: fc.constant(''),
      }),
      { maxLength: 30 },
    )
    fc.assert(
      fc.property(effects, (given) => {
        const rows = buildLapRows(given, [fluid, toe])
        for (const row of rows) {
          expect(row.cells.map((each) => each.phase)).toEqual([...PHASES])
          for (const each of row.cells) expect(each.lead.length).toBeLessThanOrEqual(2)
        }
        for (const one of given) {
          const row = rows.find((each) => each.adjustable === one.adjustable && each.direction === one.direction)!
          const there = row.cells.find((each) => each.phase === one.phase)!
          expect([...there.lead, ...there.rest].map((mark) => mark.quality)).toContain(one.quality)
        }
      }),
    )
  })
})
