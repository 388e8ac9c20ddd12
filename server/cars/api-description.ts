export { carsDescription }

import { z } from 'zod'
import type { ApiDescription, ApiOperation } from '../http/openapi/describe.ts'
import { CarFields, CarsToMerge, CarView, MergedCars, NewCar } from '#shared/schemas/car.ts'

const params = { id: z.uuid() }
const HIDDEN = 'There is no such car among one’s own.'
const mine = { who: 'members', limited: true } satisfies Partial<ApiOperation>
const sent = { says: 'The car as it is now.', body: CarView, headers: ['ETag'] } satisfies ApiOperation['answers'][number]

const carsDescription: ApiDescription = {
  name: 'Cars',
  about: 'One’s own cars, whose values calculators start from. Nobody sees another’s.',
  answers: { Car: CarView, MergedCars },
  inputs: { CarFields, NewCar, CarsToMerge },
  operations: {
    'GET /cars': {
      id: 'listCars',
      summary: 'One’s own cars, in the order in which they were made.',
      who: 'members',
      answers: { 200: { says: 'All of them; the chosen one says so.', body: z.array(CarView) } },
    },
    'POST /cars': {
      ...mine,
      id: 'createCar',
      summary: 'Takes a car in, under a UUID that the sender made.',
      once: true,
      body: NewCar,
      answers: {
        200: { ...sent, says: 'The same car was there already.', headers: ['ETag', 'Location'] },
        201: { ...sent, says: 'The car.', headers: ['ETag', 'Location'] },
      },
      problems: { 409: 'The id stands for another car (`car_exists`), or there is no room (`too_many_cars`).' },
    },
    'POST /cars/merge': {
      ...mine,
      id: 'mergeCars',
      summary: 'Brings the cars that a browser kept into the account. Doing it again changes nothing.',
      once: true,
      body: CarsToMerge,
      answers: { 200: { says: 'The account’s cars, and which of the sent ones it now holds.', body: MergedCars } },
    },
    'PUT /cars/:id': {
      ...mine,
      id: 'saveCar',
      summary: 'Puts name, class and values in place of what was kept.',
      params,
      ifMatch: true,
      body: CarFields,
      answers: { 200: sent },
      problems: { 404: HIDDEN },
    },
    'DELETE /cars/:id': {
      ...mine,
      id: 'deleteCar',
      summary: 'Deletes a car for good.',
      params,
      ifMatch: true,
      answers: { 204: { says: 'It is gone.' } },
      problems: { 404: HIDDEN },
    },
    'POST /cars/:id/choose': {
      ...mine,
      id: 'chooseCar',
      summary: 'Lets calculators start from this car.',
      params,
      once: true,
      answers: { 200: sent },
      problems: { 404: HIDDEN },
    },
  },
}
