export { checkCar, checkTogether }
export type { CarProblem }

import { say, type Sentence } from '#shared/calculators/sentence.ts'
import { carValueByKey, type CarValues, type EnteredCarKey } from './car-values.ts'
import { checkCarValue } from './check-value.ts'
import { CAR_RULES } from './car-rules.ts'

/** Something that cannot be so, said at the field that is asked to change. */
interface CarProblem {
  key: EnteredCarKey
  message: Sentence
}

/**
 * Values that cannot be, alone or together, in the order in which they are asked for. The browser asks before it keeps a
 * car and the server before it stores one. Values that are left out are never a problem.
 */
function checkCar(values: CarValues): CarProblem[] {
  const alone = Object.entries(values).flatMap(([key, value]): CarProblem[] => {
    const entry = carValueByKey(key)
    const message = entry === undefined ? say`“${key}” is no value of a car.` : checkCarValue(entry, value)
    return message === undefined ? [] : [{ key: key as EnteredCarKey, message }]
  })
  return alone.length > 0 ? alone : checkTogether(values)
}

/** Only how the values go together; each of them has to be possible by itself. */
function checkTogether(values: CarValues): CarProblem[] {
  return CAR_RULES.flatMap((rule) => rule(values) ?? [])
}

