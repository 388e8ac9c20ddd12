export { createOpenApiDocument }
export type { OpenApiDocument }

import { z } from 'zod'
import { Problem } from '../problem.ts'
import { problemsOf } from './common-problems.ts'
import type { ApiAnswer, ApiDescription, ApiOperation } from './describe.ts'
import { answerHeaders, idempotencyKey, ifMatch } from './headers.ts'
import { nameSchemas, propertiesOf, type JsonSchema, type SchemaNames } from './schemas.ts'

interface OpenApiDocument {
  openapi: string
  paths: Record<string, Record<string, JsonSchema>>
  components: { schemas: Record<string, JsonSchema> } & Record<string, unknown>
  [member: string]: unknown
}

/** OpenAPI 3.1 of everything under /api, from the descriptions that stand beside the routes and the schemas that these use. */
function createOpenApiDocument(
  descriptions: readonly ApiDescription[],
  { version, sessionCookie }: { version: string; sessionCookie: string },
): OpenApiDocument {
  const schemas = nameSchemas(descriptions)
  const paths: OpenApiDocument['paths'] = {}
  for (const { name, operations } of descriptions) {
    for (const [route, operation] of Object.entries<ApiOperation>(operations)) {
      const [method, path] = route.split(' ') as [string, string]
      const address = path.replace(/:(\w+)/g, '{$1}')
      paths[address] = { ...paths[address], [method.toLowerCase()]: describeOperation(operation, method, name, schemas) }
    }
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Camber & Clay',
      version,
      description: 'The tuning book as JSON. Every error is application/problem+json. Dates are ISO 8601.',
    },
    servers: [{ url: '/api' }],
    tags: descriptions.map(({ name, about }) => ({ name, description: about })),
    paths,
    components: {
      schemas: schemas.all,
      headers: answerHeaders,
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: sessionCookie, description: 'Given by POST /session.' },
      },
    },
  }
}

function describeOperation(operation: ApiOperation, method: string, tag: string, schemas: SchemaNames): JsonSchema {
  const { id, summary, who, body } = operation
  const parameters = parametersOf(operation)
  const problem = (description: string, headers?: JsonSchema) => ({
    description,
    ...(headers === undefined ? {} : { headers }),
    content: { 'application/problem+json': { schema: schemas.ref(Problem) } },
  })
  const problems = [...problemsOf(operation, method)].map(([status, reason]) => [
    status,
    problem(reason, status === 429 ? { 'Retry-After': headerRef('Retry-After') } : undefined),
  ])
  return {
    operationId: id,
    summary,
    tags: [tag],
    ...(who === undefined ? {} : { description: `For ${who}.`, security: [{ session: [] }] }),
    ...(parameters.length === 0 ? {} : { parameters }),
    ...(body === undefined ? {} : { requestBody: { required: true, content: { 'application/json': { schema: schemas.ref(body) } } } }),
    responses: {
      ...Object.fromEntries(Object.entries(operation.answers).map(([status, answer]) => [status, describeAnswer(answer, schemas)])),
      ...Object.fromEntries(problems),
      default: problem('Anything else that went wrong.'),
    },
  }
}

function parametersOf({ params, query, once, ifMatch: wantsVersion }: ApiOperation): JsonSchema[] {
  const inPath = propertiesOf(z.object(params ?? {})).map(({ name, schema }) => ({ name, in: 'path', required: true, schema }))
  const inQuery = query === undefined ? [] : propertiesOf(query).map((parameter) => ({ ...parameter, in: 'query' }))
  return [...inPath, ...inQuery, ...(wantsVersion === true ? [ifMatch] : []), ...(once === true ? [idempotencyKey] : [])]
}

function describeAnswer({ says, body, headers = [] }: ApiAnswer, schemas: SchemaNames): JsonSchema {
  return {
    description: says,
    ...(headers.length === 0 ? {} : { headers: Object.fromEntries(headers.map((name) => [name, headerRef(name)])) }),
    ...(body === undefined ? {} : { content: { 'application/json': { schema: schemas.ref(body) } } }),
  }
}

function headerRef(name: keyof typeof answerHeaders): JsonSchema {
  return { $ref: `#/components/headers/${name}` }
}
