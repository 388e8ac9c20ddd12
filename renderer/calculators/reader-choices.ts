export { useReaderChoices }

import { defineStore } from 'pinia'
import { unitChoicesFrom, type UnitChoices, type UnitGroupKey } from '#shared/units/unit-choices.ts'
import type { UnitId } from '#shared/units/units.ts'

const storageKey = 'camber-clay.units'

/**
 * In which units this reader wants to read: one choice for all instruments of a page, kept in this browser
 * only. On the server and until `load` it is empty, so that what hydrates is what was rendered.
 */
const useReaderChoices = defineStore('reader-choices', {
  state: () => ({ units: {} as UnitChoices, loaded: false }),
  actions: {
    /** Reads the kept choices once, in the browser. */
    load() {
      if (this.loaded) return
      this.loaded = true
      this.units = { ...readStored(), ...this.units }
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
