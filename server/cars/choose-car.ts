export { chooseCar, markChosen }

import { and, eq, ne } from 'drizzle-orm'
import type { ServiceContext, SignedIn } from '../context.ts'
import { cars } from '../db/schema/index.ts'
import { requirePermission } from '../people/permissions.ts'
import type { CarView } from '#shared/schemas/car.ts'
import { carView, lockCars, ownCar } from './car-rows.ts'

/** Lets calculators start from this car from now on. Its version stays: nothing about the car has changed. */
async function chooseCar(ctx: ServiceContext, { id }: { id: string }): Promise<CarView> {
  const { actor } = ctx
  requirePermission(actor, 'car.keep')
  await ctx.rateLimits.take('car', actor.id)
  return ctx.db.transaction(async (db) => {
    await lockCars({ db }, actor)
    const { id: known } = await ownCar({ db }, actor, id)
    await markChosen({ db }, actor, known)
    return carView(await ownCar({ db }, actor, known))
  })
}

/** One after the other: the index that allows one chosen car looks at every row as it changes. */
async function markChosen({ db }: Pick<ServiceContext, 'db'>, owner: Pick<SignedIn, 'id'>, id: string): Promise<void> {
  const mine = eq(cars.memberId, owner.id)
  await db.update(cars).set({ chosen: false }).where(and(mine, eq(cars.chosen, true), ne(cars.id, id)))
  await db.update(cars).set({ chosen: true }).where(and(mine, eq(cars.id, id)))
}
