export { parseNumber, parseQuantity }
export type { ParsedQuantity }

import { convert, displayUnits, quantityOf, unitById, units, type UnitId } from './units.ts'

type ParsedQuantity =
  { ok: true; value: number } | { ok: false; reason: 'empty' | 'not_a_number' | 'other_unit'; text: string }

const amount = /^([+-]?)\s*(\d[\d.,/ ]*(?:e[+-]?\d+)?|[.,]\d+(?:e[+-]?\d+)?)\s*(.*)$/i
const grouped = /^[1-9]\d{0,2}(?:(.)\d{3})(?:\1\d{3})*$/

/**
 * Reads what people type into a number field. The rules, in this order:
 *
 * 1. `3/32`, `1 1/2` (whole number, space, fraction) are fractions.
 * 2. A space between groups of three digits is a thousands mark: `12 500`.
 * 3. With both a comma and a point, the last one is the decimal mark and the other must group thousands:
 *    `1,234.5`, `1.234,5`.
 * 4. One mark several times groups thousands: `1,234,567`, `1.234.567`.
 * 5. A single comma followed by exactly three digits, after one to three digits that do not begin with 0,
 *    groups thousands: `7,000` is seven thousand. Any other single comma is a decimal mark: `2,4`, `0,125`,
 *    `12,50`.
 * 6. A single point is always a decimal mark: `2.4`, and `7.000` is seven.
 *
 * A minus may be `-` or U+2212; `1e3` is read too. Returns undefined for anything else, never NaN or an
 * infinity.
 */
function parseNumber(text: string): number | undefined {
  const match = amount.exec(tidy(text))
  if (match === null || match[3] !== '') return undefined
  return signed(match[1], unsigned((match[2] ?? '').trim()))
}

/**
 * Reads a number with or without a unit, and returns it in `want`. Without a unit it is taken to be in
 * `assumed`. `parseQuantity('3/32 in', 'mm', 'mm')` is 2.38125. A unit of something else is refused as
 * `other_unit`.
 */
function parseQuantity(text: string, want: UnitId, assumed: UnitId): ParsedQuantity {
  const clean = tidy(text)
  if (clean === '') return { ok: false, reason: 'empty', text }
  const match = amount.exec(clean)
  const value = match === null ? undefined : signed(match[1], unsigned((match[2] ?? '').trim()))
  if (match === null || value === undefined) return { ok: false, reason: 'not_a_number', text }
  const typed = (match[3] ?? '').trim()
  const unit = typed === '' ? assumed : unitNamed(typed, want)
  if (unit === undefined) return { ok: false, reason: isUnit(typed) ? 'other_unit' : 'not_a_number', text }
  const converted = convert(value, unit, want)
  return Number.isFinite(converted)
    ? { ok: true, value: converted }
    : { ok: false, reason: 'not_a_number', text }
}

function tidy(text: string): string {
  return text
    .replace(/[\s\u00A0\u2009\u202F]+/g, ' ')
    .replaceAll('−', '-')
    .trim()
}

function signed(sign: string | undefined, size: number | undefined): number | undefined {
  if (size === undefined || !Number.isFinite(size)) return undefined
  return sign === '-' && size !== 0 ? -size : size
}

function unsigned(body: string): number | undefined {
  const fraction = /^(?:(\d+) )?(\d+) ?\/ ?(\d+)$/.exec(body)
  if (fraction !== null) {
    const [, whole = '0', over = '0', under = '0'] = fraction
    return Number(under) === 0 ? undefined : Number(whole) + Number(over) / Number(under)
  }
  const [digits = '', power = ''] = body.toLowerCase().split('e')
  const plain = decimal(digits)
  return plain === undefined ? undefined : Number(power === '' ? plain : `${plain}e${power}`)
}

/**
 * The same number in the one spelling that `Number` reads, or undefined where the marks do not fit the rules
 * above.
 */
function decimal(digits: string): string | undefined {
  if (digits.includes(' ')) {
    const [whole = '', ...rest] = digits.split(/[.,]/)
    if (!grouped.test(whole) || rest.length > 1) return undefined
    return decimalPoint(whole.replaceAll(' ', ''), rest[0])
  }
  const marks = digits.replace(/\d/g, '')
  if (/[^.,]/.test(marks)) return undefined
  if (marks === '') return digits
  const last = marks.at(-1) ?? ''
  if (new Set(marks).size === 2) {
    const at = digits.lastIndexOf(last)
    const whole = digits.slice(0, at)
    if (whole.includes(last) || !grouped.test(whole)) return undefined
    return decimalPoint(whole.replace(/[.,]/g, ''), digits.slice(at + 1))
  }
  if (marks.length > 1) return grouped.test(digits) ? digits.replaceAll(last, '') : undefined
  if (last === ',' && grouped.test(digits)) return digits.replace(',', '')
  const [whole = '', fraction] = digits.split(last)
  return decimalPoint(whole, fraction)
}

function decimalPoint(whole: string, fraction: string | undefined): string | undefined {
  if (whole === '' && (fraction ?? '') === '') return undefined
  return `${whole === '' ? '0' : whole}.${fraction ?? ''}`
}

function unitNamed(typed: string, want: UnitId): UnitId | undefined {
  const name = typed.toLowerCase()
  const own = [unitById(want), ...displayUnits(quantityOf(want))]
  return own.find((unit) => spellings(unit.id).includes(name))?.id
}

function isUnit(typed: string): boolean {
  return units.some((unit) => spellings(unit.id).includes(typed.toLowerCase()))
}

function spellings(id: UnitId): string[] {
  const unit = unitById(id)
  return [unit.id.toLowerCase(), unit.symbol.toLowerCase(), ...unit.names].filter((name) => name !== '')
}
