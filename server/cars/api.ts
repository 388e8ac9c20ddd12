export { carsApi }

import { Router, type Request, type Response } from 'express'
import type { App } from '../context.ts'
import { ValidationError } from '../errors.ts'
import { idempotent } from '../http/idempotency.ts'
import { sendVersion, versionFromIfMatch } from '../http/if-match.ts'
import { requirePermission } from '../people/permissions.ts'
import type { CarView } from '#shared/schemas/car.ts'
import { ownCar } from './car-rows.ts'
import { chooseCar } from './choose-car.ts'
import { createCar } from './create-car.ts'
import { deleteCar } from './delete-car.ts'
import { listCars } from './list-cars.ts'
import { mergeIntoAccount } from './merge-into-account.ts'
import { saveCar } from './save-car.ts'

type CarRequest = Request<{ id: string }>

/** One's own cars as JSON. Each carries its version as ETag; saving and deleting want it back in If-Match. */
function carsApi(app: App): Router {
  const router = Router()
  const once = idempotent(app)

  router.get('/cars', async (req, res) => {
    res.json(await listCars(req.ctx))
  })
  router.post('/cars', once, async (req, res) => {
    const { car, created } = await createCar(req.ctx, req.body)
    sendCar(res.status(created ? 201 : 200).location(`/api/cars/${car.id}`), car)
  })
  router.post('/cars/merge', once, async (req, res) => {
    res.json(await mergeIntoAccount(req.ctx, req.body))
  })
  router.put('/cars/:id', async (req: CarRequest, res) => {
    const { id } = req.params
    const version = await versionOf(req)
    sendCar(res, await saveCar(req.ctx, { ...bodyOf(req), id, version } as Parameters<typeof saveCar>[1]))
  })
  router.delete('/cars/:id', async (req: CarRequest, res) => {
    await deleteCar(req.ctx, { id: req.params.id, version: await versionOf(req) })
    res.status(204).end()
  })
  router.post('/cars/:id/choose', once, async (req: CarRequest, res) => {
    sendCar(res, await chooseCar(req.ctx, { id: req.params.id }))
  })
  return router
}

function sendCar(res: Response, car: CarView): void {
  sendVersion(res, car)
  res.json(car)
}

async function versionOf(req: CarRequest): Promise<number> {
  const { actor } = req.ctx
  requirePermission(actor, 'car.keep')
  return versionFromIfMatch(req, (await ownCar(req.ctx, actor, req.params.id)).version)
}

function bodyOf(req: Request): object {
  const body = (req.body ?? {}) as Record<string, unknown>
  const misplaced = ['id', 'version'].filter((key) => Object.hasOwn(body, key))
  if (misplaced.length === 0) return body
  throw new ValidationError(
    'The id stands in the address and the version in If-Match.',
    misplaced.map((field) => ({ field, message: `“${field}” is not a field here.` })),
  )
}
