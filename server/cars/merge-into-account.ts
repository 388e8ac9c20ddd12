export { mergeIntoAccount }

import { createHash } from 'node:crypto'
import { and, eq, sql } from 'drizzle-orm'
import type { z } from 'zod'
import type { ServiceContext } from '../context.ts'
import { cars } from '../db/schema/index.ts'
import { requirePermission } from '../people/permissions.ts'
import { sameCar, type Car } from '#shared/cars/car.ts'
import { mergeCars } from '#shared/cars/merge-cars.ts'
import { CarsToMerge, type MergedCars } from '#shared/schemas/car.ts'
import { carView, lockCars, ownCars } from './car-rows.ts'
import { markChosen } from './choose-car.ts'
import { readCarInput } from './read-input.ts'

/**
 * Brings the cars that a browser kept into the account (`mergeCars` has the rules). Doing it again changes nothing, so a
 * browser that did not hear the answer just asks again, and lets go of its cars only when it has heard it.
 */
async function mergeIntoAccount(ctx: ServiceContext, input: z.input<typeof CarsToMerge>): Promise<MergedCars> {
  const { actor } = ctx
  requirePermission(actor, 'car.keep')
  await ctx.rateLimits.take('car', actor.id)
  const sent = readCarInput(CarsToMerge, input)
  return ctx.db.transaction(async (db) => {
    await lockCars({ db }, actor)
    const before = await ownCars({ db }, actor)
    const merged = mergeCars(before, sent.cars, copyId)
    for (const { id, name, carClass, values } of merged.cars) {
      const known = before.find((car) => car.id === id)
      if (known === undefined) {
        await db.insert(cars).values({ id, name, carClass, values, memberId: actor.id, createdAt: sql`clock_timestamp()` })
      } else if (!sameCar(known, { name, carClass, values })) {
        await db
          .update(cars)
          .set({ carClass, values, version: known.version + 1, updatedAt: sql`now()` })
          .where(and(eq(cars.memberId, actor.id), eq(cars.id, id)))
      }
    }
    const chosen = merged.cars.find(({ id }) => id === sent.chosen) ?? merged.cars[0]
    if (chosen !== undefined && !before.some((car) => car.chosen)) await markChosen({ db }, actor, chosen.id)
    return { cars: (await ownCars({ db }, actor)).map(carView), held: merged.held }
  })
}

/** The same for the same car with the same values and name, whenever it comes; shaped as a UUID of version 8 (RFC 9562). */
function copyId({ id, name, carClass, values }: Car): string {
  const entries = Object.entries(values).sort(([one], [other]) => (one < other ? -1 : 1))
  const hex = createHash('sha256').update(JSON.stringify([id, name, carClass, entries])).digest('hex')
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-8${hex.slice(13, 16)}-a${hex.slice(17, 20)}-${hex.slice(20, 32)}`
}
