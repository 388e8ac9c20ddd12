import { describe, expect, it } from 'vitest'
import type { Car } from '#shared/cars/car.ts'
import type { CarValues } from '#shared/cars/car-values.ts'
import type { CarView } from '#shared/schemas/car.ts'
import type { AccountAnswer } from './account-cars.ts'
import type { AccountVersion } from './kept-cars.ts'
import { createCarKeeper, type KeepState, type KeptCar } from './car-keeper.ts'

const car = (values: CarValues, more: Partial<KeptCar> = {}): KeptCar => ({ id: 'a', name: 'Kestrel', carClass: null, version: 1, ...more, values })
const view = (values: CarValues, version: number): CarView => ({
  ...car(values), version, chosen: true, createdAt: '2026-03-14T10:00:00Z', updatedAt: '2026-03-14T10:00:00Z',
})

/** A keeper whose account answers from a list, and whose clock is turned by hand. */
function desk(start: KeptCar, { member = true, answers = [] as AccountAnswer[], account = [] as CarView[], full = false } = {}) {
  const asked: string[] = []
  const browser = new Map<string, Car>()
  const shown: { state?: KeepState; kept?: KeptCar; instead?: Car | null } = {}
  const bases = new Map<string, AccountVersion | null>()
  let waiting: (() => void) | undefined
  const answer = async (what: string) => {
    asked.push(what)
    return answers.shift() ?? { kind: 'away' as const, retryAfterSeconds: 0 }
  }
  const keeper = createCarKeeper(
    start,
    {
      member,
      create: (sent) => answer(`create ${JSON.stringify(sent.values)}`),
      save: (sent, version) => answer(`save ${version} ${JSON.stringify(sent.values)}`),
      list: async () => account,
      browser: {
        put: (each, base) => !full && Boolean(browser.set(each.id, each) && bases.set(each.id, base)),
        letGo: (sent) => sent.forEach(({ id, values }) => JSON.stringify(browser.get(id)?.values) === JSON.stringify(values) && browser.delete(id)),
      },
      later(_milliseconds, run) {
        waiting = run
        return () => (waiting = undefined)
      },
    },
    { state: (state) => (shown.state = state), kept: (kept, instead) => Object.assign(shown, { kept, instead }) },
  )
  const settled = async () => {
    for (let n = 0; n < 8; n += 1) await Promise.resolve()
  }
  return {
    keeper, asked, browser, bases, shown,
    async tick() {
      const run = waiting
      waiting = undefined
      run?.()
      await settled()
    },
    get waits() {
      return waiting !== undefined
    },
  }
}

describe('a visitor’s car', () => {
  it('is in the browser with every key', () => {
    const { keeper, browser, shown } = desk(car({}, { version: null }), { member: false })
    keeper.typed(car({ mass: 3 }))
    expect(browser.get('a')?.values).toEqual({ mass: 3 })
    expect(shown.state).toEqual({ name: 'saved', where: 'browser' })
  })

  it('is said not to be saved where the browser keeps nothing', () => {
    const { keeper, shown } = desk(car({}, { version: null }), { member: false, full: true })
    keeper.typed(car({ mass: 3 }))
    expect(shown.state).toMatchObject({ name: 'failed', message: expect.stringContaining('does not keep anything') })
  })
})

