export { createCar }

import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { cars } from '../db/schema/index.ts'
import { ConflictError } from '../errors.ts'
import { requirePermission } from '../people/permissions.ts'
import { CARS_AT_MOST, sameCar } from '#shared/cars/car.ts'
import { NewCar, type CarView } from '#shared/schemas/car.ts'
import { carView, lockCars, ownCars } from './car-rows.ts'
import { requireFreeName } from './names.ts'
import { readCarInput } from './read-input.ts'

/**
 * Takes a car into the account, under the id that was made for it. The first one is chosen. The same car again is only
 * answered.
 * @throws ConflictError (409) `car_exists` when the id stands for another car, `too_many_cars` when there is no room
 */
async function createCar(ctx: ServiceContext, input: z.input<typeof NewCar>): Promise<{ car: CarView; created: boolean }> {
  const { actor } = ctx
  requirePermission(actor, 'car.keep')
  await ctx.rateLimits.take('car', actor.id)
  const car = readCarInput(NewCar, input)
  return ctx.db.transaction(async (db) => {
    await lockCars({ db }, actor)
    const mine = await ownCars({ db }, actor)
    const known = mine.find(({ id }) => id === car.id)
    if (known !== undefined) {
      if (!sameCar(known, car)) throw new ConflictError('car_exists', 'There already is a car with this id. Change it instead.')
      return { car: carView(known), created: false }
    }
    requireFreeName(car.name, mine)
    if (mine.length >= CARS_AT_MOST) {
      throw new ConflictError('too_many_cars', `Your account keeps ${CARS_AT_MOST} cars. Delete one you no longer race, then make this one.`)
    }
    const chosen = !mine.some((other) => other.chosen)
    const [row] = await db.insert(cars).values({ ...car, memberId: actor.id, chosen }).returning()
    return { car: carView(row!), created: true }
  })
}
