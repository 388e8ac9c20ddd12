export { draftOf, draftTexts, followCar, keepable, readDraft, typeInto }
export type { CarDraft, DraftReading }

import { carValueByKey, type CarValues, type EnteredCarKey } from '#shared/cars/car-values.ts'
import { checkCar, type CarProblem } from '#shared/cars/check-car.ts'
import { carText, readCarTexts } from '#shared/cars/read-car.ts'
import type { Car } from '#shared/cars/car.ts'
import type { UnitChoices } from '#shared/units/unit-choices.ts'

/** A car as it is being filled in: what stands in the fields, and exactly what it means. */
interface CarDraft extends Omit<Car, 'values'> {
  texts: Partial<Record<EnteredCarKey, string>>
  /** What could be read, in the units of `carValues`; a change of units rewrites the texts from these and loses nothing. */
  values: CarValues
  problems: CarProblem[]
}

interface DraftReading {
  /** What is wrong, alone or together, in the order of the fields. */
  problems: CarProblem[]
  /** What can be kept; null while not even the rest fits together. */
  car: Car | null
}

function draftOf(car: Car, units: UnitChoices): CarDraft {
  return { ...car, values: { ...car.values }, texts: draftTexts(car.values, units), problems: [] }
}

function draftTexts(values: CarValues, units: UnitChoices): CarDraft['texts'] {
  return Object.fromEntries(
    Object.entries(values).flatMap(([key, value]) => {
      const entry = carValueByKey(key)
      return entry === undefined ? [] : [[key, carText(entry, value, units)]]
    }),
  )
}

/**
 * Takes up what a car has become elsewhere. Fields that the reader has changed, is typing in, or has left half typed keep
 * their words.
 * @param before what the fields were filled from
 */
function followCar(draft: CarDraft, { before, after, units, typing }: { before: Car; after: Car; units: UnitChoices; typing?: string | undefined }): void {
  for (const key of new Set([...Object.keys(before.values), ...Object.keys(after.values)]) as Set<EnteredCarKey>) {
    const own = key === typing || draft.values[key] !== before.values[key] || draft.problems.some((problem) => problem.key === key)
    if (own || draft.values[key] === after.values[key]) continue
    const value = after.values[key]
    if (value === undefined) delete draft.values[key]
    else draft.values[key] = value
    const entry = carValueByKey(key)
    if (entry !== undefined) draft.texts[key] = carText(entry, value, units)
  }
  if (draft.name === before.name) draft.name = after.name
  if (draft.carClass === before.carClass) draft.carClass = after.carClass
}

/** Takes up what was typed into one field. */
function typeInto(draft: CarDraft, key: EnteredCarKey, text: string, units: UnitChoices): void {
  draft.texts[key] = text
  const { values, problems } = readCarTexts({ [key]: text }, units)
  draft.problems = [...draft.problems.filter((problem) => problem.key !== key), ...problems]
  if (values[key] === undefined) delete draft.values[key]
  else draft.values[key] = values[key]
}

/** What is wrong with a draft and what of it can be kept, `saved` being what is kept already. */
function readDraft(draft: CarDraft, saved: CarValues): DraftReading {
  const together = checkCar(draft.values).filter(({ key }) => !draft.problems.some((problem) => problem.key === key))
  const problems = [...draft.problems, ...together]
  const values = keepable(draft.values, problems, saved)
  const { id, name, carClass } = draft
  return { problems, car: values === null || name.trim() === '' ? null : { id, name: name.trim(), carClass, values } }
}

/** The values without those at fault, which stay what they were; null where that does not fit together either. */
function keepable(values: CarValues, problems: readonly CarProblem[], saved: CarValues): CarValues | null {
  const kept = { ...values }
  for (const { key } of problems) {
    const before = saved[key]
    if (before === undefined) delete kept[key]
    else kept[key] = before
  }
  return checkCar(kept).length === 0 ? kept : null
}
