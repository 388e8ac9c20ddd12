export { requireFreeName }

import { ValidationError } from '../errors.ts'
import { sameName } from '#shared/cars/car.ts'

/** @throws ValidationError (422) at the name when another of one's cars is called so */
function requireFreeName(name: string, others: readonly { name: string }[]): void {
  if (!others.some((other) => sameName(other.name, name))) return
  const message = `You already have a car called “${name}”. Give this one another name.`
  throw new ValidationError(message, [{ field: 'name', message }])
}
