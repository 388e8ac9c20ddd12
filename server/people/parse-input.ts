export { parseInput }

import type { z } from 'zod'
import { validationErrorFromZod } from '../errors.ts'

/** @throws ValidationError (422) with a message for each field at fault */
function parseInput<Schema extends z.ZodType>(schema: Schema, input: unknown): z.output<Schema> {
  const parsed = schema.safeParse(input)
  if (!parsed.success) throw validationErrorFromZod(parsed.error)
  return parsed.data
}
