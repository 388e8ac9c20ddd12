import { expect, it } from 'vitest'
import type { Car } from '#shared/cars/car.ts'
import { draftOf, followCar, typeInto } from './car-draft.ts'

const car = (values: Car['values'], more: Partial<Car> = {}): Car => ({ id: 'a', name: 'Kestrel', carClass: null, values, ...more })

it('follows what another tab made of the car, but keeps what is half typed, changed or being typed here', () => {
  const before = car({ mass: 3, wheelbase: 325, tyreDiameter: 115, cgHeight: 45, trackFront: 250 })
  const draft = draftOf(before, {})
  typeInto(draft, 'wheelbase', '3/', {})
  typeInto(draft, 'tyreDiameter', '114', {})
  const after = car({ mass: 3.2, wheelbase: 320, tyreDiameter: 110, cgHeight: 40, trackRear: 255 }, { name: 'Club car', carClass: 'buggy_8e' })
  followCar(draft, { before, after, units: {}, typing: 'cgHeight' })
  expect(draft.texts).toMatchObject({ mass: '3.2', wheelbase: '3/', tyreDiameter: '114', cgHeight: '45', trackFront: '', trackRear: '255' })
  expect(draft.values).toEqual({ mass: 3.2, tyreDiameter: 114, cgHeight: 45, trackRear: 255 })
  expect(draft).toMatchObject({ name: 'Club car', carClass: 'buggy_8e' })
  expect(draft.problems.map(({ key }) => key)).toEqual(['wheelbase'])
})

it('leaves a name alone that is being changed, and writes in the units of the reader', () => {
  const before = car({ wheelbase: 325 })
  const draft = { ...draftOf(before, { length: 'in' }), name: 'Kest' }
  followCar(draft, { before, after: car({ wheelbase: 254 }, { name: 'Club car' }), units: { length: 'in' } })
  expect(draft).toMatchObject({ name: 'Kest', texts: { wheelbase: '10' } })
})