describe('a member’s car', () => {
  it('goes to the account a moment later, once for several keys', async () => {
    const it = desk(car({}), { answers: [{ kind: 'saved', car: view({ mass: 3.6 }, 2) }] })
    it.keeper.typed(car({ mass: 3 }))
    it.keeper.typed(car({ mass: 3.6 }))
    expect(it.shown.state).toEqual({ name: 'saving' })
    await it.tick()
    expect(it.asked).toEqual(['save 1 {"mass":3.6}'])
    expect(it.shown.state).toEqual({ name: 'saved', where: 'account' })
    expect(it.waits).toBe(false)
  })

  it('is sent again when more was typed while it was on its way', async () => {
    const it = desk(car({}, { version: null }), { answers: [{ kind: 'saved', car: view({ mass: 3 }, 1) }, { kind: 'saved', car: view({ mass: 3.6 }, 2) }] })
    it.keeper.typed(car({ mass: 3 }))
    const first = it.tick()
    it.keeper.typed(car({ mass: 3.6 }))
    await first
    await it.tick()
    await it.tick()
    expect(it.asked).toEqual(['create {"mass":3}', 'save 1 {"mass":3.6}'])
    expect(it.shown.state).toEqual({ name: 'saved', where: 'account' })
  })

  it('stays in the browser until the account has it', async () => {
    const it = desk(car({}), { answers: [{ kind: 'away', retryAfterSeconds: 0 }, { kind: 'saved', car: view({ mass: 3 }, 2) }] })
    it.keeper.typed(car({ mass: 3 }))
    await it.tick()
    expect(it.shown.state).toEqual({ name: 'browser_only', why: 'away' })
    expect(it.browser.get('a')?.values).toEqual({ mass: 3 })
    await it.tick()
    expect(it.shown.state).toEqual({ name: 'saved', where: 'account' })
    expect(it.browser.size).toBe(0)
  })

  it('joins what another device changed, if it was something else', async () => {
    const theirs = view({ mass: 3, wheelbase: 325 }, 4)
    const it = desk(car({ mass: 3 }), { account: [theirs], answers: [{ kind: 'stale' }, { kind: 'saved', car: view({ mass: 3.6, wheelbase: 325 }, 5) }] })
    it.keeper.typed(car({ mass: 3.6 }))
    await it.tick()
    expect(it.shown).toMatchObject({ instead: { values: { mass: 3.6 } }, kept: { values: { mass: 3.6, wheelbase: 325 } } })
    await it.tick()
    expect(it.asked.at(-1)).toBe('save 4 {"mass":3.6,"wheelbase":325}')
  })

  it.each([['mine', 3.6], ['theirs', 3.2]] as const)('asks when both changed the same, and goes on with %s', async (side, mass) => {
    const theirs = view({ mass: 3.2 }, 4)
    const it = desk(car({ mass: 3 }), { account: [theirs], answers: [{ kind: 'stale' }, { kind: 'saved', car: view({ mass }, 5) }] })
    it.keeper.typed(car({ mass: 3.6 }))
    await it.tick()
    expect(it.shown.state).toEqual({ name: 'disputed', theirs })
    it.keeper.typed(car({ mass: 3.6 }))
    expect(it.waits).toBe(false)
    it.keeper.settle(theirs, side)
    await it.tick()
    expect(it.shown.state).toEqual({ name: 'saved', where: 'account' })
    expect(it.keeper.kept.values).toEqual({ mass })
  })

  it('comes back when it was deleted elsewhere while somebody was filling it in', async () => {
    const it = desk(car({ mass: 3 }), { answers: [{ kind: 'gone' }, { kind: 'saved', car: view({ mass: 3.6 }, 1) }] })
    it.keeper.typed(car({ mass: 3.6 }))
    await it.tick()
    await it.tick()
    expect(it.asked).toEqual(['save 1 {"mass":3.6}', 'create {"mass":3.6}'])
  })

  it('goes on from its own words where only their answer was lost, whether it was new or not', async () => {
    const lost = { kind: 'away', retryAfterSeconds: 0 } as const
    for (const start of [car({}, { version: null }), car({}, { version: 6 })]) {
      const it = desk(start, { account: [view({ mass: 3 }, 7)], answers: [lost, { kind: 'stale' }, { kind: 'saved', car: view({ mass: 3.6 }, 8) }] })
      it.keeper.typed(car({ mass: 3 }))
      await it.tick()
      it.keeper.typed(car({ mass: 3.6 }))
      await it.tick()
      await it.tick()
      expect(it.asked.at(-1)).toBe('save 7 {"mass":3.6}')
      expect(it.shown.state).toEqual({ name: 'saved', where: 'account' })
    }
  })

  it('stays in the browser with the version it was changed from', async () => {
    const known = desk(car({ mass: 3 }, { version: 4 }))
    known.keeper.typed(car({ mass: 3.6 }))
    await known.tick()
    expect(known.bases.get('a')).toMatchObject({ version: 4, values: { mass: 3 } })
    const fresh = desk(car({}, { version: null }))
    fresh.keeper.typed(car({ mass: 3 }))
    fresh.keeper.leave()
    expect(fresh.bases.get('a')).toBeNull()
    await fresh.tick()
    fresh.keeper.typed(car({ mass: 3.6 }))
    fresh.keeper.leave()
    // The account may have taken the first words in, then they are its first version.
    expect(fresh.bases.get('a')).toMatchObject({ version: 1, values: { mass: 3 } })
  })

  it('leaves nothing behind in the browser when nothing was typed', () => {
    const it = desk(car({}, { version: null }))
    it.keeper.leave()
    expect(it.browser.size).toBe(0)
  })

  it('says why it is refused', async () => {
    const it = desk(car({}), { answers: [{ kind: 'refused', message: 'You already have a car called “Kestrel”.' }] })
    it.keeper.typed(car({ mass: 3 }))
    await it.tick()
    expect(it.shown.state).toEqual({ name: 'failed', message: 'You already have a car called “Kestrel”.' })
  })
})
