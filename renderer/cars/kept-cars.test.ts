// @vitest-environment jsdom
import { beforeEach, describe, expect, it, vi } from 'vitest'
import type { Car } from '#shared/cars/car.ts'
import { chosenKeptCar, keepCars, keptCars, KEPT_CARS, letGo, putKeptCar } from './kept-cars.ts'

const car = (id: string, mass: number): Car => ({ id, name: `Car ${id}`, carClass: null, values: { mass } })
beforeEach(() => localStorage.clear())

describe('cars in this browser', () => {
  it('chooses the first, and keeps one car in place of what was kept of it', () => {
    putKeptCar(car('a', 3))
    putKeptCar(car('b', 1.6))
    putKeptCar(car('a', 3.1))
    expect(keptCars()).toEqual({ cars: [car('a', 3.1), car('b', 1.6)], chosen: 'a' })
    expect(chosenKeptCar()).toEqual({ id: 'a', name: 'Car a', values: { mass: 3.1 } })
  })

  it('lets go of what is safe elsewhere, but not of what was changed since', () => {
    putKeptCar(car('a', 3))
    putKeptCar(car('b', 1.6))
    letGo([car('a', 3), car('b', 1.5)])
    expect(keptCars()).toEqual({ cars: [car('b', 1.6)], chosen: 'b' })
  })

  it.each(['', 'null', '{', '[]', '{"cars":7}', '{"cars":[null,{"id":1},{"id":"a","name":"b","values":null}]}'])('passes over what it cannot read: %j', (text) => {
    localStorage.setItem(KEPT_CARS, text)
    expect(keptCars()).toEqual({ cars: [], chosen: null })
    expect(chosenKeptCar()).toBeUndefined()
  })

  it('keeps numbers only', () => {
    localStorage.setItem(KEPT_CARS, '{"cars":[{"id":"a","name":"b","values":{"mass":"3","wheelbase":325,"x":null}}],"chosen":"zzz"}')
    expect(chosenKeptCar()?.values).toEqual({ wheelbase: 325 })
  })

  it('shows a member’s cars to nobody else, and lets nobody else write over them', () => {
    const base = { name: 'Car a', carClass: null, values: { mass: 2 }, version: 4 }
    putKeptCar({ ...car('a', 3), owner: 'priya', base })
    putKeptCar(car('b', 1.6))
    expect(keptCars()).toEqual({ cars: [car('b', 1.6)], chosen: 'b' })
    expect(keptCars('odile').cars).toEqual([car('b', 1.6)])
    expect(keptCars('priya')).toEqual({ cars: [{ ...car('a', 3), owner: 'priya', base }, car('b', 1.6)], chosen: 'a' })
    keepCars({ cars: [], chosen: null })
    letGo([car('a', 3)], 'odile')
    expect(keptCars('priya').cars.map(({ id }) => id)).toEqual(['a'])
    letGo([car('a', 3)], 'priya')
    expect(localStorage.getItem(KEPT_CARS)).toBeNull()
  })

  it('says so when the browser keeps nothing', () => {
    const full = vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new DOMException('full', 'QuotaExceededError')
    })
    expect(putKeptCar(car('a', 3))).toBe(false)
    full.mockRestore()
  })
})
