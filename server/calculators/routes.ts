export { calculatorRoutes, runBody }

import { Router } from 'express'
import { z } from 'zod'
import { validationErrorFromZod } from '#server/errors.ts'
import { listCalculators, runCalculator } from './service.ts'
import type { CalculatorRegistry } from './load-registry.ts'

/**
 * Body of a run. The numbers themselves are checked by the calculator, which knows each field's range and
 * reason.
 */
const runBody = z.strictObject(
  {
    inputs: z.record(
      z.string(),
      z.unknown().meta({ type: 'number' }),
      'Give the inputs as an object of numbers, { "inputs": { "key": number } }.',
    ),
  },
  'Send a JSON object: { "inputs": { "key": number } }.',
)

/**
 * GET /calculators and POST /calculators/:slug/run; the application mounts it under /api, behind its JSON
 * body parser.
 */
function calculatorRoutes(registry: CalculatorRegistry): Router {
  const router = Router()

  router.get('/calculators', (_request, response) => {
    response.json(listCalculators(registry))
  })

  router.post('/calculators/:slug/run', (request, response) => {
    const { slug } = request.params
    const body = runBody.safeParse(request.body)
    if (!body.success) throw validationErrorFromZod(body.error)
    // The inputs as they were sent, not zod's copy: the copy drops a key called “__proto__” instead of
    // refusing it.
    const { inputs } = request.body as z.infer<typeof runBody>
    response.json(runCalculator(registry, slug, inputs))
  })

  return router
}
