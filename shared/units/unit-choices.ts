export { formatChosen, unitChoicesFrom, unitFor, unitGroups, unitGroupsOf }
export type { UnitChoices, UnitGroup, UnitGroupKey }

import { formatNumber } from './format-number.ts'
import { convert, joinUnit, quantityOf, unitById, type UnitId } from './units.ts'

/**
 * What a reader chooses between. One choice covers everything that goes with it: who wants inches wants
 * inches a second too. An option is named by its first unit; quantities that are in no group have one unit
 * only.
 */
const unitGroups = {
  length: {
    label: 'Lengths in',
    options: [
      ['mm', 'mm/rev', 'mm/s', 'deg/mm'],
      ['in', 'in/rev', 'in/s', 'deg/in'],
    ],
  },
  temperature: { label: 'Temperatures in', options: [['°C'], ['°F']] },
  stiffness: { label: 'Spring rates in', options: [['N/mm', 'N'], ['lbf/in', 'lbf'], ['gf/mm']] },
  speed: { label: 'Speeds in', options: [['km/h'], ['mph']] },
  weight: {
    label: 'Weights in',
    options: [
      ['g', 'kg'],
      ['oz', 'lb'],
    ],
  },
} as const satisfies Record<string, { label: string; options: readonly (readonly UnitId[])[] }>

type UnitGroupKey = keyof typeof unitGroups

/** The chosen option of each group; a group that is not in it stays in the calculator's own units. */
type UnitChoices = Partial<Record<UnitGroupKey, UnitId>>

/**
 * A group as far as one calculator needs it: its options with the symbols of the units that really appear.
 */
interface UnitGroup {
  key: UnitGroupKey
  label: string
  options: { id: UnitId; symbols: string }[]
}

const groupKeys = Object.keys(unitGroups) as UnitGroupKey[]

function optionsOf(key: UnitGroupKey): readonly (readonly UnitId[])[] {
  return unitGroups[key].options
}

/** The unit to show for something that is computed in `own`. */
function unitFor(own: UnitId, choices: UnitChoices): UnitId {
  const quantity = quantityOf(own)
  for (const key of groupKeys) {
    const chosen = optionsOf(key).find((option) => option[0] === choices[key])
    const unit = chosen?.find((id) => quantityOf(id) === quantity)
    if (unit !== undefined) return unit
  }
  return own
}

/**
 * A value computed in `own`, as the reader wants to read it: `formatChosen(40, '°C', 3, { temperature: '°F'
 * })` is “104 °F”.
 */
function formatChosen(value: number, own: UnitId, digits: number, choices: UnitChoices): string {
  const unit = unitFor(own, choices)
  return joinUnit(formatNumber(convert(value, own, unit), digits), unit)
}

/**
 * Keeps what is a known option of its group and drops everything else: what comes from a link or from storage
 * is not trusted.
 */
function unitChoicesFrom(raw: Readonly<Record<string, unknown>>): UnitChoices {
  const choices: UnitChoices = {}
  for (const key of groupKeys) {
    const option = Object.hasOwn(raw, key) ? optionsOf(key).find(([id]) => id === raw[key]) : undefined
    if (option?.[0] !== undefined) choices[key] = option[0]
  }
  return choices
}

/** The choices that make a difference to something measured in these units. */
function unitGroupsOf(used: readonly UnitId[]): UnitGroup[] {
  const quantities = new Set(used.map(quantityOf))
  return groupKeys.flatMap((key) => {
    const options = optionsOf(key).flatMap((option) => {
      const shown = option.filter((id) => quantities.has(quantityOf(id)))
      const [id] = option
      return id === undefined || shown.length === 0
        ? []
        : [{ id, symbols: shown.map((unit) => unitById(unit).symbol).join(', ') }]
    })
    return options.length < 2 ? [] : [{ key, label: unitGroups[key].label, options }]
  })
}
