export { createDeviceCopies }

import type { DeviceCopy } from './draft-keeper.ts'

type Store = Pick<Storage, 'getItem' | 'setItem' | 'removeItem' | 'key' | 'length'>

/**
 * Copies of one draft on this device. Every browser tab keeps its own, so that two tabs on the same draft do not write
 * over each other; a copy of a tab that is gone is found again by the next one.
 */
function createDeviceCopies(store: Store | null, editId: string, tab: string) {
  const prefix = `draft:${editId}:`
  const own = prefix + tab

  function keys(): string[] {
    if (store === null) return []
    return Array.from({ length: store.length }, (_, at) => store.key(at) ?? '').filter((key) => key.startsWith(prefix))
  }

  return {
    write(copy: DeviceCopy): boolean {
      try {
        store?.setItem(own, JSON.stringify(copy))
        return store !== null
      } catch {
        // Full, or switched off.
        return false
      }
    },
    clear(): void {
      try {
        store?.removeItem(own)
      } catch {
        // Switched off: there was nothing to clear.
      }
    },
    /** The newest copy of any tab, or null. */
    newest(): DeviceCopy | null {
      try {
        const copies = keys().flatMap((key) => parse(store?.getItem(key) ?? null) ?? [])
        return copies.sort((one, other) => other.keptAt.localeCompare(one.keptAt))[0] ?? null
      } catch {
        return null
      }
    },
    /** Forgets every copy that is not newer than this one. */
    forget(upTo: DeviceCopy): void {
      try {
        for (const key of keys()) {
          const copy = parse(store?.getItem(key) ?? null)
          if (copy === null || copy.keptAt <= upTo.keptAt) store?.removeItem(key)
        }
      } catch {
        // Switched off: there is nothing to forget.
      }
    },
  }
}

function parse(text: string | null): DeviceCopy | null {
  if (text === null) return null
  try {
    const copy = JSON.parse(text) as Partial<DeviceCopy> | null
    const whole = typeof copy?.version === 'number' && typeof copy.keptAt === 'string' && typeof copy.content?.body === 'string'
    return whole ? (copy as DeviceCopy) : null
  } catch {
    return null
  }
}
