// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { Car } from '#shared/cars/car.ts'
import { handOverCars } from './hand-over.ts'
import { keptCars, putKeptCar } from './kept-cars.ts'

const car = (id: string, values: Car['values'], name = 'Kestrel'): Car => ({ id, name, carClass: null, values })
const base = { name: 'Kestrel', carClass: null, values: { mass: 3, wheelbase: 325 }, version: 4 }

/** An account that answers by method and path, and what it was asked. */
function account(answers: Record<string, [status: number, body?: object][]>) {
  const asked: string[] = []
  vi.stubGlobal('fetch', async (url: string, { method = 'GET', headers = {}, body }: { method?: string; headers?: Record<string, string>; body?: string } = {}) => {
    const { name, values, cars } = JSON.parse(body ?? '{}') as { name?: string; values?: object; cars?: Car[] }
    asked.push([method, url, headers['If-Match'], name, values && JSON.stringify(values), cars?.map(({ id }) => id)].filter(Boolean).join(' '))
    const [status, answer = {}] = answers[`${method} ${url}`]!.shift()!
    return new Response(JSON.stringify(answer), { status })
  })
  return asked
}

beforeEach(() => localStorage.clear())
afterEach(() => vi.unstubAllGlobals())

describe('what was changed while the account was away', () => {
  it('is saved over the version it was changed from: a new name, a cleared value, a changed one', async () => {
    putKeptCar({ ...car('a', { mass: 3.6 }, 'Club car'), owner: 'priya', base })
    const asked = account({ 'PUT /api/cars/a': [[200]], 'GET /api/cars': [[200, []]] })
    expect(await handOverCars('priya')).toEqual([])
    expect(asked[0]).toBe('PUT /api/cars/a "4" Club car {"mass":3.6}')
    expect(keptCars('priya').cars).toEqual([])
  })

  it('is put together with what another device changed meanwhile', async () => {
    putKeptCar({ ...car('a', { mass: 3.6 }), owner: 'priya', base })
    const theirs = { ...car('a', { mass: 3, wheelbase: 325, cgHeight: 45 }, 'Club car'), version: 5 }
    const asked = account({ 'PUT /api/cars/a': [[412], [200]], 'GET /api/cars': [[200, [theirs]], [200, []]] })
    await handOverCars('priya')
    expect(asked[2]).toBe('PUT /api/cars/a "5" Club car {"mass":3.6,"cgHeight":45}')
    expect(keptCars('priya').cars).toEqual([])
  })

  it.each<[string, number]>([['both changed the same value', 412], ['it was deleted elsewhere', 404]])('is merged where %s', async (_why, status) => {
    putKeptCar({ ...car('a', { mass: 3.6 }), owner: 'priya', base })
    const theirs = { ...car('a', { mass: 3.2 }), version: 5 }
    const asked = account({ 'PUT /api/cars/a': [[status]], 'GET /api/cars': [[200, [theirs]]], 'POST /api/cars/merge': [[200, { cars: [], held: ['a'] }]] })
    await handOverCars('priya')
    expect(asked.at(-1)).toBe('POST /api/cars/merge a')
    expect(keptCars('priya').cars).toEqual([])
  })

  it('stays in the browser while the account is still away', async () => {
    putKeptCar({ ...car('a', { mass: 3.6 }), owner: 'priya', base })
    account({ 'PUT /api/cars/a': [[503]] })
    expect(await handOverCars('priya')).toBeNull()
    expect(keptCars('priya').cars).toHaveLength(1)
  })
})

it('takes one’s own cars and those that nobody signed in for, never another member’s', async () => {
  putKeptCar({ ...car('a', { mass: 3.6 }), owner: 'priya' })
  putKeptCar(car('b', { mass: 1.6 }))
  const asked = account({ 'POST /api/cars/merge': [[200, { cars: [], held: ['b'] }]] })
  await handOverCars('odile')
  expect(asked).toEqual(['POST /api/cars/merge b'])
  expect(keptCars('priya').cars.map(({ id }) => id)).toEqual(['a'])
})
