export { chosenKeptCar, keepCars, keptCars, KEPT_CARS, letGo, putKeptCar }
export type { KeptCars }

import { sameCar, type Car, type CarSheet } from '#shared/cars/car.ts'

/** The cars of a reader without an account, and of one whose account could not be reached. In this browser only. */
interface KeptCars {
  cars: Car[]
  /** Id of the one that calculators start from. */
  chosen: string | null
}

const KEPT_CARS = 'camber-clay.cars'

/**
 * What this browser keeps. Anything may stand there, also what another version of the book left: what has not the shape of
 * a car is passed over. Whether its numbers can be is not asked here; fields and server do.
 */
function keptCars(): KeptCars {
  const nothing = { cars: [], chosen: null }
  try {
    const stored = JSON.parse(localStorage.getItem(KEPT_CARS) ?? 'null') as Partial<KeptCars> | null
    if (!Array.isArray(stored?.cars)) return nothing
    const cars = (stored.cars as unknown[]).flatMap((each) => carFrom(each) ?? [])
    const chosen = cars.find(({ id }) => id === stored.chosen) ?? cars[0]
    return { cars, chosen: chosen?.id ?? null }
  } catch {
    return nothing
  }
}

/** @returns whether the browser took it: a full disk or a private window may refuse */
function keepCars(kept: KeptCars): boolean {
  try {
    if (kept.cars.length === 0) localStorage.removeItem(KEPT_CARS)
    else localStorage.setItem(KEPT_CARS, JSON.stringify(kept))
    return true
  } catch {
    return false
  }
}

/** Keeps one car, in place of what was kept of it. Reads first, so that another tab's cars stay. */
function putKeptCar(car: Car): boolean {
  const { cars, chosen } = keptCars()
  const others = cars.some(({ id }) => id === car.id) ? cars.map((each) => (each.id === car.id ? car : each)) : [...cars, car]
  return keepCars({ cars: others, chosen: chosen ?? car.id })
}

/** Lets go of cars that are safe elsewhere, unless another tab has changed them since. */
function letGo(sent: readonly Car[]): void {
  const { cars, chosen } = keptCars()
  const left = cars.filter((car) => !sent.some((each) => each.id === car.id && sameCar(each, car)))
  keepCars({ cars: left, chosen: left.some(({ id }) => id === chosen) ? chosen : (left[0]?.id ?? null) })
}

function chosenKeptCar(): CarSheet | undefined {
  const { cars, chosen } = keptCars()
  const car = cars.find(({ id }) => id === chosen)
  return car && { id: car.id, name: car.name, values: car.values }
}

function carFrom(raw: unknown): Car | null {
  const { id, name, carClass, values } = (raw ?? {}) as Partial<Car>
  if (typeof id !== 'string' || typeof name !== 'string' || typeof values !== 'object' || values === null) return null
  const numbers = Object.entries(values).filter(([, value]) => typeof value === 'number' && Number.isFinite(value))
  return { id, name, carClass: typeof carClass === 'string' ? carClass : null, values: Object.fromEntries(numbers) }
}
