export { createCarKeeper }
export type { CarKeeper, KeepState, KeptCar }

import { sameCar, type Car } from '#shared/cars/car.ts'
import { checkCar } from '#shared/cars/check-car.ts'
import type { AccountAnswer } from './account-cars.ts'
import { joinVersions } from './join-versions.ts'
import type { AccountVersion } from './kept-cars.ts'
import type { CarView } from '#shared/schemas/car.ts'

/** A car with what is kept of it; `version` is null while the account has not taken it. */
interface KeptCar extends Car {
  version: number | null
}

type KeepState =
  | { name: 'nothing' }
  | { name: 'saved'; where: 'browser' | 'account' }
  | { name: 'saving' }
  /** The account could not be reached; the browser has it and it is tried again. */
  | { name: 'browser_only'; why: 'away' | 'signed_out' }
  | { name: 'failed'; message: string }
  /** Another copy was saved meanwhile and both changed the same value. */
  | { name: 'disputed'; theirs: CarView }

interface Ports {
  /** Whether cars go to an account; else this browser is all there is. */
  member: boolean
  create(car: Car, leaving: boolean): Promise<AccountAnswer>
  save(car: Car, version: number, leaving: boolean): Promise<AccountAnswer>
  list(): Promise<CarView[] | null>
  /** `base`: what the account held when it was last heard of. */
  browser: { put(car: Car, base: AccountVersion | null): boolean; letGo(cars: readonly Car[]): void }
  /** @returns a way to call it off */
  later(milliseconds: number, run: () => void): () => void
}

interface Changed {
  state(state: KeepState): void
  /** What is kept now; `instead` of what was typed here, when something came from elsewhere, for the fields to show. */
  kept(car: KeptCar, instead: Car | null): void
}

type CarKeeper = ReturnType<typeof createCarKeeper>

const FIRST_SAVE = 600
const RETRIES = [5_000, 15_000, 30_000]
const NOT_KEPT = 'this browser does not keep anything. Copy your numbers before you leave, or sign in.'

/**
 * Keeps one car as it is typed: a visitor's in the browser at once, a member's in the account a moment later, and in the
 * browser for as long as the account cannot be reached. Never saves over a version it has not seen.
 */
