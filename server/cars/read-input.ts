export { readCarInput }

import type { z } from 'zod'
import { ValidationError } from '../errors.ts'
import { parseInput } from '../people/parse-input.ts'

// Far above what a car has, so that a body of a hundred thousand made-up keys is answered in one sentence.
const KEYS_AT_MOST = 300

/** @throws ValidationError (422) with a message for each field at fault */
function readCarInput<Schema extends z.ZodType>(schema: Schema, input: unknown): z.output<Schema> {
  const sent = (input ?? {}) as { values?: unknown; cars?: unknown }
  const cars: unknown[] = Array.isArray(sent.cars) ? sent.cars : []
  for (const part of [sent, sent.values, ...cars, ...cars.map((car) => (car as typeof sent | null)?.values)]) {
    if (typeof part === 'object' && part !== null && Object.keys(part).length > KEYS_AT_MOST) {
      throw new ValidationError('A car has far fewer values than that.')
    }
  }
  return parseInput(schema, input ?? {})
}
