export { deleteCar }

import { and, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { cars } from '../db/schema/index.ts'
import { requirePermission } from '../people/permissions.ts'
import { lockCars, ownCar, ownCars } from './car-rows.ts'
import { markChosen } from './choose-car.ts'
import { requireVersion } from './version.ts'

/**
 * Deletes a car for good. If it was the chosen one, the car that was changed last is chosen instead.
 * @throws PreconditionFailedError (412) when it was changed since `version`: what is deleted has been seen
 */
async function deleteCar(ctx: ServiceContext, { id, version }: { id: string; version: number }): Promise<void> {
  const { actor } = ctx
  requirePermission(actor, 'car.keep')
  await ctx.rateLimits.take('car', actor.id)
  await ctx.db.transaction(async (db) => {
    await lockCars({ db }, actor)
    const car = requireVersion(await ownCar({ db }, actor, id), version)
    await db.delete(cars).where(and(eq(cars.memberId, actor.id), eq(cars.id, car.id)))
    const left = await ownCars({ db }, actor)
    const next = left.toSorted((one, other) => Number(other.updatedAt) - Number(one.updatedAt))[0]
    if (car.chosen && next !== undefined) await markChosen({ db }, actor, next.id)
  })
}