function createCarKeeper(start: KeptCar, ports: Ports, changed: Changed) {
  let kept = start
  let newest: Car = start
  let running: Promise<void> | undefined
  let callOff: (() => void) | undefined
  let tries = 0
  let stuck = false
  // What was sent and not answered: the account may hold it all the same.
  let unanswered: Car[] = []

  const dirty = () => kept.version === null || !sameCar(kept, newest)

  function schedule(milliseconds: number): void {
    callOff?.()
    callOff = ports.later(milliseconds, () => {
      callOff = undefined
      void push(false)
    })
  }

  function keepInBrowser(): void {
    if (ports.browser.put(newest, null)) {
      kept = { ...newest, version: null }
      changed.kept(kept, null)
      changed.state({ name: 'saved', where: 'browser' })
    } else changed.state({ name: 'failed', message: NOT_KEPT })
  }

  function push(leaving: boolean): Promise<void> {
    callOff?.()
    callOff = undefined
    if (running !== undefined || stuck || !dirty()) return running ?? Promise.resolve()
    const sent = newest
    unanswered.push(sent)
    changed.state({ name: 'saving' })
    running = (kept.version === null ? ports.create(sent, leaving) : ports.save(sent, kept.version, leaving)).then(async (answer) => {
      running = undefined
      await take(answer, sent)
    })
    return running
  }

  async function take(answer: AccountAnswer, sent: Car): Promise<void> {
    if (answer.kind === 'saved') {
      tries = 0
      unanswered = []
      kept = answer.car
      changed.kept(kept, null)
      ports.browser.letGo([sent])
      changed.state(dirty() ? { name: 'saving' } : { name: 'saved', where: 'account' })
      if (dirty()) schedule(FIRST_SAVE)
    } else if (answer.kind === 'stale') {
      await joinTheirs()
    } else if (answer.kind === 'gone') {
      // Deleted elsewhere while it was still being filled in here: whoever is typing wants it.
      kept = { ...kept, version: null }
      schedule(0)
    } else if (answer.kind === 'refused') {
      changed.state({ name: 'failed', message: answer.message })
    } else {
      waitForAccount(answer.kind, answer.kind === 'away' ? answer.retryAfterSeconds : 0)
    }
  }

  /** What the account held when it was last heard of; a car whose only answer was lost is its first version there. */
  function base(): AccountVersion | null {
    if (kept.version !== null) return { ...kept, version: kept.version }
    return unanswered[0] === undefined ? null : { ...unanswered[0], version: 1 }
  }

  function waitForAccount(why: 'away' | 'signed_out', retryAfterSeconds: number): void {
    const held = ports.browser.put(newest, base())
    changed.state(held ? { name: 'browser_only', why } : { name: 'failed', message: 'your account cannot be reached, and this browser does not keep anything. Keep this page open.' })
    const wait = RETRIES[Math.min(tries, RETRIES.length - 1)]!
    tries += 1
    schedule(Math.max(wait, retryAfterSeconds * 1000))
  }

  async function joinTheirs(): Promise<void> {
    const theirs = (await ports.list())?.find(({ id }) => id === kept.id)
    if (theirs === undefined) {
      waitForAccount('away', 0)
      return
    }
    // One's own words whose answer was lost are nobody else's change.
    const from = unanswered.find((sent) => sameCar(sent, theirs)) ?? kept
    const { values, disputed } = joinVersions(from.values, newest.values, theirs.values)
    if (disputed.length > 0 || checkCar(values).length > 0) {
      dispute(theirs)
      return
    }
    const name = newest.name === from.name ? theirs.name : newest.name
    const carClass = newest.carClass === from.carClass ? theirs.carClass : newest.carClass
    goOn(theirs, { ...newest, name, carClass, values })
  }

  function dispute(theirs: CarView): void {
    stuck = true
    callOff?.()
    callOff = undefined
    changed.state({ name: 'disputed', theirs })
  }

  function goOn(theirs: CarView, chosen: Car): void {
    const instead = newest
    stuck = false
    unanswered = []
    kept = theirs
    newest = chosen
    changed.kept({ ...chosen, version: theirs.version }, instead)
    if (dirty()) schedule(0)
    else changed.state({ name: 'saved', where: 'account' })
  }

  return {
    get kept() {
      return kept
    },
    /** Something was typed; `car` is what of it can be kept. */
    typed(car: Car): void {
      newest = car
      if (stuck) return
      if (!ports.member) {
        if (!sameCar(kept, newest) || kept.version === null) keepInBrowser()
      } else if (dirty()) {
        if (running === undefined) changed.state({ name: 'saving' })
        schedule(FIRST_SAVE)
      } else {
        callOff?.()
        changed.state({ name: 'saved', where: 'account' })
      }
    },
    /** Saves what waits, now. */
    async flush(leaving = false): Promise<void> {
      if (!ports.member || callOff === undefined) return running
      await push(leaving)
    },
    /** Keeps in the browser what the account may not hear of before the page is gone. */
    leave(): void {
      if (ports.member && newest !== start && (dirty() || stuck)) ports.browser.put(newest, base())
    },
    /** What stands here was made from a version that nobody knows any more: the reader says what counts. */
    ask(theirs: CarView): void {
      kept = { ...theirs, version: null }
      dispute(theirs)
    },
    /** The answer to a dispute. */
    settle(theirs: CarView, side: 'mine' | 'theirs'): void {
      const both = joinVersions(kept.values, newest.values, theirs.values).values
      const mine = checkCar(both).length === 0 ? both : newest.values
      goOn(theirs, side === 'theirs' ? theirs : { ...newest, values: mine })
    },
    stop(): void {
      callOff?.()
    },
  }
}
