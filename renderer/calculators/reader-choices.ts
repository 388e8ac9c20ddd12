export { useReaderChoices }

import { defineStore } from 'pinia'
import { unitChoicesFrom, type UnitChoices, type UnitGroupKey } from '#shared/units/unit-choices.ts'
import { chosenKeptCar, KEPT_CARS } from '../cars/kept-cars.ts'
import { pageMember } from '../cars/page-member.ts'
import type { CarKey } from '#shared/cars/car-values.ts'
import type { CarSheet } from '#shared/cars/car.ts'
import type { UnitId } from '#shared/units/units.ts'

const storageKey = 'camber-clay.units'

/** A number that a reader changed in one instrument, for the others. */
interface ChangedValue {
  value: number
  /** Rises with every change. */
  at: number
}

/**
 * What all instruments of a page have in common: the units this reader wants to read in and their car, both kept in this
 * browser, and the values they have changed on this page. On the server and until `load` it is empty, so that
 * what hydrates is what was rendered.
 */
const useReaderChoices = defineStore('reader-choices', {
  state: () => ({
    units: {} as UnitChoices,
    car: undefined as CarSheet | undefined,
    changed: {} as Partial<Record<CarKey, ChangedValue>>,
    changes: 0,
    loaded: false,
  }),
  actions: {
    /** Reads what is kept, once, in the browser. */
    load() {
      if (this.loaded) return
      this.loaded = true
      this.units = { ...readStored(), ...this.units }
      this.takeCar()
      // Another tab may change the car, and so may a page that one comes back from.
      addEventListener('storage', ({ key }) => {
        if (key === KEPT_CARS || key === null) this.takeCar()
      })
      addEventListener('pageshow', ({ persisted }) => {
        if (persisted) this.takeCar()
      })
      const member = pageMember()
      if (this.car !== undefined && member !== null) void this.handOver(member)
    },
    takeCar() {
      // What was handed over to an account stays in use on the page.
      const member = pageMember()
      this.car = chosenKeptCar(member) ?? (member === null ? undefined : this.car)
    },
    async handOver(member: string) {
      // Asked for seldom, and it knows every rule of a car.
      const { handOverCars } = await import('../cars/hand-over.ts')
      const chosen = (await handOverCars(member))?.find((car) => car.chosen)
      if (chosen !== undefined) this.car = chosen
    },
    /** Tells the other instruments what a value of the car is for now; the car itself keeps its own. */
    change(key: CarKey, value: number): number {
      const at = this.changes + 1
      this.changed = { ...this.changed, [key]: { value, at } }
      this.changes = at
      return at
    },
    chooseUnit(group: UnitGroupKey, unit: UnitId) {
      this.units = { ...this.units, [group]: unit }
      // A browser that keeps nothing (private window, full disk) still gets the choice for this page.
      try {
        localStorage.setItem(storageKey, JSON.stringify(this.units))
      } catch {
        return
      }
    },
  },
})

function readStored(): UnitChoices {
  try {
    const stored: unknown = JSON.parse(localStorage.getItem(storageKey) ?? '{}')
    return typeof stored === 'object' && stored !== null
      ? unitChoicesFrom(stored as Record<string, unknown>)
      : {}
  } catch {
    return {}
  }
}
