export { carsForms }

import { Router, type Request, type Response } from 'express'
import { NotFoundError, ValidationError } from '../errors.ts'
import { answerForm } from '../http/answer-form.ts'
import { flatFields, formVersion } from '../http/form-body.ts'
import { isUuid } from '../http/uuid.ts'
import { requirePermission } from '../people/permissions.ts'
import { freeName } from '#shared/cars/car.ts'
import { readCarTexts } from '#shared/cars/read-car.ts'
import { plainSentence } from '#shared/calculators/sentence.ts'
import type { CarClass } from '#shared/vocabulary/conditions.ts'
import { chooseCar } from './choose-car.ts'
import { createCar } from './create-car.ts'
import { deleteCar } from './delete-car.ts'
import { listCars } from './list-cars.ts'
import { saveCar } from './save-car.ts'

const VALUE = 'value.'

/** The forms of “My car”, for members whose browser runs no script. */
function carsForms(): Router {
  const router = Router()
  router.post('/my-car', async (req, res) => {
    const fields = flatFields(req.body)
    await answer(req, res, '/my-car', async () => {
      requirePermission(req.ctx.actor, 'car.keep')
      const { id = '', name = '', carClass = '' } = fields
      const { car } = await createCar(req.ctx, { id, name, carClass: classFrom(carClass), values: valuesFrom(fields) })
      return `/my-car?car=${car.id}&said=saved`
    })
  })
  router.post('/my-car/:id', async (req, res) => {
    const id = carId(req)
    const fields = flatFields(req.body)
    await answer(req, res, `/my-car?car=${id}`, async () => {
      requirePermission(req.ctx.actor, 'car.keep')
      const { name = '', carClass = '' } = fields
      await saveCar(req.ctx, { id, version: formVersion(fields), name, carClass: classFrom(carClass), values: valuesFrom(fields) })
      return `/my-car?car=${id}&said=saved`
    })
  })
  router.post('/my-car/:id/choose', async (req, res) => {
    const id = carId(req)
    await answer(req, res, `/my-car?car=${id}`, async () => {
      await chooseCar(req.ctx, { id })
      return `/my-car?car=${id}&said=chosen`
    })
  })
  router.post('/my-car/:id/copy', async (req, res) => {
    const id = carId(req)
    const fields = flatFields(req.body)
    await answer(req, res, `/my-car?car=${id}`, async () => {
      const mine = await listCars(req.ctx)
      const car = mine.find((each) => each.id === id)
      if (car === undefined) throw new NotFoundError('car', id)
      const { name, carClass, values } = car
      const copy = { id: fields['copyId'] ?? '', name: freeName(name, 'copy', mine.map((each) => each.name)), carClass, values }
      await createCar(req.ctx, copy)
      return `/my-car?car=${copy.id}&said=copied`
    })
  })
  router.post('/my-car/:id/delete', async (req, res) => {
    const id = carId(req)
    const fields = flatFields(req.body)
    await answer(req, res, `/my-car?car=${id}`, async () => {
      await deleteCar(req.ctx, { id, version: formVersion(fields) })
      return '/my-car?said=deleted'
    })
  })
  return router
}

function carId(req: Request): string {
  const id = String(req.params['id'])
  if (!isUuid(id)) throw new NotFoundError('car', id)
  return id
}

function classFrom(text: string): CarClass | null {
  return text === '' ? null : (text as CarClass)
}

/** @throws ValidationError (422) with words at each field that cannot be read */
function valuesFrom(fields: Record<string, string>) {
  const texts = Object.fromEntries(
    Object.entries(fields).flatMap(([name, text]) => (name.startsWith(VALUE) ? [[name.slice(VALUE.length), text]] : [])),
  )
  const { values, problems } = readCarTexts(texts, {})
  if (problems.length === 0) return values
  throw new ValidationError(
    'Nothing is saved yet: some of this needs another look.',
    problems.map(({ key, message }) => ({ field: VALUE + key, message: plainSentence(message) })),
  )
}

/** In the form a value is called `value.mass`; which car the form is about goes with it, for the page to show it there only. */
async function answer(req: Request, res: Response, url: string, act: () => Promise<string>): Promise<void> {
  const { id } = req.params
  const values = () => ({ ...flatFields(req.body), ...(typeof id === 'string' && { id }) })
  await answerForm(req, res, { url, values, fieldName: (field) => field.replace(/^values\./, VALUE) }, act)
}
