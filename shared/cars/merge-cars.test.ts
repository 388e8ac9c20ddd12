import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { CARS_AT_MOST, sameName, type Car } from './car.ts'
import type { CarValues } from './car-values.ts'
import { mergeCars } from './merge-cars.ts'

const copyId = ({ id, name, values, carClass }: Car) => `copy of ${id} ${name} ${carClass} ${JSON.stringify(Object.entries(values).sort())}`
const car = (id: string, values: CarValues, more: Partial<Car> = {}): Car => ({ id, name: `Car ${id}`, carClass: null, values, ...more })

describe('merging a browser’s cars into an account', () => {
  it('brings in what the account does not have', () => {
    const mine = car('a', { mass: 3.6 })
    expect(mergeCars([], [mine], copyId)).toEqual({ cars: [mine], held: ['a'] })
  })

  it('does nothing where both say the same', () => {
    const both = car('a', { mass: 3.6, wheelbase: 325 })
    expect(mergeCars([both], [both], copyId)).toEqual({ cars: [both], held: ['a'] })
  })

  it('fills the gaps of the same car', () => {
    const { cars } = mergeCars([car('a', { mass: 3.6 })], [car('a', { mass: 3.6, wheelbase: 325 }, { carClass: 'buggy_8e' })], copyId)
    expect(cars).toEqual([car('a', { mass: 3.6, wheelbase: 325 }, { carClass: 'buggy_8e' })])
  })

  it('keeps the account’s and adds the browser’s where they contradict', () => {
    const account = car('a', { mass: 3.6 }, { name: 'Kestrel 8e' })
    const { cars, held } = mergeCars([account], [car('a', { mass: 3.4, wheelbase: 325 }, { name: 'Kestrel 8e' })], copyId)
    expect(cars[0]).toEqual(account)
    expect(cars[1]).toMatchObject({ name: 'Kestrel 8e (from this browser)', values: { mass: 3.4, wheelbase: 325 } })
    expect(held).toEqual(['a'])
  })

  it('never takes a renamed car for held: it comes in beside the other, under its own name', () => {
    const account = car('a', { mass: 3.6 }, { name: 'Kestrel 8e' })
    const renamed = car('a', { mass: 3.6 }, { name: 'Club car' })
    const { cars, held } = mergeCars([account], [renamed], copyId)
    expect(cars.map(({ name }) => name)).toEqual(['Kestrel 8e', 'Club car'])
    expect(held).toEqual(['a'])
  })

  it('adds a second car where the two together could not be one', () => {
    const { cars } = mergeCars([car('a', { tyreDiameter: 80 })], [car('a', { rimDiameter: 90 })], copyId)
    expect(cars.map(({ values }) => values)).toEqual([{ tyreDiameter: 80 }, { rimDiameter: 90 }])
  })

  it('gives a car of another make a name of its own', () => {
    const { cars } = mergeCars([car('a', { mass: 3 }, { name: 'My car' })], [car('b', { mass: 1.6 }, { name: 'my CAR' })], copyId)
    expect(cars[1]?.name).toBe('my CAR (from this browser)')
  })

  it('leaves with the browser what has no room, and says which', () => {
    const full = Array.from({ length: CARS_AT_MOST }, (_, n) => car(`${n}`, {}))
    const { cars, held } = mergeCars(full, [car('new', { mass: 3 }), car('3', { mass: 3 })], copyId)
    expect(cars).toHaveLength(CARS_AT_MOST)
    expect(held).toEqual(['3'])
  })
})

const values = fc.record(
  { mass: fc.constantFrom(3, 4), wheelbase: fc.constantFrom(300, 325), tyreDiameter: fc.constantFrom(80, 115), rimDiameter: fc.constantFrom(70, 90) },
  { requiredKeys: [] },
)
const fits = ({ tyreDiameter = 999, rimDiameter = 0 }: CarValues) => tyreDiameter > rimDiameter
const someCar = fc.record({
  id: fc.constantFrom('a', 'b', 'c', 'd'),
  name: fc.constantFrom('Kestrel', 'kestrel', 'Old one'),
  carClass: fc.constantFrom<Car['carClass']>(null, 'buggy_8e', 'truggy_8'),
  values: values.filter(fits),
})
const byId = { selector: ({ id }: Car) => id, maxLength: 4 }
const account = fc.uniqueArray(someCar, byId).map((cars) => cars.filter(({ name }, n) => !cars.slice(0, n).some((other) => sameName(other.name, name))))
const browser = fc.uniqueArray(someCar, byId)
const contains = (whole: Car, part: Car) => Object.entries(part.values).every(([key, value]) => whole.values[key as 'mass'] === value)

describe('whatever is merged', () => {
  it('loses no number of either side', () => {
    fc.assert(
      fc.property(account, browser, (mine, theirs) => {
        const { cars, held } = mergeCars(mine, theirs, copyId)
        for (const each of mine) expect(cars.some((after) => after.id === each.id && after.name === each.name && contains(after, each))).toBe(true)
        for (const each of theirs) {
          expect(held).toContain(each.id)
          expect(cars.some((after) => contains(after, each) && (each.carClass === null || after.carClass === each.carClass))).toBe(true)
        }
      }),
    )
  })

  it('changes nothing the second time', () => {
    fc.assert(
      fc.property(account, browser, (mine, theirs) => {
        const once = mergeCars(mine, theirs, copyId)
        expect(mergeCars(once.cars, theirs, copyId)).toEqual(once)
      }),
    )
  })

  it('makes only cars that can be, each with an id and a name of its own', () => {
    fc.assert(
      fc.property(account, browser, (mine, theirs) => {
        const { cars } = mergeCars(mine, theirs, copyId)
        expect(cars.every((each) => fits(each.values))).toBe(true)
        expect(new Set(cars.map(({ id }) => id)).size).toBe(cars.length)
        expect(cars.some((one, at) => cars.some((other, place) => place > at && sameName(one.name, other.name)))).toBe(false)
      }),
    )
  })
})
