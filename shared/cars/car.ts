export { CARS_AT_MOST, CAR_NAME_LENGTH, freeName, isNoted, sameCar, sameName }
export type { Car, CarSheet }

import type { CarClass } from '#shared/vocabulary/conditions.ts'
import type { CarValues } from './car-values.ts'

/** A reader's car. Its id is made where the car was made, so that the same car is known wherever it is kept. */
interface Car {
  id: string
  name: string
  carClass: CarClass | null
  values: CarValues
}

/** What an instrument needs of it. */
type CarSheet = Pick<Car, 'id' | 'name' | 'values'>

const CARS_AT_MOST = 20
const CAR_NAME_LENGTH = 60

/** Whether both hold the same numbers under the same name. */
function sameCar(one: Omit<Car, 'id'>, other: Omit<Car, 'id'>): boolean {
  return one.name === other.name && one.carClass === other.carClass && sameValues(one.values, other.values)
}

function sameValues(one: CarValues, other: CarValues): boolean {
  const entries = Object.entries(one)
  return (
    entries.length === Object.keys(other).length &&
    entries.every(([key, value]) => (other as Partial<Record<string, number>>)[key] === value)
  )
}

/** Capitals do not tell cars apart. */
function sameName(one: string, other: string): boolean {
  return one.toLowerCase() === other.toLowerCase()
}

/** The name, or the first of `name (note)`, `name (note 2)`, ... that no other car has. */
function freeName(wanted: string, note: string, taken: readonly string[]): string {
  const isFree = (name: string) => !taken.some((other) => sameName(other, name))
  if (isFree(wanted)) return wanted
  for (let n = 1; ; n += 1) {
    const name = noted(wanted, note, n)
    if (isFree(name)) return name
  }
}

/** Whether `freeName` may have made this name of the wanted one. */
function isNoted(name: string, wanted: string, note: string): boolean {
  return Array.from({ length: CARS_AT_MOST }, (_, n) => noted(wanted, note, n + 1)).some((made) => sameName(made, name))
}

function noted(wanted: string, note: string, n: number): string {
  const end = n === 1 ? ` (${note})` : ` (${note} ${n})`
  return [...wanted].slice(0, CAR_NAME_LENGTH - end.length).join('').trimEnd() + end
}
