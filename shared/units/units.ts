export { convert, displayUnits, fromBase, joinUnit, quantityOf, toBase, unitById, units }
export type { Quantity, UnitDefinition, UnitId }

/**
 * Every unit the product shows. The id is the unit as the API writes it (except where `written` says
 * otherwise: the gram has the id `g`, so the acceleration does not). Each quantity has one base unit (scale
 * 1), and all others are exact multiples of it: value in base = (value − zero) × scale.
 *
 * Sources of the factors: 1 in = 25.4 mm, 1 lb = 0.45359237 kg, 1 mi = 1609.344 m (international yard and
 * pound, 1959); standard gravity 9.80665 m/s² (3rd CGPM, 1901); 1 cSt = 1 mm²/s.
 */
const poundForce = 0.45359237 * 9.80665
const table = {
  '1': { quantity: 'ratio', symbol: '' },
  '%': { quantity: 'share', symbol: '%', names: ['percent', 'per cent'] },
  mm: { quantity: 'length', symbol: 'mm' },
  in: { quantity: 'length', symbol: 'in', scale: 25.4, names: ['inch', 'inches', '"', '″'] },
  'mm/rev': { quantity: 'rollout', symbol: 'mm/rev', names: ['mm'] },
  'in/rev': { quantity: 'rollout', symbol: 'in/rev', scale: 25.4, names: ['in'] },
  'mm/s': { quantity: 'shaft_speed', symbol: 'mm/s' },
  'in/s': { quantity: 'shaft_speed', symbol: 'in/s', scale: 25.4 },
  'km/h': { quantity: 'speed', symbol: 'km/h', names: ['kmh', 'kph'] },
  mph: { quantity: 'speed', symbol: 'mph', scale: 1.609344, names: ['mi/h'] },
  '°C': { quantity: 'temperature', symbol: '°C', names: ['c', 'degc', '° c'] },
  '°F': { quantity: 'temperature', symbol: '°F', scale: 5 / 9, zero: 32, names: ['f', 'degf', '° f'] },
  cSt: { quantity: 'viscosity', symbol: 'cSt', names: ['mm²/s', 'mm2/s', 'cs'] },
  mL: { quantity: 'volume', symbol: 'mL', names: ['cc', 'cm³', 'cm3'] },
  g: { quantity: 'part_mass', symbol: 'g', names: ['gram', 'grams'] },
  oz: { quantity: 'part_mass', symbol: 'oz', scale: 28.349523125, names: ['ounce', 'ounces'] },
  kg: { quantity: 'car_mass', symbol: 'kg' },
  lb: { quantity: 'car_mass', symbol: 'lb', scale: 0.45359237, names: ['lbs'] },
  N: { quantity: 'force', symbol: 'N' },
  lbf: { quantity: 'force', symbol: 'lbf', scale: poundForce },
  'N/mm': { quantity: 'stiffness', symbol: 'N/mm' },
  'lbf/in': { quantity: 'stiffness', symbol: 'lbf/in', scale: poundForce / 25.4, names: ['lb/in', 'lbs/in'] },
  'gf/mm': { quantity: 'stiffness', symbol: 'gf/mm', scale: 0.00980665, names: ['g/mm'] },
  'N·s/m': { quantity: 'damping', symbol: 'N·s/m', names: ['ns/m'] },
  'N·m/deg': { quantity: 'roll_stiffness', symbol: 'N·m/°' },
  deg: { quantity: 'angle', symbol: '°', names: ['°', 'degree', 'degrees'] },
  'deg/mm': { quantity: 'angle_rate', symbol: '°/mm' },
  'deg/in': { quantity: 'angle_rate', symbol: '°/in', scale: 1 / 25.4 },
  GPa: { quantity: 'modulus', symbol: 'GPa' },
  'kg/m³': { quantity: 'density', symbol: 'kg/m³', names: ['kg/m3'] },
  g0: { quantity: 'acceleration', symbol: 'g', written: 'g', names: ['g'] },
  Hz: { quantity: 'frequency', symbol: 'Hz' },
  rpm: { quantity: 'motor_speed', symbol: 'rpm', names: ['r/min'] },
  'rpm/V': { quantity: 'motor_constant', symbol: 'rpm/V', names: ['kv'] },
  V: { quantity: 'voltage', symbol: 'V' },
  A: { quantity: 'current', symbol: 'A' },
  mAh: { quantity: 'charge', symbol: 'mAh' },
  C: { quantity: 'charge_rate', symbol: 'C' },
  min: { quantity: 'time', symbol: 'min' },
  Wh: { quantity: 'energy', symbol: 'Wh' },
  W: { quantity: 'power', symbol: 'W' },
  mΩ: { quantity: 'resistance', symbol: 'mΩ' },
  AWG: { quantity: 'wire_gauge', symbol: 'AWG' },
} as const

type UnitId = keyof typeof table
type Quantity = (typeof table)[UnitId]['quantity']

interface UnitDefinition {
  id: UnitId
  quantity: Quantity
  /** As printed after a number. */
  symbol: string
  /** As the API writes it. */
  written: string
  /** How many base units one of this unit is. */
  scale: number
  /** Reading of this unit at which the base unit reads zero; only temperatures have one. */
  zero: number
  /** Other spellings that a reader may type, in lower case. */
  names: readonly string[]
}

type Row = {
  quantity: Quantity
  symbol: string
  written?: string
  scale?: number
  zero?: number
  names?: readonly string[]
}
const units = (Object.entries(table) as [UnitId, Row][]).map(([id, row]): UnitDefinition => ({
  id,
  quantity: row.quantity,
  symbol: row.symbol,
  written: row.written ?? id,
  scale: row.scale ?? 1,
  zero: row.zero ?? 0,
  names: row.names ?? [],
}))
const byId = new Map<string, UnitDefinition>(units.map((unit) => [unit.id, unit]))

/** The unit with this id. Throws RangeError for an id that is not in the table. */
function unitById(id: string): UnitDefinition {
  const unit = byId.get(id)
  if (unit === undefined) throw new RangeError(`There is no unit “${id}”.`)
  return unit
}

function quantityOf(id: UnitId): Quantity {
  return unitById(id).quantity
}

/** The units in which a quantity can be shown, base unit first. */
function displayUnits(quantity: Quantity): UnitDefinition[] {
  return units.filter((unit) => unit.quantity === quantity)
}

function toBase(value: number, id: UnitId): number {
  const unit = unitById(id)
  return (value - unit.zero) * unit.scale
}

function fromBase(value: number, id: UnitId): number {
  const unit = unitById(id)
  return value / unit.scale + unit.zero
}

/**
 * A reading in one unit as a reading in another of the same quantity (a temperature is a reading, not a
 * difference). The same unit gives the very same number. Throws RangeError across quantities.
 */
function convert(value: number, from: UnitId, to: UnitId): number {
  if (from === to) return value
  if (quantityOf(from) !== quantityOf(to))
    throw new RangeError(`${from} and ${to} do not measure the same thing.`)
  return fromBase(toBase(value, from), to)
}

/**
 * A formatted number with its unit: a no-break space between them, but none before a degree sign (SI
 * Brochure, 5.4.3).
 */
function joinUnit(number: string, id: UnitId): string {
  const { symbol } = unitById(id)
  if (symbol === '') return number
  return symbol === '°' ? `${number}°` : `${number}\u00A0${symbol}`
}
