export { carView, ownCar, ownCars, lockCars }
export type { CarRow }

import { and, asc, eq } from 'drizzle-orm'
import type { ServiceContext, SignedIn } from '../context.ts'
import { cars, members } from '../db/schema/index.ts'
import { NotFoundError } from '../errors.ts'
import { isUuid } from '../http/uuid.ts'
import type { CarView } from '#shared/schemas/car.ts'

type CarRow = typeof cars.$inferSelect
type Database = Pick<ServiceContext, 'db'>

/** One's own cars, in the order in which they were made. */
async function ownCars({ db }: Database, owner: Pick<SignedIn, 'id'>): Promise<CarRow[]> {
  return db.select().from(cars).where(eq(cars.memberId, owner.id)).orderBy(asc(cars.createdAt), asc(cars.id))
}

/** @throws NotFoundError (404) also for somebody else's car, so that nobody learns whether there is one */
async function ownCar({ db }: Database, owner: Pick<SignedIn, 'id'>, id: string): Promise<CarRow> {
  const [row] = isUuid(id) ? await db.select().from(cars).where(and(eq(cars.memberId, owner.id), eq(cars.id, id))) : []
  if (row === undefined) throw new NotFoundError('car', id)
  return row
}

/** Makes everything that changes a member's cars wait for its turn, until the end of the transaction. */
async function lockCars({ db }: Database, owner: Pick<SignedIn, 'id'>): Promise<void> {
  await db.select({ id: members.id }).from(members).where(eq(members.id, owner.id)).for('no key update')
}

function carView({ memberId: _owner, createdAt, updatedAt, ...car }: CarRow): CarView {
  return { ...car, createdAt: createdAt.toISOString(), updatedAt: updatedAt.toISOString() }
}
