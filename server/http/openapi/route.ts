export { openApi }

import { Router } from 'express'
import { z } from 'zod'
import type { ApiDescription } from './describe.ts'
import { createOpenApiDocument, type OpenApiDocument } from './document.ts'

const ownDescription: ApiDescription = {
  name: 'This document',
  about: 'OpenAPI 3.1.',
  operations: {
    'GET /openapi.json': {
      id: 'getOpenApi',
      summary: 'What the API understands and answers.',
      answers: { 200: { says: 'An OpenAPI document.', body: z.record(z.string(), z.unknown()) } },
    },
  },
}

/** `GET /openapi.json`, mounted under /api. The document is made when it is first asked for. */
function openApi(descriptions: readonly ApiDescription[], facts: { version: string; sessionCookie: string }): Router {
  const router = Router()
  let document: OpenApiDocument | undefined
  router.get('/openapi.json', (_req, res) => {
    document ??= createOpenApiDocument([...descriptions, ownDescription], facts)
    res.json(document)
  })
  return router
}
