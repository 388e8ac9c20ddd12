export { describeCalculators }

import { z } from 'zod'
import type { ApiDescription } from '../http/openapi/describe.ts'
import { CalculatorAnswer, RunAnswer } from './answers.ts'
import type { CalculatorRegistry } from './load-registry.ts'
import { runBody } from './routes.ts'

function describeCalculators(registry: CalculatorRegistry): ApiDescription {
  return {
    name: 'Calculators',
    about: 'The book’s formulas, in double precision.',
    answers: { Calculator: CalculatorAnswer, CalculatorRun: RunAnswer },
    operations: {
      'GET /calculators': {
        id: 'listCalculators',
        summary: 'Every calculator with its inputs and outputs.',
        answers: { 200: { says: 'Every calculator, by title.', body: z.array(CalculatorAnswer) } },
      },
      'POST /calculators/:slug/run': {
        id: 'runCalculator',
        summary: 'Runs a calculator. Inputs that are left out take their defaults.',
        params: { slug: z.enum([...registry.keys()]) },
        body: runBody,
        answers: { 200: { says: 'The result with its working.', body: RunAnswer } },
        problems: { 404: 'There is no such calculator.' },
      },
    },
  }
}
