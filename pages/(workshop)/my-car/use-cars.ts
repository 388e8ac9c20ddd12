export { useCars }
export type { CarsDesk }

import { computed, onBeforeUnmount, onMounted, reactive, ref, shallowRef, watch } from 'vue'
import { useReaderChoices } from '#renderer/calculators/reader-choices.ts'
import { chooseAccountCar, createAccountCar, deleteAccountCar, listAccountCars, saveAccountCar } from '#renderer/cars/account-cars.ts'
import { draftOf, draftTexts, followCar, readDraft, typeInto, type CarDraft } from '#renderer/cars/car-draft.ts'
import { createCarKeeper, type CarKeeper, type KeepState, type KeptCar } from '#renderer/cars/car-keeper.ts'
import { handOverCars } from '#renderer/cars/hand-over.ts'
import { keepCars, KEPT_CARS, keptCars, letGo, putKeptCar } from '#renderer/cars/kept-cars.ts'
import { CARS_AT_MOST, freeName, type Car } from '#shared/cars/car.ts'
import type { EnteredCarKey } from '#shared/cars/car-values.ts'
import type { CarView } from '#shared/schemas/car.ts'
import type { UnitChoices } from '#shared/units/unit-choices.ts'

type CarsDesk = ReturnType<typeof useCars>

interface Start {
  /** Id of who is signed in; null for a visitor. */
  memberId: string | null
  /** What the account keeps. */
  cars: readonly CarView[]
  newId: string
  /** The car that the address asks for. */
  asked: string | undefined
  /** A form that was refused and shows a car of its own, which the account does not have. */
  formId: string | undefined
  /** Types again what was typed before the page was alive, while the units are still those that the server printed. */
  typeAgain(): void
}

type Listed = KeptCar & { isNew?: boolean }

/**
 * The cars of one reader on the page: which is open, what is typed, where it is kept. A member's come from the account, a
 * visitor's from the browser once the page is alive, so that server and browser begin alike.
 */
