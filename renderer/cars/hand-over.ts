export { handOverCars }

import type { CarView, MergedCars } from '#shared/schemas/car.ts'
import { checkCar } from '#shared/cars/check-car.ts'
import type { Car } from '#shared/cars/car.ts'
import { listAccountCars, saveAccountCar, type AccountAnswer } from './account-cars.ts'
import { joinVersions } from './join-versions.ts'
import { keptCars, letGo, type AccountVersion, type BrowserCar } from './kept-cars.ts'

/**
 * Brings the cars that this browser keeps for a member into the account. What was changed while the account could not be
 * reached is saved over the version that it was changed from; only what cannot be, and what a visitor made, is merged. The
 * browser lets go only of what the account has confirmed to hold.
 * @returns the account's cars, or null when nothing was handed over
 */
async function handOverCars(member: string): Promise<CarView[] | null> {
  const { cars, chosen } = keptCars(member)
  if (cars.length === 0) return null
  const rest: BrowserCar[] = []
  for (const car of cars) {
    const answer = car.owner === member && car.base !== undefined ? await saveOver(car, car.base) : 'merge'
    // No signal, or signed out: what is left stays where it is, and the next page tries again.
    if (answer === 'later') return null
    if (answer === 'merge') rest.push(car)
    else letGo([car], member)
  }
  if (rest.length === 0) return listAccountCars()
  return mergeAll(rest, chosen, member)
}

/** One car that is refused does not hold up the others: they go one by one then. */
async function mergeAll(cars: readonly BrowserCar[], chosen: string | null, member: string): Promise<CarView[] | null> {
  const ids = new Set(cars.map(({ id }) => id))
  const all = ids.size === cars.length ? await merge(cars, chosen, member) : 'refused'
  if (all !== 'refused') return all?.cars ?? null
  let last: CarView[] | null = null
  for (const car of cars) {
    const one = await merge([car], chosen === car.id ? chosen : null, member)
    if (one !== 'refused' && one !== null) last = one.cars
  }
  return last
}

/** Saves a car over what it was changed from; where the account has a newer one, over both together. */
async function saveOver(car: Car, base: AccountVersion): Promise<'saved' | 'merge' | 'later'> {
  const first = await saveAccountCar(plain(car), base.version)
  if (first.kind !== 'stale') return outcome(first)
  const account = await listAccountCars()
  if (account === null) return 'later'
  const theirs = account.find(({ id }) => id === car.id)
  if (theirs === undefined) return 'merge'
  const { values, disputed } = joinVersions(base.values, car.values, theirs.values)
  if (disputed.length > 0 || checkCar(values).length > 0) return 'merge'
  const name = car.name === base.name ? theirs.name : car.name
  const carClass = car.carClass === base.carClass ? theirs.carClass : car.carClass
  return outcome(await saveAccountCar({ id: car.id, name, carClass, values }, theirs.version))
}

function outcome({ kind }: AccountAnswer): 'saved' | 'merge' | 'later' {
  if (kind === 'saved') return 'saved'
  return kind === 'away' || kind === 'signed_out' ? 'later' : 'merge'
}

async function merge(cars: readonly BrowserCar[], chosen: string | null, member: string): Promise<MergedCars | 'refused' | null> {
  try {
    const response = await fetch('/api/cars/merge', {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ cars: cars.map(plain), chosen }),
    })
    if (response.status === 422 && cars.length > 1) return 'refused'
    if (!response.ok) return null
    const merged = (await response.json()) as MergedCars
    letGo(cars.filter(({ id }) => merged.held.includes(id)), member)
    return merged
  } catch {
    return null
  }
}

function plain({ id, name, carClass, values }: Car): Car {
  return { id, name, carClass, values }
}
