export { problemsOf }

import type { ApiOperation, Who } from './describe.ts'

const mayNot: Record<Exclude<Who, 'members'>, string> = {
  'verified members': 'The e-mail address is not verified yet.',
  moderators: 'Only for moderators.',
  admins: 'Only for admins.',
}

/** Every status with which this operation can fail and why, from its own description and from what its kind of request has in common. */
function problemsOf(operation: ApiOperation, method: string): Map<number, string> {
  const { who, query, body, once, ifMatch, limited, problems = {} } = operation
  const reasons = new Map<number, string[]>()
  const add = (status: number, reason: string) => reasons.set(status, [...(reasons.get(status) ?? []), reason])
  for (const [status, reason] of Object.entries(problems)) add(Number(status), reason)
  if (who !== undefined) add(401, 'Nobody is signed in.')
  if (who !== undefined && who !== 'members') add(403, mayNot[who])
  if (method !== 'GET') add(403, 'Another site caused the request.')
  if (query !== undefined) add(422, 'Something in the query is wrong; `errors` says what.')
  if (body !== undefined) {
    add(400, 'The body is not valid JSON.')
    add(413, 'The body is too long.')
    add(415, 'The body was not sent as application/json.')
    add(422, 'Something in the body is wrong; `errors` says what.')
  }
  if (ifMatch === true) {
    add(412, 'It was changed since that version; `version` is the one it has now.')
    add(428, 'If-Match is missing.')
  }
  if (once === true) {
    add(409, 'The first request with this Idempotency-Key is still being carried out.')
    add(422, 'The Idempotency-Key was used for another request, or is not 8 to 200 printable characters.')
  }
  if (limited === true) add(429, 'Too often in too short a time.')
  const sorted = [...reasons].sort(([one], [other]) => one - other)
  return new Map(sorted.map(([status, all]) => [status, all.join(' ')]))
}
