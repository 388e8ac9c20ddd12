// @vitest-environment jsdom
import { createPinia, type Pinia } from 'pinia'
import { beforeEach, describe, expect, it } from 'vitest'
import { createApp, h, nextTick } from 'vue'
import CarTape from './CarTape.vue'
import { defineCalculator, type CalculatorDefinition } from '#shared/calculators/definition.ts'
import { say } from '#shared/calculators/sentence.ts'
import type { InstrumentProps } from '../calculators/instrument-props.ts'
import { useInstrument, type Instrument } from '../calculators/use-instrument.ts'
import { keepCars } from './kept-cars.ts'

const range = { min: 0, max: 1000, reason: 'it is a test' }
const definition = defineCalculator({
  slug: 'bar', title: 'Bar', purpose: '', part: 'bench', keywords: [],
  inputs: [
    { key: 'bar', label: 'Bar', unit: 'mm', default: 2.4, carKey: { front: 'frontBarDiameter', rear: 'rearBarDiameter' }, ...range },
    { key: 'mass', label: 'Mass', unit: 'kg', default: 3.6, carKey: 'mass', ...range },
    { key: 'other', label: 'Other', unit: '1', default: 7, ...range },
  ],
  outputs: [{ key: 'sum', label: 'Sum', unit: '1', digits: 3 }],
  compute: ({ bar, mass, other }) => ({ sum: bar + mass + other }),
  warnings: () => [], answer: () => ({ says: say`Yes.`, more: [] }), working: () => ({ steps: [], symbols: [] }),
  limits: { goodBetween: '', howClose: '' }, sources: [], cautions: [],
}) as CalculatorDefinition

const car = { id: 'c', name: 'Kestrel 8e', values: { frontBarDiameter: 2.2, rearBarDiameter: 2.6, mass: 3.4 } }

function mount(props: Partial<InstrumentProps> = {}, pinia: Pinia = createPinia()): { instrument: Instrument; root: HTMLElement } {
  let instrument: Instrument | undefined
  const root = document.createElement('div')
  const app = createApp({
    setup() {
      instrument = useInstrument(definition, { slug: 'bar', instanceId: 'bar', action: '/here', ...props })
      return () => h(CarTape, { instrument: instrument! })
    },
  })
  app.use(pinia).mount(root)
  return { instrument: instrument!, root }
}
const values = ({ fields }: Instrument) => fields.value.map(({ state }) => state.value)
const input = (key: string) => definition.inputs.find((each) => each.key === key)!
const text = (root: HTMLElement) => root.textContent?.replaceAll(/\s+/g, ' ').trim()

beforeEach(() => localStorage.clear())

describe('an instrument and the reader’s car', () => {
  it('without a car leads to where one is entered', () => {
    const { root } = mount()
    expect(text(root)).toBe('Use my car’s values')
    expect(root.querySelector('a')?.getAttribute('href')).toBe('/my-car#value-frontBarDiameter')
  })

  it('starts from the account’s car at the end the guide is about, and goes back and forth', async () => {
    const { instrument, root } = mount({ car, end: 'rear', preset: { mass: 3 } })
    expect(values(instrument)).toEqual([2.6, 3.4, 7])
    expect(text(root)).toContain('From my car')
    expect(instrument.fromMyCar('bar')).toBe(true)
    expect(instrument.fromMyCar('other')).toBe(false)
    instrument.useGuideValues()
    await nextTick()
    expect(values(instrument)).toEqual([2.4, 3, 7])
    expect(text(root)).toContain('My car’s values')
    instrument.useCarValues()
    expect(values(instrument)).toEqual([2.6, 3.4, 7])
  })

  it('turns to the other end, where the guide’s value stands in for what the car lacks', () => {
    const { instrument } = mount({ car: { ...car, values: { frontBarDiameter: 2.2 } } })
    expect(values(instrument)).toEqual([2.2, 3.6, 7])
    instrument.chooseEnd('rear')
    expect(values(instrument)).toEqual([2.4, 3.6, 7])
    instrument.set(input('bar'), 3)
    instrument.chooseEnd('front')
    expect(values(instrument)).toEqual([3, 3.6, 7])
  })

  it('takes a visitor’s car from the browser, but not over what the link or the reader says', () => {
    keepCars({ cars: [{ ...car, carClass: null }], chosen: 'c' })
    expect(values(mount().instrument)).toEqual([2.2, 3.4, 7])
    expect(values(mount({ values: { mass: '5' } }).instrument)).toEqual([2.2, 5, 7])
  })

  it('says how many values it has from the car, and leads to the first that is missing', async () => {
    const { root } = mount({ car: { ...car, values: { mass: 3.4 } } })
    expect(text(root)).toContain('1 of 2 from my car')
    expect(root.querySelector('.ct-car')?.getAttribute('href')).toBe('/my-car?car=c#value-frontBarDiameter')
  })
})

describe('instruments of one page', () => {
  it('follow a change of the same value, at the same end only, and one that comes later too', () => {
    const pinia = createPinia()
    const one = mount({ instanceId: 'one', end: 'front' }, pinia).instrument
    const two = mount({ instanceId: 'two', end: 'front' }, pinia).instrument
    const rear = mount({ instanceId: 'three', end: 'rear' }, pinia).instrument
    one.type(input('bar'), '2,9')
    expect([values(two)[0], values(rear)[0]]).toEqual([2.9, 2.4])
    two.setMany({ bar: 1, mass: 2 })
    expect(values(one)).toEqual([1, 2, 7])
    expect(values(rear)).toEqual([2.4, 2, 7])
    expect(values(mount({ instanceId: 'four' }, pinia).instrument)).toEqual([1, 2, 7])
    two.type(input('mass'), 'heavy')
    expect(values(one)[1]).toBe(2)
  })

  it('are not changed by another one’s start or way back', () => {
    const pinia = createPinia()
    const one = mount({ instanceId: 'one', car, preset: { mass: 3 } }, pinia).instrument
    const two = mount({ instanceId: 'two', car }, pinia).instrument
    one.useGuideValues()
    expect(values(two)).toEqual([2.2, 3.4, 7])
  })
})
