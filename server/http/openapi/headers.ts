export { answerHeaders, idempotencyKey, ifMatch }

/** The headers that the API means something by, as OpenAPI spells them. */
const answerHeaders = {
  ETag: { description: 'The version, for If-Match.', schema: { type: 'string' } },
  Link: { description: 'Addresses of the pages before and after (`prev`, `next`).', schema: { type: 'string' } },
  Location: { description: 'Where it stands.', schema: { type: 'string' } },
  'X-Total-Count': { description: 'How many there are on all pages.', schema: { type: 'integer' } },
  'Retry-After': { description: 'Seconds to wait.', schema: { type: 'integer' } },
}

const ifMatch = {
  name: 'If-Match',
  in: 'header',
  required: true,
  description: 'The ETag of the version that was seen, such as `"3"`.',
  schema: { type: 'string' },
}

const idempotencyKey = {
  name: 'Idempotency-Key',
  in: 'header',
  required: false,
  description: 'The same request again under the same key, within 24 hours, gets the first one’s answer and changes nothing.',
  schema: { type: 'string', minLength: 8, maxLength: 200, pattern: '^[\\x21-\\x7e]+$' },
}
