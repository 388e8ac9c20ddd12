export { chosenKeptCar, keepCars, keptCars, KEPT_CARS, letGo, putKeptCar }
export type { AccountVersion, BrowserCar, KeptCars }

import { sameCar, type Car, type CarSheet } from '#shared/cars/car.ts'

/** What the account held when it was last heard of. */
type AccountVersion = Omit<Car, 'id'> & { version: number }

/** A car as a browser keeps it. */
interface BrowserCar extends Car {
  /** Id of the member whose page put it here; a car without one was made by somebody who was not signed in. */
  owner?: string
  /** What its changes started from; missing where the account has never answered for it. */
  base?: AccountVersion
}

/** The cars of a reader without an account, and of one whose account could not be reached. In this browser only. */
interface KeptCars {
  cars: BrowserCar[]
  /** Id of the one that calculators start from. */
  chosen: string | null
}

const KEPT_CARS = 'camber-clay.cars'

/**
 * What this browser keeps for one reader: what nobody signed in for, and a member's own. Browsers are shared, so a member's
 * car is shown to nobody else and goes to no other account.
 * @param member id of who is signed in; null for a visitor
 */
function keptCars(member: string | null = null): KeptCars {
  const { cars, chosen } = stored()
  const mine = cars.filter(({ owner }) => isFor(owner, member))
  return { cars: mine, chosen: (mine.find(({ id }) => id === chosen) ?? mine[0])?.id ?? null }
}

/**
 * Keeps these in place of what was kept for this reader; other members' cars stay.
 * @returns whether the browser took it: a full disk or a private window may refuse
 */
function keepCars({ cars, chosen }: KeptCars, member: string | null = null): boolean {
  const others = stored().cars.filter(({ owner }) => !isFor(owner, member))
  return store([...cars, ...others], chosen)
}

/** Keeps one car, in place of what was kept of it. Reads first, so that another tab's cars stay. */
function putKeptCar(car: BrowserCar): boolean {
  const { cars, chosen } = stored()
  const isIt = (each: BrowserCar) => each.id === car.id && each.owner === car.owner
  const others = cars.some(isIt) ? cars.map((each) => (isIt(each) ? car : each)) : [...cars, car]
  return store(others, chosen ?? car.id)
}

/** Lets go of cars that are safe elsewhere, unless another tab has changed them since. */
function letGo(sent: readonly Car[], member: string | null = null): void {
  const { cars, chosen } = stored()
  const isSafe = (car: BrowserCar) => isFor(car.owner, member) && sent.some((each) => each.id === car.id && sameCar(each, car))
  const left = cars.filter((car) => !isSafe(car))
  store(left, left.some(({ id }) => id === chosen) ? chosen : (left[0]?.id ?? null))
}

function chosenKeptCar(member: string | null = null): CarSheet | undefined {
  const { cars, chosen } = keptCars(member)
  const car = cars.find(({ id }) => id === chosen)
  return car && { id: car.id, name: car.name, values: car.values }
}

function isFor(owner: string | undefined, member: string | null): boolean {
  return owner === undefined || owner === member
}

/**
 * Anything may stand there, also what another version of the book left: what has not the shape of a car is passed over.
 * Whether its numbers can be is not asked here; fields and server do.
 */
function stored(): KeptCars {
  try {
    const raw = JSON.parse(localStorage.getItem(KEPT_CARS) ?? 'null') as Partial<KeptCars> | null
    if (!Array.isArray(raw?.cars)) return { cars: [], chosen: null }
    return { cars: (raw.cars as unknown[]).flatMap((each) => browserCar(each) ?? []), chosen: raw.chosen ?? null }
  } catch {
    return { cars: [], chosen: null }
  }
}

function store(cars: BrowserCar[], chosen: string | null): boolean {
  try {
    if (cars.length === 0) localStorage.removeItem(KEPT_CARS)
    else localStorage.setItem(KEPT_CARS, JSON.stringify({ cars, chosen }))
    return true
  } catch {
    return false
  }
}

function browserCar(raw: unknown): BrowserCar | null {
  const { id, owner, base } = (raw ?? {}) as Partial<BrowserCar>
  const fields = carFields(raw)
  if (fields === null || typeof id !== 'string') return null
  const known = carFields(base)
  const version = base?.version
  return {
    id,
    ...fields,
    ...(typeof owner === 'string' && { owner }),
    ...(known !== null && typeof version === 'number' && { base: { ...known, version } }),
  }
}

function carFields(raw: unknown): Omit<Car, 'id'> | null {
  const { name, carClass, values } = (raw ?? {}) as Partial<Car>
  if (typeof name !== 'string' || typeof values !== 'object' || values === null) return null
  const numbers = Object.entries(values).filter(([, value]) => typeof value === 'number' && Number.isFinite(value))
  return { name, carClass: typeof carClass === 'string' ? carClass : null, values: Object.fromEntries(numbers) }
}
