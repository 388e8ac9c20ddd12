import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { complaints } from '#shared/vocabulary/complaints.ts'
import { BITES, CAR_CLASSES, SURFACES } from '#shared/vocabulary/conditions.ts'
import { feelAddress, readFeelQuery, type FeelQuery } from './feel-query.ts'

const said = (raw: Parameters<typeof readFeelQuery>[0]) => readFeelQuery(raw).problems.map(({ message }) => message).join(' ')

describe('readFeelQuery', () => {
  it('reads back every address that is made for a question', () => {
    const query = fc.record(
      {
        complaints: fc
          .uniqueArray(fc.constantFrom(...complaints), { maxLength: 3, selector: ({ phase, quality }) => `${phase} ${quality}` })
          .map((all) => all.map(({ phase, quality, wants }) => ({ phase, quality, wants }))),
        carClass: fc.constantFrom(...CAR_CLASSES),
        surface: fc.constantFrom(...SURFACES),
        bite: fc.constantFrom(...BITES),
        minutes: fc.integer({ min: 0, max: 600 }),
      },
      { requiredKeys: ['complaints'] },
    )
    fc.assert(
      fc.property(query, (asked) => {
        const parameters = new URL(feelAddress('/feel', asked as FeelQuery), 'http://localhost').searchParams
        const raw = Object.fromEntries([...new Set(parameters.keys())].map((name) => [name, parameters.getAll(name)]))
        expect(readFeelQuery(raw)).toEqual({ query: asked, problems: [] })
      }),
    )
  })

  it('keeps three of four complaints, and says so', () => {
    const four = complaints.slice(0, 4).map(({ phase, quality, wants }) => `${phase}.${quality}.${wants}`)
    const different = four.filter((text) => text !== 'entry.steering.less').concat('bumps.drive.more')
    expect(readFeelQuery({ complaint: different }).query.complaints).toHaveLength(3)
    expect(said({ complaint: different })).toContain('At most 3 complaints at once')
  })

  it('keeps the first of two complaints that want opposite things', () => {
    const both = ['entry.steering.more', 'entry.steering.less']
    expect(readFeelQuery({ complaint: both }).query.complaints).toEqual([{ phase: 'entry', quality: 'steering', wants: 'more' }])
    expect(said({ complaint: both })).toContain('“Pushes” and “Darts in” at corner entry want the opposite of each other')
  })

  it.each([
    [{ complaint: 'entry.steering' }, '“entry.steering” is not a complaint that we know'],
    [{ complaint: 'entry.steering.more.x' }, 'is not a complaint that we know'],
    [{ surface: 'moon' }, '“moon” is not a surface that we know.'],
    [{ minutes: '-5' }, 'a whole number from 0 to 600'],
    [{ minutes: '20.5' }, 'a whole number from 0 to 600'],
    [{ minutes: '601' }, 'a whole number from 0 to 600'],
    [{ mood: 'bad' }, '“mood” is not asked here'],
  ])('says what is wrong with %j', (raw, words) => {
    expect(said(raw)).toContain(words)
  })

  it('takes nothing for an answer', () => {
    expect(readFeelQuery({ complaint: '', class: '', minutes: '' })).toEqual({ query: { complaints: [] }, problems: [] })
  })

  it('never throws, whatever it is given', () => {
    fc.assert(
      fc.property(fc.dictionary(fc.string(), fc.oneof(fc.string(), fc.array(fc.string()))), (raw) => {
        expect(readFeelQuery(raw).query.complaints.length).toBeLessThanOrEqual(3)
      }),
    )
  })
})
