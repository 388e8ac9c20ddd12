export { mergeCars }
export type { CarMerge }

import { CARS_AT_MOST, freeName, isNoted, sameCar, sameName, type Car } from './car.ts'
import type { CarValues } from './car-values.ts'
import { checkCar } from './check-car.ts'

const NOTE = 'from this browser'

interface CarMerge {
  /** The account's cars, some with gaps filled, and after them those that came new. */
  cars: Car[]
  /** Ids of the browser's cars that the account now holds whole; what is missing here did not fit. */
  held: string[]
}

/**
 * Brings the cars that a browser kept into an account and loses nothing of either. A car is known again by its id:
 *
 * - not in the account: it comes in as it is; under a name of its own if that one is taken;
 * - there, and nothing contradicts: the account's car gets what only the browser had;
 * - there, under another name, with another number for the same value, or such that both together cannot be one car: the
 *   account's stays as it is and the browser's comes in beside it, named “... (from this browser)” if its name is taken.
 *
 * Doing it again changes nothing, so that a request whose answer was lost can be sent again.
 * @param copyId the id for a second copy: always the same for the same car with the same values and name
 */
function mergeCars(account: readonly Car[], browser: readonly Car[], copyId: (car: Car) => string): CarMerge {
  const cars = [...account]
  const held: string[] = []
  for (const car of browser) {
    const at = cars.findIndex(({ id }) => id === car.id)
    const known = cars[at]
    const whole = known === undefined ? null : joined(known, car)
    if (whole !== null) {
      cars[at] = whole
      held.push(car.id)
      continue
    }
    const coming = known === undefined ? car : { ...car, id: copyId(car) }
    if (cars.some((other) => other.id === coming.id || sameCar(other, coming))) {
      held.push(car.id)
    } else if (cars.length < CARS_AT_MOST) {
      cars.push({ ...coming, name: freeName(coming.name, NOTE, cars.map(({ name }) => name)) })
      held.push(car.id)
    }
  }
  return { cars, held }
}

/** The account's car with what only the browser had; null where the two cannot be one. */
function joined(known: Car, car: Car): Car | null {
  const mine = known.values as Partial<Record<string, number>>
  const values = { ...known.values, ...car.values } as Partial<Record<string, number>>
  const contradicts = Object.entries(mine).some(([key, value]) => values[key] !== value)
  const otherClass = known.carClass !== null && car.carClass !== null && known.carClass !== car.carClass
  const renamed = !sameName(known.name, car.name) && !isNoted(known.name, car.name, NOTE)
  if (contradicts || otherClass || renamed) return null
  const carClass = known.carClass ?? car.carClass
  const filled = Object.keys(values).length > Object.keys(mine).length
  if (!filled) return carClass === known.carClass ? known : { ...known, carClass }
  return checkCar(values as CarValues).length > 0 ? null : { ...known, carClass, values: values as CarValues }
}
