import { afterEach, expect, it, vi } from 'vitest'
import { createAccountCar } from './account-cars.ts'

afterEach(() => vi.unstubAllGlobals())

it.each<[string, number, object, string]>([
  ['the car is there already, its answer having been lost', 409, { code: 'car_exists' }, 'stale'],
  ['there is no room', 409, { code: 'too_many_cars', title: 'Your account keeps 20 cars.' }, 'refused'],
  ['a value cannot be', 422, { code: 'invalid', errors: [{ message: 'No.' }] }, 'refused'],
  ['nobody is signed in', 401, {}, 'signed_out'],
  ['the account is busy', 503, {}, 'away'],
])('tells apart what to do when %s', async (_what, status, body, kind) => {
  vi.stubGlobal('fetch', async () => new Response(JSON.stringify(body), { status }))
  expect((await createAccountCar({ id: 'a', name: 'Kestrel', carClass: null, values: {} })).kind).toBe(kind)
})
