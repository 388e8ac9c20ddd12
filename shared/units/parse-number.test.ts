import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatNumber } from './format-number.ts'
import { parseNumber, parseQuantity } from './parse-number.ts'

describe('parseNumber', () => {
  it.each([
    ['7000', 7000],
    ['7,000', 7000],
    ['7 000', 7000],
    ['7\u202F000', 7000],
    ['1,234,567', 1234567],
    ['1.234.567', 1234567],
    ['2,4', 2.4],
    ['2.4', 2.4],
    ['7.000', 7],
    ['0,125', 0.125],
    ['12,50', 12.5],
    ['1,234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['3/32', 0.09375],
    ['1 1/2', 1.5],
    ['-1 1/2', -1.5],
    ['−25', -25],
    ['+5', 5],
    ['1e3', 1000],
    ['2.5e-7', 2.5e-7],
    ['.5', 0.5],
    ['12 500,5', 12500.5],
    ['0', 0],
    ['-0', 0],
    [' 55 ', 55],
  ])('reads %j as %d', (text, expected) => expect(parseNumber(text)).toBe(expected))

  it.each([
    '',
    ' ',
    'thick',
    '1,2,3',
    '1.2.3',
    '12,34,567',
    '1 2',
    '7 0000',
    '1/0',
    '1/2/3',
    '--5',
    '5-',
    'NaN',
    'Infinity',
    '1e999',
    '.',
    ',',
    '0x10',
    '1,23.4,5',
  ])('refuses %j', (text) => expect(parseNumber(text)).toBeUndefined())

  it('reads back every number that formatNumber writes', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e12, max: 1e12, noNaN: true }), (value) => {
        fc.pre(Math.abs(value) >= 1e-5 || value === 0)
        const back = parseNumber(formatNumber(value, 15))
        expect(Math.abs((back ?? Infinity) - value)).toBeLessThanOrEqual(1e-13 * Math.abs(value))
      }),
    )
  })

  it('never answers with something that is not a finite number', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const value = parseNumber(text)
        expect(value === undefined || Number.isFinite(value)).toBe(true)
      }),
    )
  })
})

describe('parseQuantity', () => {
  it.each([
    ['3/32 in', 2.38125],
    ['3/32"', 2.38125],
    ['2.4 mm', 2.4],
    ['2,4', 2.4],
    ['0.1 Inch', 2.54],
  ])('reads the length %j in millimetres', (text, expected) => {
    const parsed = parseQuantity(text, 'mm', 'mm')
    expect(parsed.ok && parsed.value).toBeCloseTo(expected, 12)
  })

  it('takes a bare number in the unit that stands beside the field', () => {
    expect(parseQuantity('104', '°C', '°F')).toEqual({ ok: true, value: 40 })
    expect(parseQuantity('40 c', '°C', '°F')).toEqual({ ok: true, value: 40 })
  })

  it('says why it cannot read something', () => {
    expect(parseQuantity('', 'mm', 'mm')).toMatchObject({ reason: 'empty' })
    expect(parseQuantity('7000 cSt', 'mm', 'mm')).toMatchObject({ reason: 'other_unit' })
    expect(parseQuantity('a lot', 'mm', 'mm')).toMatchObject({ reason: 'not_a_number' })
  })
})
