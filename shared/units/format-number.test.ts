import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatNumber } from './format-number.ts'

describe('formatNumber', () => {
  it.each([
    [4030.4, 3, '4,030'],
    [12210, 3, '12,200'],
    [0.485427, 3, '0.485'],
    [-25, 3, '−25'],
    [10, 3, '10'],
    [0, 4, '0'],
    [-0, 4, '0'],
    [9999.6, 4, '10,000'],
    [1234567.89, 9, '1,234,567.89'],
    [0.000123456, 3, '0.000123'],
    [1e18, 3, '1\u00A0×\u00A010¹⁸'],
    [2.5e-9, 3, '2.5\u00A0×\u00A010⁻⁹'],
  ])('writes %d with %d digits as %j', (value, digits, expected) =>
    expect(formatNumber(value, digits)).toBe(expected),
  )

  it.each([NaN, Infinity, -Infinity])('refuses %d', (value) =>
    expect(() => formatNumber(value)).toThrow(RangeError),
  )

  it('stays within half a unit of the last digit asked for', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-6, max: 1e14, noNaN: true }),
        fc.integer({ min: 1, max: 12 }),
        (value, digits) => {
          const shown = Number(formatNumber(value, digits).replaceAll(',', ''))
          expect(Math.abs(shown - value) / value).toBeLessThanOrEqual(0.5 * 10 ** (1 - digits) * (1 + 1e-9))
        },
      ),
    )
  })
})
