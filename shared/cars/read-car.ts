export { carText, readCarTexts }
export type { CarTexts, ReadCar }

import { say, type Sentence } from '#shared/calculators/sentence.ts'
import { formatNumber } from '#shared/units/format-number.ts'
import { parseQuantity } from '#shared/units/parse-number.ts'
import { unitFor, type UnitChoices } from '#shared/units/unit-choices.ts'
import { convert, unitById } from '#shared/units/units.ts'
import { carValues, type CarValue, type CarValues, type EnteredCarKey } from './car-values.ts'
import { checkCarValue } from './check-value.ts'
import type { CarProblem } from './check-car.ts'

/** What stands in the fields, by key; an empty field is a value that was not measured. */
type CarTexts = Partial<Record<EnteredCarKey, string>>

interface ReadCar {
  /** What could be read and can be, in the units of `carValues`. */
  values: CarValues
  problems: CarProblem[]
}

/** Reads the fields as people type them (`2,4`, `2.4`, `3/32 in`), in the units that stand beside them. */
function readCarTexts(texts: Readonly<Record<string, string | undefined>>, choices: UnitChoices): ReadCar {
  const read: ReadCar = { values: {}, problems: [] }
  for (const entry of carValues) {
    const text = Object.hasOwn(texts, entry.key) ? texts[entry.key] : undefined
    if (text === undefined || text.trim() === '') continue
    const typed = readOne(entry, text, choices)
    if ('value' in typed) read.values[entry.key] = typed.value
    else read.problems.push({ key: entry.key, message: typed.message })
  }
  return read
}

function readOne(entry: CarValue, text: string, choices: UnitChoices): { value: number } | { message: Sentence } {
  const shown = unitFor(entry.unit, choices)
  const parsed = parseQuantity(text, entry.unit, shown)
  if (!parsed.ok) {
    return parsed.reason === 'other_unit'
      ? { message: say`${entry.label} is measured in ${unitById(shown).symbol}; give it in that unit.` }
      : { message: say`Type ${entry.label.charAt(0).toLowerCase() + entry.label.slice(1)} as a number.` }
  }
  const message = checkCarValue(entry, parsed.value)
  return message === undefined ? { value: parsed.value } : { message }
}

/** A value as it stands in its field. */
function carText(entry: CarValue, value: number | undefined, choices: UnitChoices): string {
  return value === undefined ? '' : formatNumber(convert(value, entry.unit, unitFor(entry.unit, choices)), 7)
}
