import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readChange, reportAddress } from './report-address.ts'

describe('readChange', () => {
  it('reads an adjustable and its direction', () => {
    expect(readChange('front_sway_bar.down')).toEqual({ adjustable: 'front_sway_bar', direction: 'down' })
  })
  it.each(['', 'front_sway_bar', 'front_sway_bar.sideways', 'front_sway_bar.down.up', 'Front.up', '.up', 'a b.up'])('knows no “%s”', (text) => {
    expect(readChange(text)).toBeUndefined()
  })
})

describe('reportAddress', () => {
  it('gives back whatever was put in', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', minLength: 1 }), fc.string({ unit: 'grapheme', minLength: 1 }), (change, back) => {
        const { pathname, searchParams } = new URL(reportAddress({ change, back }), 'http://club.invalid')
        expect([pathname, searchParams.get('change'), searchParams.get('back')]).toEqual(['/report', change, back])
      }),
    )
  })
  it('leaves out what nobody said', () => {
    expect(reportAddress({ change: 'caster.up', class: '', surface: undefined })).toBe('/report?change=caster.up')
  })
})
