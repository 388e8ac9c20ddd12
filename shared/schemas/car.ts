export { CarFields, CarId, CarsToMerge, CarView, MergedCars, NewCar }

import { z } from 'zod'
import { CAR_NAME_LENGTH, CARS_AT_MOST } from '#shared/cars/car.ts'
import { carValues, type CarValue, type CarValues } from '#shared/cars/car-values.ts'
import { checkTogether } from '#shared/cars/check-car.ts'
import { checkCarValue } from '#shared/cars/check-value.ts'
import { plainSentence } from '#shared/calculators/sentence.ts'
import { CAR_CLASSES } from '#shared/vocabulary/conditions.ts'
import { cleanText } from './text.ts'

function oneValue(entry: CarValue) {
  const error = (issue: { input: unknown }) => plainSentence(checkCarValue(entry, issue.input) ?? [])
  const number = z.number({ error }).min(entry.min, { error }).max(entry.max, { error })
  return (entry.whole ? number.int({ error }) : number).optional().describe(`${entry.label}, ${entry.unit}`)
}

const eachAlone = z.strictObject(Object.fromEntries(carValues.map((entry) => [entry.key, oneValue(entry)])), {
  error: (issue) => (issue.code === 'invalid_type' ? 'Values: an object with a number for each key.' : undefined),
})

/** A car’s values, each possible and all of them together; in the units that stand in their descriptions. */
const values = eachAlone.superRefine((known, ctx) => {
  if (ctx.issues.length > 0) return
  for (const { key, message } of checkTogether(known)) ctx.addIssue({ code: 'custom', path: [key], message: plainSentence(message) })
}) as unknown as z.ZodType<CarValues, CarValues>

/** What a reader says about one car. */
const CarFields = z.strictObject({
  name: cleanText('Name', 1, CAR_NAME_LENGTH),
  carClass: z.enum(CAR_CLASSES, { error: 'Class: choose one from the list.' }).nullable().default(null),
  values,
})
type CarFields = z.output<typeof CarFields>

const CarId = z.uuid({ error: 'Id: a UUID that you made.' }).toLowerCase()

const NewCar = CarFields.extend({ id: CarId })
type NewCar = z.output<typeof NewCar>

const CarsToMerge = z.strictObject({
  cars: z
    .array(NewCar, { error: 'Cars: a list.' })
    .max(CARS_AT_MOST, { error: `Cars: at most ${CARS_AT_MOST}.` })
    .refine((cars) => new Set(cars.map(({ id }) => id)).size === cars.length, { error: 'Cars: each one once.' }),
  chosen: CarId.nullable().default(null),
})
type CarsToMerge = z.output<typeof CarsToMerge>

/** A car as the account holds it. */
const CarView = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  carClass: z.enum(CAR_CLASSES).nullable(),
  values: eachAlone as unknown as z.ZodType<CarValues, CarValues>,
  chosen: z.boolean().describe('Calculators start from this one.'),
  version: z.int().min(1),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
})
type CarView = z.output<typeof CarView>

const MergedCars = z.strictObject({
  cars: z.array(CarView),
  held: z.array(z.uuid()).describe('Ids of the sent cars that the account now holds whole.'),
})
type MergedCars = z.output<typeof MergedCars>