function useCars({ memberId, cars: account, newId, asked, formId, typeAgain }: Start) {
  const member = memberId !== null
  const choices = useReaderChoices()
  const alive = ref(false)
  const units = computed((): UnitChoices => (alive.value ? choices.units : {}))
  const cars = ref<Listed[]>(account.map(listed))
  const chosen = ref<string | null>(account.find((car) => car.chosen)?.id ?? null)
  const ofForm = formId === undefined ? undefined : (cars.value.find(({ id }) => id === formId) ?? blank(formId, account.map(({ name }) => name)))
  const first = ofForm ?? cars.value.find(({ id }) => id === asked) ?? cars.value.find(({ id }) => id === chosen.value) ?? cars.value[0] ?? blank(newId, [])
  const current = ref<Listed>(first)
  const draft = reactive<CarDraft>(draftOf(first, {}))
  const state = shallowRef<KeepState>(restState(first))
  const deleted = shallowRef<Listed | null>(null)
  /** What happened to cars of this browser when the page opened. */
  const handedOver = ref<{ taken: number; left: string[] } | null>(null)
  let keeper: CarKeeper | undefined

  const reading = computed(() => readDraft(draft, current.value.values))
  const full = computed(() => cars.value.length >= CARS_AT_MOST)

  function restState(car: Listed): KeepState {
    return car.isNew ? { name: 'nothing' } : { name: 'saved', where: member ? 'account' : 'browser' }
  }

  /** @param follow what the fields were filled from, where they show this car already and go on being filled in */
  function open(car: Listed, follow?: Listed): void {
    keeper?.stop()
    current.value = car
    if (follow === undefined) Object.assign(draft, draftOf(car, units.value))
    else followCar(draft, { before: follow, after: car, units: units.value, typing: typingIn() })
    state.value = restState(car)
    keeper = createCarKeeper({ ...car }, ports, {
      state: (next) => {
        if (current.value.id === car.id) state.value = next
      },
      kept: (kept, instead) => {
        replace({ ...listed(kept), version: kept.version })
        if (instead === null || current.value.id !== car.id) return
        followCar(draft, { before: instead, after: kept, units: units.value })
      },
    })
  }
  function typingIn(): EnteredCarKey | undefined {
    const name = document.activeElement?.getAttribute('name') ?? ''
    return name.startsWith('value.') ? (name.slice('value.'.length) as EnteredCarKey) : undefined
  }

  /** Puts a car in its place in the list, or at its end. */
  function replace(car: Listed): void {
    const at = cars.value.findIndex(({ id }) => id === car.id)
    if (at === -1) cars.value.push(car)
    else cars.value[at] = car
    if (current.value.id === car.id) current.value = car
    chosen.value ??= car.id
  }

  async function show(id: string): Promise<void> {
    const car = cars.value.find((each) => each.id === id)
    if (car === undefined || id === current.value.id) return
    await keeper?.flush()
    open(car)
    history.replaceState(history.state, '', `/my-car?car=${id}`)
  }

  function type(key: EnteredCarKey, text: string): void {
    typeInto(draft, key, text, units.value)
    keep()
  }
  function rename(name: string): void {
    draft.name = name
    keep()
  }
  function classify(carClass: Car['carClass']): void {
    draft.carClass = carClass
    keep()
  }
  function keep(): void {
    const { car, problems } = reading.value
    if (car !== null) keeper?.typed(car)
    else if (draft.name.trim() === '') state.value = { name: 'failed', message: 'give the car a name.' }
    else state.value = { name: 'failed', message: problems.length === 1 ? 'one value needs another look.' : 'some values need another look.' }
  }

  async function add(car: Car): Promise<void> {
    await keeper?.flush()
    open({ ...car, version: null })
    keeper!.typed(car)
    await keeper!.flush()
    history.replaceState(history.state, '', `/my-car?car=${car.id}`)
  }
  const names = () => cars.value.map(({ name }) => name)
  const addNew = () => add({ ...blank(crypto.randomUUID(), names()) })
  function copy(): Promise<void> {
    const { name, carClass, values } = current.value
    return add({ id: crypto.randomUUID(), name: freeName(name, 'copy', names()), carClass, values: { ...values } })
  }

  async function choose(): Promise<void> {
    await keeper?.flush()
    const { id } = current.value
    if (!member) keepCars({ ...keptCars(), chosen: id })
    else {
      const answer = await chooseAccountCar(id)
      if (answer.kind !== 'saved') {
        state.value = { name: 'failed', message: 'your account cannot be reached. Try again in a moment.' }
        return
      }
    }
    chosen.value = id
  }

  async function remove(): Promise<void> {
    await keeper?.flush()
    const gone = current.value
    if (member && gone.version !== null) {
      const problem = await deleteAccountCar(gone.id, gone.version)
      if (problem !== null) {
        state.value = { name: 'failed', message: problem.kind === 'stale' ? 'it was changed on another device. Load the page again first.' : 'your account cannot be reached.' }
        return
      }
    }
    const kept = keptCars(memberId)
    const left = kept.cars.filter(({ id }) => id !== gone.id)
    keepCars({ cars: left, chosen: left.some(({ id }) => id === kept.chosen) ? kept.chosen : (left[0]?.id ?? null) }, memberId)
    cars.value = cars.value.filter(({ id }) => id !== gone.id)
    if (chosen.value === gone.id) chosen.value = member ? (await listAccountCars())?.find((car) => car.chosen)?.id ?? null : keptCars().chosen
    deleted.value = gone
    open(cars.value.find(({ id }) => id === chosen.value) ?? cars.value[0] ?? blank(crypto.randomUUID(), []))
    history.replaceState(history.state, '', '/my-car')
  }
  async function bringBack(): Promise<void> {
    const { name, ...car } = deleted.value!
    deleted.value = null
    await add({ ...car, name: freeName(name, 'again', names()) })
  }

  const ports: Parameters<typeof createCarKeeper>[1] = {
    member,
    create: createAccountCar,
    save: saveAccountCar,
    list: listAccountCars,
    browser: {
      put: (car, base) => putKeptCar({ id: car.id, name: car.name, carClass: car.carClass, values: { ...car.values }, ...(member && { owner: memberId }), ...(base && { base }) }),
      letGo: (sent) => letGo(sent, memberId),
    },
    later(milliseconds, run) {
      const timer = setTimeout(run, milliseconds)
      return () => clearTimeout(timer)
    },
  }

  async function takeOver(): Promise<void> {
    const before = keptCars(memberId).cars
    if (memberId === null || before.length === 0) return
    const merged = await handOverCars(memberId)
    const left = keptCars(memberId).cars.filter(({ id }) => before.some((car) => car.id === id)).map(({ name }) => name)
    handedOver.value = { taken: before.length - left.length, left }
    if (merged === null) return
    const untouched = current.value.isNew && Object.keys(draft.texts).length === 0
    takeAccount(merged, untouched ? (merged.find((car) => car.chosen)?.id ?? null) : current.value.id)
  }
  /** The account's cars as they are now, and which of them to show. */
  function takeAccount(account: readonly CarView[], openId: string | null): void {
    const before = current.value
    cars.value = account.map(listed)
    chosen.value = account.find((car) => car.chosen)?.id ?? null
    const next = cars.value.find(({ id }) => id === openId)
    if (next === undefined) return
    // What is on its way goes on; the version that the account has now is met when it is saved.
    if (next.id !== before.id) open(next)
    else if (state.value.name === 'saved') open(next, before)
  }
  /** Comes back as it was left, perhaps hours ago: what the account has by now counts where nothing is being typed. */
  async function comeBack(): Promise<void> {
    if (!member) {
      takeKept()
      return
    }
    await takeOver()
    const account = await listAccountCars()
    if (account !== null) takeAccount(account, current.value.id)
  }

  /** A visitor's cars, at the start and when another tab has changed them. */
  function takeKept(): void {
    const kept = keptCars()
    cars.value = kept.cars.map((car) => ({ ...car, version: null }))
    chosen.value = kept.chosen
    const next = cars.value.find(({ id }) => id === (alive.value ? current.value.id : (asked ?? kept.chosen))) ?? cars.value.find(({ id }) => id === kept.chosen)
    if (next !== undefined) open(next, alive.value && next.id === current.value.id ? current.value : undefined)
  }
  const otherTab = ({ key }: StorageEvent) => {
    if (key === KEPT_CARS && !member) takeKept()
  }
  const leave = () => {
    keeper?.leave()
    void keeper?.flush(true)
  }
  const hidden = () => document.visibilityState === 'hidden' && leave()

  const shownAgain = ({ persisted }: PageTransitionEvent) => {
    if (persisted) void comeBack()
  }

  onMounted(() => {
    open(current.value)
    if (!member) takeKept()
    typeAgain()
    choices.load()
    alive.value = true
    if (member) void takeOver()
    addEventListener('storage', otherTab)
    addEventListener('pageshow', shownAgain)
    addEventListener('pagehide', leave)
    document.addEventListener('visibilitychange', hidden)
  })
  onBeforeUnmount(() => {
    keeper?.stop()
    removeEventListener('storage', otherTab)
    removeEventListener('pageshow', shownAgain)
    removeEventListener('pagehide', leave)
    document.removeEventListener('visibilitychange', hidden)
  })
  // Readable fields follow a change of units; what cannot be read stays as it was typed.
  watch(units, (now) => Object.assign(draft.texts, draftTexts(draft.values, now)))

  return {
    alive, units, cars, chosen, current, draft, state, reading, full, deleted, handedOver, member,
    show, type, rename, classify, addNew, copy, choose, remove, bringBack,
    flush: () => keeper?.flush(),
    /** The name that another car begins with. */
    nextName: computed(() => blank('', names()).name),
    ask: (theirs: CarView) => keeper?.ask(theirs),
    settle: (theirs: CarView, side: 'mine' | 'theirs') => keeper?.settle(theirs, side),
  }
}

function listed({ id, name, carClass, values, version }: Car & { version: number | null }): Listed {
  return { id, name, carClass, values, version }
}

function blank(id: string, names: readonly string[]): Listed {
  const name = names.length === 0 ? 'My car' : freeName(`Car ${names.length + 1}`, 'new', names)
  return { id, name, carClass: null, values: {}, version: null, isNew: true }
}
