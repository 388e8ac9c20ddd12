export { readDemoCars, seedDemoCars }

import { randomUUID } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import { parse } from 'yaml'
import { z } from 'zod'
import type { Database } from '../db/client.ts'
import { cars } from '../db/schema/index.ts'
import { CarFields } from '#shared/schemas/car.ts'
import { contentFolder } from './read-content.ts'

const DemoCar = CarFields.extend({ member: z.string() })

/** @throws ZodError when a car in `content/cars.yaml` cannot be */
async function readDemoCars(): Promise<z.output<typeof DemoCar>[]> {
  return z.array(DemoCar).parse(parse(await readFile(`${contentFolder}/cars.yaml`, 'utf8')))
}

/** Gives members of a demonstration the cars that they race. */
async function seedDemoCars(db: Database, members: ReadonlyMap<string, string>): Promise<void> {
  for (const { member, ...car } of await readDemoCars()) {
    const memberId = members.get(member)
    if (memberId !== undefined) await db.insert(cars).values({ ...car, memberId, id: randomUUID(), chosen: true }).onConflictDoNothing()
  }
}
