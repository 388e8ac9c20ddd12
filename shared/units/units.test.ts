import fc from 'fast-check'
import { unit as mathUnit } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { convert, displayUnits, joinUnit, quantityOf, unitById, units, type UnitId } from './units.ts'
import { formatChosen, unitChoicesFrom, unitFor, unitGroupsOf } from './unit-choices.ts'

const anyUnit = fc.constantFrom(...units.map((unit) => unit.id))
const reading = fc.double({ min: -1e6, max: 1e6, noNaN: true })

describe('units', () => {
  it('come back to the reading they started from', () => {
    fc.assert(
      fc.property(anyUnit, reading, (id, value) => {
        for (const other of displayUnits(quantityOf(id))) {
          const back = convert(convert(value, id, other.id), other.id, id)
          expect(Math.abs(back - value)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(value)))
        }
      }),
    )
  })

  it('have one base unit for each quantity', () => {
    for (const { quantity } of units) {
      expect(displayUnits(quantity).filter((unit) => unit.scale === 1 && unit.zero === 0)).toHaveLength(1)
    }
  })

  // The factors against the units of the general-purpose library mathjs.
  it.each<[UnitId, UnitId, string, string]>([
    ['in', 'mm', 'inch', 'mm'],
    ['mph', 'km/h', 'mi/h', 'km/h'],
    ['°F', '°C', 'degF', 'degC'],
    ['oz', 'g', 'oz', 'g'],
    ['lb', 'kg', 'lbm', 'kg'],
    ['lbf', 'N', 'lbf', 'N'],
    ['lbf/in', 'N/mm', 'lbf/in', 'N/mm'],
  ])('%s to %s agrees with mathjs', (from, to, theirs, theirTarget) => {
    const expected = mathUnit(131, theirs).toNumber(theirTarget)
    expect(convert(131, from, to)).toBeCloseTo(expected, 9)
  })

  it('takes a gram-force as standard gravity on one gram', () => {
    expect(convert(1000, 'gf/mm', 'N/mm')).toBeCloseTo(9.80665, 12)
  })

  it('refuses to convert between different things', () => {
    expect(() => convert(1, 'mm', 'cSt')).toThrow(RangeError)
    expect(() => unitById('furlong')).toThrow('There is no unit “furlong”.')
  })

  it('prints a no-break space before a unit, but none before a degree sign', () => {
    expect(joinUnit('4,030', 'cSt')).toBe('4,030\u00A0cSt')
    expect(joinUnit('2', 'deg')).toBe('2°')
    expect(joinUnit('0.75', '1')).toBe('0.75')
  })
})

describe('unit choices', () => {
  it('show a value in the unit that was chosen for its quantity', () => {
    expect(formatChosen(40, '°C', 3, { temperature: '°F' })).toBe('104\u00A0°F')
    expect(formatChosen(40, '°C', 3, { length: 'in' })).toBe('40\u00A0°C')
    expect(unitFor('mm', {})).toBe('mm')
  })

  it('take along what goes with them', () => {
    expect(unitFor('mm/s', { length: 'in' })).toBe('in/s')
    expect(unitFor('kg', { weight: 'oz' })).toBe('lb')
    expect(unitFor('N', { stiffness: 'gf/mm' })).toBe('N')
  })

  it('are offered only where they make a difference', () => {
    expect(unitGroupsOf(['cSt', 'mL', '1'])).toEqual([])
    expect(unitGroupsOf(['cSt', 'kg', '°C'])).toEqual([
      {
        key: 'temperature',
        label: 'Temperatures in',
        options: [
          { id: '°C', symbols: '°C' },
          { id: '°F', symbols: '°F' },
        ],
      },
      {
        key: 'weight',
        label: 'Weights in',
        options: [
          { id: 'g', symbols: 'kg' },
          { id: 'oz', symbols: 'lb' },
        ],
      },
    ])
  })

  it('drop what is not a unit of that quantity', () => {
    expect(unitChoicesFrom({ temperature: '°F', length: '°F', viscosity: 7, toString: 'mm' })).toEqual({
      temperature: '°F',
    })
  })
})
