export { useMyCar }

import { computed, ref, watch, type Ref } from 'vue'
import { endsOf } from '#shared/calculators/ends.ts'
import { carKeyOf, endOf, fromCar } from './car-inputs.ts'
import { startValues, type FieldState } from './field-state.ts'
import { useReaderChoices } from './reader-choices.ts'
import type { CarEnd } from '#shared/cars/car-ends.ts'
import type { CarKey } from '#shared/cars/car-values.ts'
import type { CalculatorDefinition, CalculatorInput } from '#shared/calculators/definition.ts'
import type { InstrumentProps } from './instrument-props.ts'

interface Ports {
  definition: CalculatorDefinition
  props: InstrumentProps
  alive: Readonly<Ref<boolean>>
  fields: Readonly<Record<string, FieldState>>
  /** Fills in a field; `own` when it is the reader's own doing. */
  put(input: CalculatorInput, value: number, own?: true): void
}

/**
 * What the reader's car has to do with one instrument: it fills fields in, at the end of the car that is asked about, and
 * what is changed in one instrument is changed in every other on the page that asks for the same value.
 */
function useMyCar({ definition, props, alive, fields, put }: Ports) {
  const store = useReaderChoices()
  const { inputs } = definition
  const ends = endsOf(definition)
  const end = ref(endOf(definition, props))
  // Until it is alive an instrument shows what the server knew, so that what hydrates is what was rendered.
  const car = computed(() => props.car ?? (alive.value ? store.car : undefined))
  const wanted = ref(true)
  const heard = new Map<CarKey, number>()

  const says = (input: CalculatorInput) => fromCar(input, { car: car.value, end: end.value })
  const fromMyCar = (key: string): boolean => {
    const input = inputs.find((each) => each.key === key)
    const value = input && says(input)
    return value !== undefined && fields[key]?.value === value
  }
  const guideValues = () => startValues(definition, { preset: props.preset })
  /** How many values the calculator asks a car for, how many of those the car has, and how many stand in the fields. */
  const carCount = computed(() => {
    const asked = inputs.filter((input) => carKeyOf(input, end.value) !== undefined)
    return {
      asked: asked.length,
      known: asked.filter((input) => says(input) !== undefined).length,
      used: asked.filter(({ key }) => fromMyCar(key)).length,
    }
  })
  /** The first value that the car still lacks. */
  const missing = computed(() =>
    inputs.filter((input) => says(input) === undefined).flatMap((input) => carKeyOf(input, end.value) ?? [])[0],
  )

  function fillIn(which: (input: CalculatorInput) => boolean): void {
    for (const input of inputs) {
      const value = says(input)
      if (value !== undefined && which(input)) put(input, value)
    }
  }
  function useGuideValues(): void {
    wanted.value = false
    const start = guideValues()
    for (const input of inputs) put(input, start[input.key] ?? input.default)
  }
  function useCarValues(): void {
    wanted.value = true
    fillIn(() => true)
  }
  /** Turns to the other end of the car: fields that one end's values stood in get the other's, or the guide's. */
  function chooseEnd(next: CarEnd): void {
    const start = guideValues()
    const turning = inputs.filter(
      (input) => typeof input.carKey === 'object' && (!fields[input.key]?.own || fromMyCar(input.key)),
    )
    end.value = next
    for (const input of turning) put(input, (wanted.value ? says(input) : undefined) ?? start[input.key] ?? input.default)
  }

  /** Passes on what the reader changed. */
  function tell(input: CalculatorInput, value: number): void {
    const key = carKeyOf(input, end.value)
    if (key !== undefined) heard.set(key, store.change(key, value))
  }
  function hear(which: (input: CalculatorInput) => boolean): void {
    for (const input of inputs) {
      const key = carKeyOf(input, end.value)
      const change = key === undefined ? undefined : store.changed[key]
      if (key === undefined || change === undefined || (heard.get(key) ?? 0) >= change.at || !which(input)) continue
      put(input, change.value, true)
    }
    for (const [key, change] of Object.entries(store.changed)) heard.set(key as CarKey, change.at)
  }
  watch(() => store.changes, () => alive.value && hear(() => true), { flush: 'sync' })
  // A visitor's car comes after mounting, and may be changed in another tab; it never replaces what is the reader's own.
  const untouched = ({ key }: CalculatorInput) => !fields[key]?.own
  watch(car, () => wanted.value && alive.value && fillIn(untouched), { flush: 'sync' })
  /** The page is alive: takes up the car and what was changed in other instruments before this one came to life. */
  function arrive(): void {
    if (props.car === undefined) fillIn(untouched)
    hear(untouched)
  }

  return { car, end, ends, carCount, missing, chooseEnd, useGuideValues, useCarValues, fromMyCar, tell, arrive }
}
