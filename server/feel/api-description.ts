export { feelDescription }

import type { ApiDescription } from '../http/openapi/describe.ts'
import { ByFeelAnswer, FeelChangeAnswer } from './answers.ts'
import { FeelParameters } from './routes.ts'

const feelDescription: ApiDescription = {
  name: 'By feel',
  about: 'From what the car does wrong to what to try.',
  answers: { ByFeel: ByFeelAnswer, FeelChange: FeelChangeAnswer },
  operations: {
    'GET /by-feel': {
      id: 'askByFeel',
      summary: 'The changes that help with up to three complaints, best first.',
      query: FeelParameters,
      answers: { 200: { says: 'The changes, best first; those that take too long are among them.', body: ByFeelAnswer } },
    },
  },
}
