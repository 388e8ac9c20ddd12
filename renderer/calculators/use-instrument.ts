export { useInstrument }
export type { Instrument, InstrumentField }

import { computed, inject, onMounted, reactive, ref, watch } from 'vue'
import { checkEach } from '#shared/calculators/check-inputs.ts'
import { runDefinition, type CalculatorRun } from '#shared/calculators/run-definition.ts'
import { nextStep } from '#shared/calculators/steps.ts'
import { typedValue } from '#shared/calculators/typed-inputs.ts'
import { unitChoicesFrom, unitFor, unitGroupsOf, type UnitGroupKey } from '#shared/units/unit-choices.ts'
import { typeAgainKey } from '../islands/typed-before.ts'
import { endOf } from './car-inputs.ts'
import { fieldText, startField, startValues, type FieldState } from './field-state.ts'
import { useReaderChoices } from './reader-choices.ts'
import { useMyCar } from './use-my-car.ts'
import type { CalculatorDefinition, CalculatorInput } from '#shared/calculators/definition.ts'
import type { Sentence } from '#shared/calculators/sentence.ts'
import type { UnitId } from '#shared/units/units.ts'
import type { InstrumentProps } from './instrument-props.ts'

type Instrument = ReturnType<typeof useInstrument>

interface InstrumentField {
  input: CalculatorInput
  state: FieldState
  unit: UnitId
  error: Sentence | undefined
  warning: Sentence | undefined
  /**
   * Where minus and plus go, in the input's unit; undefined at the end of the range or without a readable
   * value.
   */
  down: number | undefined
  up: number | undefined
}

/**
 * The life of one instrument: what is typed, in which units, and what comes of it. The first state comes from
 * the props alone, so that server and browser begin alike; only then does the reader's kept choice of units
 * come in.
 */
function useInstrument(definition: CalculatorDefinition, props: InstrumentProps) {
  const store = useReaderChoices()
  const startUnits = { ...props.units, ...unitChoicesFrom(groupParameters(props, 'unit.')) }
  const typedIn = unitChoicesFrom(groupParameters(props, 'in.'))
  const alive = ref(false)
  const units = computed(() => (alive.value ? { ...startUnits, ...store.units } : startUnits))

  const fields = reactive<Record<string, FieldState>>({})
  const at = { ...props, end: endOf(definition, props) }
  for (const input of definition.inputs) fields[input.key] = startField(input, at, typedIn, startUnits)

  const typedErrors = computed(() =>
    definition.inputs.flatMap(({ key }) => {
      const error = fields[key]?.error
      return error === undefined ? [] : [{ field: key, message: error }]
    }),
  )
  const values = computed(() =>
    Object.fromEntries(
      definition.inputs.flatMap(({ key }) =>
        fields[key]?.value === undefined ? [] : [[key, fields[key].value]],
      ),
    ),
  )
  const run = computed<CalculatorRun>(() =>
    typedErrors.value.length === 0
      ? runDefinition(definition, values.value)
      : { ok: false, errors: [...typedErrors.value, ...checkEach(definition, values.value)] },
  )
  // While there is no answer, the plot keeps showing the last one's lines; at the very start, those of the
  // guide's values.
  const lastGood = computed<CalculatorRun>((last) =>
    run.value.ok ? run.value : (last ?? runDefinition(definition, startValues(definition, props))),
  )

  const put = (input: CalculatorInput, value: number, own?: true) => {
    fields[input.key] = { text: fieldText(value, input, units.value), value, ...(own && { own }) }
  }
  const myCar = useMyCar({ definition, props, alive, fields, put })

  function type(input: CalculatorInput, text: string) {
    const typed = typedValue(input, text, unitFor(input.unit, units.value))
    fields[input.key] = { text, own: true, ...typed }
    if ('value' in typed) myCar.tell(input, typed.value)
  }
  function set(input: CalculatorInput, value: number) {
    put(input, value, true)
    myCar.tell(input, value)
  }
  /** Several at once, by key: what dragging a point moves. */
  function setMany(values: Readonly<Record<string, number>>) {
    for (const input of definition.inputs) {
      const value = values[input.key]
      if (value !== undefined) set(input, value)
    }
  }
  function chooseUnit(group: UnitGroupKey, unit: UnitId) {
    store.chooseUnit(group, unit)
  }
  // A change of units rewrites the readable fields; their exact values stay, so going there and back loses
  // nothing.
  watch(
    units,
    (now, before) => {
      for (const input of definition.inputs) {
        const field = fields[input.key]
        if (field?.value === undefined || unitFor(input.unit, now) === unitFor(input.unit, before)) continue
        put(input, field.value, field.own)
      }
    },
    { flush: 'sync' },
  )

  const shown = computed(() =>
    definition.inputs.map((input): InstrumentField => {
      const state = fields[input.key] ?? { text: '' }
      const unit = unitFor(input.unit, units.value)
      const step = (direction: 'up' | 'down') =>
        state.value === undefined ? undefined : nextStep(input, state.value, direction, unit)
      return {
        input,
        state,
        unit,
        down: step('down'),
        up: step('up'),
        error: run.value.ok ? undefined : run.value.errors.find(({ field }) => field === input.key)?.message,
        warning: run.value.ok
          ? run.value.warnings.find(({ field }) => field === input.key)?.message
          : undefined,
      }
    }),
  )

  const typeAgain = inject(typeAgainKey, undefined)
  onMounted(() => {
    typeAgain?.()
    alive.value = true
    store.load()
    myCar.arrive()
  })

  const groups = unitGroupsOf(
    [...definition.inputs, ...definition.outputs.filter(({ fixedUnit }) => !fixedUnit)].map(
      ({ unit }) => unit,
    ),
  )
  return {
    alive, units, groups, fields: shown, run, lastGood, type, set, setMany, chooseUnit,
    /** Back to the values of the guide, whatever the car says. */
    reset: myCar.useGuideValues,
    definition, props,
    ...myCar,
  }
}

function groupParameters({ values = {} }: InstrumentProps, prefix: string): Record<string, string> {
  return Object.fromEntries(
    Object.entries(values).flatMap(([name, value]) =>
      name.startsWith(prefix) ? [[name.slice(prefix.length), value]] : [],
    ),
  )
}
