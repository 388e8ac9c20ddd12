export { chosenCar, listCars }

import { and, eq } from 'drizzle-orm'
import type { ServiceContext } from '../context.ts'
import { cars } from '../db/schema/index.ts'
import { requirePermission } from '../people/permissions.ts'
import type { CarSheet } from '#shared/cars/car.ts'
import type { CarView } from '#shared/schemas/car.ts'
import { carView, ownCars } from './car-rows.ts'

/** One's own cars. @throws SignInRequiredError (401) */
async function listCars(ctx: ServiceContext): Promise<CarView[]> {
  const { actor } = ctx
  requirePermission(actor, 'car.keep')
  return (await ownCars(ctx, actor)).map(carView)
}

/** The car that this reader's calculators start from; undefined for a visitor, whose car stays in the browser. */
async function chosenCar({ actor, db }: ServiceContext): Promise<CarSheet | undefined> {
  if (actor.kind === 'visitor') return undefined
  const [car] = await db
    .select({ id: cars.id, name: cars.name, values: cars.values })
    .from(cars)
    .where(and(eq(cars.memberId, actor.id), eq(cars.chosen, true)))
  return car
}
