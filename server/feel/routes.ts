export { FeelParameters, feelApi }

import { Router } from 'express'
import { z } from 'zod'
import { ValidationError } from '../errors.ts'
import { readFeelQuery } from '#shared/feel/feel-query.ts'
import { BITES, CAR_CLASSES, SURFACES } from '#shared/vocabulary/conditions.ts'
import { askByFeel } from './ask-by-feel.ts'
import { byFeelAnswer } from './answers.ts'

/** For the API's description only: the query is read by `readFeelQuery`, whose words a page can show too. */
const FeelParameters = z.object({
  complaint: z.array(z.string()).max(3).describe('Part of the lap, quality and what is wanted, such as entry.steering.more; up to three times.'),
  class: z.enum(CAR_CLASSES).optional(),
  surface: z.enum(SURFACES).optional(),
  bite: z.enum(BITES).optional(),
  minutes: z.int().min(0).max(600).optional().describe('Time before the next heat.'),
})

function feelApi(): Router {
  const router = Router()
  router.get('/by-feel', async (req, res) => {
    const { query, problems } = readFeelQuery(req.query as Record<string, string | string[]>)
    if (query.complaints.length === 0 && problems.length === 0) {
      problems.push({ field: 'complaint', message: 'Say what the car does, such as complaint=entry.steering.more.' })
    }
    if (problems.length > 0) {
      const fields = problems.map(({ field, message, known }) => ({ field, message: known === undefined ? message : `${message} Known are: ${known.join(', ')}.` }))
      throw new ValidationError('This cannot be answered as it stands.', fields)
    }
    res.json(byFeelAnswer(await askByFeel(req.ctx, query)))
  })
  return router
}
