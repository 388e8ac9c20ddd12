export { carSections, countFilled, startKeys, valueId }
export type { CalculatorName, CarSection, CarSectionRow }

import { carEndNames } from '#shared/cars/car-ends.ts'
import { carGroups, carValueByKey, carValues, type CarGroup, type CarValue, type EnteredCarKey } from '#shared/cars/car-values.ts'

type Entry = CarValue<EnteredCarKey>

/** One thing to measure, at as many ends of the car as have it. */
interface CarSectionRow {
  label: string
  help: string
  fields: { entry: Entry; name: string }[]
}

/** A calculator as a value of the car names it. */
interface CalculatorName {
  slug: string
  title: string
}

interface CarSection {
  id: string
  name: string
  rows: CarSectionRow[]
  keys: EnteredCarKey[]
}

/** With these the most calculators have the most to start from, and a kitchen scale and a tape get them in ten minutes. */
const startKeys = ['mass', 'wheelbase', 'tyreDiameter', 'spurTeeth', 'pinionTeeth'] as const satisfies readonly EnteredCarKey[]

/**
 * All values of a car as the page asks for them: five to begin with, then group by group, first the groups that most
 * calculators ask for.
 * @param uses how many calculators ask for a value
 */
function carSections(uses: (key: EnteredCarKey) => number): CarSection[] {
  const started = new Set<EnteredCarKey>(startKeys)
  const groups = (Object.keys(carGroups) as CarGroup[]).map((group) => {
    const entries = (carValues as readonly Entry[]).filter((entry) => entry.group === group && !started.has(entry.key))
    const asked = Math.max(0, ...entries.map(({ key }) => uses(key)))
    return { asked, section: { id: `group-${group}`, name: carGroups[group], ...rowsOf(entries) } }
  })
  const first = startKeys.map((key) => carValueByKey(key)!)
  return [
    { id: 'group-start', name: 'Five to begin with', ...rowsOf(first) },
    ...groups.toSorted((one, other) => other.asked - one.asked).map(({ section }) => section),
  ].filter(({ keys }) => keys.length > 0)
}

function rowsOf(entries: readonly Entry[]): Pick<CarSection, 'rows' | 'keys'> {
  const rows = new Map<string, CarSectionRow>()
  for (const entry of entries) {
    const label = withoutEnd(entry)
    const row = rows.get(label) ?? { label, help: entry.help, fields: [] }
    row.fields.push({ entry, name: entry.end === undefined ? '' : carEndNames[entry.end] })
    rows.set(label, row)
  }
  return { rows: [...rows.values()], keys: [...rows.values()].flatMap(({ fields }) => fields.map(({ entry }) => entry.key)) }
}

/** “Front spring rate” is asked for as “Spring rate”, front and rear. */
function withoutEnd({ label, end }: Entry): string {
  if (end === undefined) return label
  const rest = label.slice(carEndNames[end].length + 1)
  return rest.charAt(0).toUpperCase() + rest.slice(1)
}

/** How many of these values are there. */
function countFilled(keys: readonly EnteredCarKey[], values: Readonly<Partial<Record<EnteredCarKey, unknown>>>): number {
  return keys.filter((key) => values[key] !== undefined).length
}

/** The id of a value’s field on the page; calculators link to it. */
function valueId(key: string): string {
  return `value-${key}`
}
