export { saveCar }

import { and, eq, sql } from 'drizzle-orm'
import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { cars } from '../db/schema/index.ts'
import { requirePermission } from '../people/permissions.ts'
import { sameCar } from '#shared/cars/car.ts'
import { CarFields, type CarView } from '#shared/schemas/car.ts'
import { carView, lockCars, ownCar, ownCars } from './car-rows.ts'
import { requireFreeName } from './names.ts'
import { readCarInput } from './read-input.ts'
import { requireVersion } from './version.ts'

/**
 * Puts name, class and values in place of what was kept.
 * @throws PreconditionFailedError (412) when it was saved elsewhere since `version`, with the version it has now
 */
async function saveCar(
  ctx: ServiceContext,
  { id, version, ...input }: { id: string; version: number } & z.input<typeof CarFields>,
): Promise<CarView> {
  const { actor } = ctx
  requirePermission(actor, 'car.keep')
  await ownCar(ctx, actor, id)
  await ctx.rateLimits.take('car', actor.id)
  const fields = readCarInput(CarFields, input)
  return ctx.db.transaction(async (db) => {
    await lockCars({ db }, actor)
    const known = requireVersion(await ownCar({ db }, actor, id), version)
    if (sameCar(known, fields)) return carView(known)
    requireFreeName(fields.name, (await ownCars({ db }, actor)).filter((other) => other.id !== known.id))
    const [row] = await db
      .update(cars)
      .set({ ...fields, version: version + 1, updatedAt: sql`now()` })
      .where(and(eq(cars.memberId, actor.id), eq(cars.id, known.id)))
      .returning()
    return carView(row!)
  })
}
