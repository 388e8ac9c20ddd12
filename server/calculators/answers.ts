export { CalculatorAnswer, RunAnswer }

import { z } from 'zod'

/** What the API answers about calculators. Units are written as people write them; 1 is a bare number. */

const CalculatorAnswer = z.object({
  slug: z.string(),
  title: z.string(),
  inputs: z.array(z.object({ key: z.string(), unit: z.string(), default: z.number(), min: z.number(), max: z.number() })),
  outputs: z.array(z.object({ key: z.string(), unit: z.string() })),
})

const numbers = z.record(z.string(), z.number())

const RunAnswer = z.object({
  inputs: numbers.describe('The inputs that were used: those given, and the defaults of those left out.'),
  outputs: numbers,
  answer: z.string().describe('The result as one sentence, in the calculator’s units.'),
  warnings: z.array(z.object({ field: z.string(), message: z.string() })),
  working: z.array(
    z.object({
      title: z.string(),
      formula: z.string().optional(),
      mathml: z.string().optional(),
      numbers: z.string().optional(),
      value: z.number().optional(),
      unit: z.string().optional(),
    }),
  ),
})
