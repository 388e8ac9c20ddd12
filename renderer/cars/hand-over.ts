export { handOverCars, isMembersPage }

import type { MergedCars } from '#shared/schemas/car.ts'
import { keptCars, letGo } from './kept-cars.ts'

/** Whether this page was made for somebody who is signed in: the masthead says so. */
function isMembersPage(): boolean {
  return document.querySelector('.mast[data-member]') !== null
}

/**
 * Brings the cars that this browser keeps into the account of who is signed in. The browser lets go only of those that
 * the account has confirmed to hold. One car that is refused does not hold up the others: they go one by one then.
 * @returns the account's cars, or null when nothing was handed over
 */
async function handOverCars(): Promise<MergedCars | null> {
  const { cars, chosen } = keptCars()
  if (cars.length === 0) return null
  const all = await send(cars, chosen)
  if (all !== 'refused') return all
  let last: MergedCars | null = null
  for (const car of cars) {
    const one = await send([car], chosen === car.id ? chosen : null)
    if (one !== 'refused' && one !== null) last = one
  }
  return last
}

async function send(cars: ReturnType<typeof keptCars>['cars'], chosen: string | null): Promise<MergedCars | 'refused' | null> {
  try {
    const response = await fetch('/api/cars/merge', {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ cars, chosen }),
    })
    if (response.status === 422 && cars.length > 1) return 'refused'
    if (!response.ok) return null
    const merged = (await response.json()) as MergedCars
    letGo(cars.filter(({ id }) => merged.held.includes(id)))
    return merged
  } catch {
    // No signal: they stay where they are, and the next page tries again.
    return null
  }
}
