export { data }
export type { Data }

import { randomUUID } from 'node:crypto'
import type { PageContextServer } from 'vike/types'
import { listCars } from '#server/cars/list-cars.ts'
import { listUses } from '#server/cars/list-uses.ts'
import { forPage } from '#server/http/page-abort.ts'

type Data = Awaited<ReturnType<typeof data>>

async function data(pageContext: PageContextServer) {
  const { ctx, reader, formStatus } = pageContext
  const cars = reader === null ? [] : await forPage(pageContext, () => listCars(ctx))
  // Ids for what a form without a script may make, so that sending it twice makes one.
  return { cars, uses: listUses(ctx), newId: randomUUID(), copyId: randomUUID(), stale: formStatus === 412 }
}
