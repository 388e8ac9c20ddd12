export { Problem }

import { z } from 'zod'

/** Every error under /api (RFC 9457, `application/problem+json`). Some codes bring members of their own, such as `state`. */
const Problem = z.looseObject({
  type: z.string().describe('`urn:camber-and-clay:problem:` and the code.'),
  title: z.string().describe('What went wrong and what to do about it, for a person.'),
  status: z.int(),
  code: z.string().describe('What went wrong, for a program.'),
  instance: z.string().describe('`urn:uuid:` and the id of the request, as in the header X-Request-Id.'),
  errors: z
    .array(z.object({ field: z.string().describe('Path such as `content.effects.0.adjustable`.'), message: z.string() }))
    .optional()
    .describe('Each field at fault.'),
})
type Problem = z.infer<typeof Problem>
