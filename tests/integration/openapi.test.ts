import { Validator } from '@seriousme/openapi-schema-validator'
import { Ajv2020, type AnySchema } from 'ajv/dist/2020.js'
import addFormats from 'ajv-formats'
import type supertest from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { OpenApiDocument } from '#server/http/openapi/document.ts'
import { listRoutes } from '../support/list-routes.ts'
import { createTestApp, DEMO_PASSWORDS, type TestApp } from '../support/test-app.ts'
import { beginEdit, ifMatch, saveEdit, sentEdit, WHOLE_GUIDE } from './edits-support.ts'

/**
 * The document of the API against the API itself: the same routes, and answers that satisfy the schemas. A route that
 * fails here needs an entry in its capability's api-description.ts.
 */
type Agent = ReturnType<typeof supertest.agent>

interface Operation {
  operationId: string
  parameters?: { in: string; required: boolean }[]
  responses: Record<string, { content?: Record<string, { schema: AnySchema }> }>
}

let app: TestApp
let document: OpenApiDocument
let ajv: Ajv2020

beforeAll(async () => {
  app = await createTestApp()
  document = (await app.agent().get('/api/openapi.json').expect(200)).body as OpenApiDocument
  ajv = new Ajv2020({ strict: false, allErrors: true })
  addFormats.default(ajv)
  ajv.addSchema({ components: closed(document.components) }, 'api')
})
afterAll(() => app.stop())

function operations(): [method: string, path: string, operation: Operation][] {
  return Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]): [string, string, Operation] => [method.toUpperCase(), path, operation as unknown as Operation]),
  )
}

/** The document leaves its answers open for later versions; today nothing may be sent that it does not name. */
function closed(schema: unknown): unknown {
  if (Array.isArray(schema)) return schema.map(closed)
  if (typeof schema !== 'object' || schema === null) return schema
  const parts = Object.fromEntries(Object.entries(schema).map(([key, part]) => [key, closed(part)]))
  return parts.type === 'object' && parts.properties !== undefined ? { additionalProperties: false, ...parts } : parts
}

/** Sends a request and holds the answer against what the document says of it. @returns the body */
async function ask<Body = unknown>(
  agent: Agent,
  method: 'get' | 'post' | 'put' | 'delete',
  path: string,
  { body, headers = [], status }: { body?: object; headers?: [string, string] | []; status: number },
): Promise<Body> {
  const request = agent[method](`/api${path}`)
  if (headers.length === 2) request.set(...headers)
  const answer = await (body === undefined ? request : request.send(body))
  expect(answer.status, `${method} ${path}: ${answer.text}`).toBe(status)
  const pattern = (template: string) => new RegExp(`^${template.replace(/\{\w+\}/g, '[^/]+')}$`)
  const [, , operation] = operations().find(([known, template]) => known === method.toUpperCase() && pattern(template).test(path.split('?')[0]!))!
  const described = operation.responses[status] ?? (status >= 400 ? operation.responses.default : undefined)
  expect(described, `${operation.operationId} may answer ${status}`).toBeDefined()
  const [type, content] = Object.entries(described!.content ?? {})[0] ?? []
  expect(answer.type || undefined, `${operation.operationId} ${status}: type`).toBe(type)
  if (content !== undefined) {
    const validate = ajv.compile({ $ref: (content.schema as { $ref: string }).$ref.replace('#', 'api#') })
    validate(answer.body)
    expect(validate.errors ?? [], `${operation.operationId} ${status}`).toEqual([])
  }
  return answer.body as Body
}

describe('GET /api/openapi.json', () => {
  it('names every route there is under /api, and no other', () => {
    const described = operations().map(([method, path]) => `${method} /api${path.replace(/\{(\w+)\}/g, ':$1')}`)
    const routes = listRoutes(app.express).filter((route) => route.includes(' /api/'))
    expect(described.sort()).toEqual([...new Set(routes)].sort())
  })

  it('is a valid OpenAPI 3.1 document', async () => {
    const validator = new Validator()
    const { valid, errors } = await validator.validate(structuredClone(document) as Record<string, unknown>)
    expect(errors ?? []).toEqual([])
    expect([valid, validator.version]).toEqual([true, '3.1'])
  })

  it('gives each operation a name of its own and each parameter of a path its schema', () => {
    const names = operations().map(([, , operation]) => operation.operationId)
    expect(new Set(names).size).toBe(names.length)
    for (const [method, path, { parameters = [] }] of operations()) {
      expect(parameters.filter((parameter) => parameter.in === 'path').length, `${method} ${path}`).toBe(path.split('{').length - 1)
    }
  })

  it('says what every list and every plain address answers', async () => {
    const admin = await app.signedIn('wanda')
    for (const [method, path, { parameters = [] }] of operations()) {
      if (method === 'GET' && parameters.every(({ required }) => !required)) await ask(admin, 'get', path, { status: 200 })
    }
  })

  it('says what reading and calculating answer', async () => {
    const visitor = app.agent()
    await ask(visitor, 'get', '/session', { status: 200 })
    await ask(visitor, 'get', '/guides/rear-toe', { status: 200 })
    await ask(visitor, 'get', '/guides/nowhere', { status: 404 })
    await ask(visitor, 'get', '/guides?page=0', { status: 422 })
    await ask(visitor, 'post', '/calculators/fluid-temperature/run', { body: { inputs: { temperature: 80 } }, status: 200 })
    await ask(visitor, 'post', '/calculators/fluid-temperature/run', { body: { inputs: { temperature: 'hot' } }, status: 422 })
    await ask(visitor, 'get', '/edits', { status: 401 })
  })

  it('says what joining and signing in answer', async () => {
    const person = app.agent()
    const email = 'reader@saltmarsh.example'
    const password = 'nine dry laps before the rain'
    await ask(person, 'post', '/members', { body: { name: 'A Reader', email, password }, status: 201 })
    await ask(person, 'post', '/members', { body: { name: 'A Reader', email }, status: 422 })
    await ask(person, 'post', '/verification-mails', { body: { email }, status: 202 })
    const [mail] = await app.mailTo(email)
    const token = /\?token=([\w-]+)/.exec(mail!.text)![1]
    await ask(person, 'get', '/mailbox/1', { status: 200 })
    await ask(person, 'post', '/verifications', { body: { token }, status: 204 })
    await ask(person, 'post', '/verifications', { body: { token }, status: 422 })
    await ask(person, 'post', '/session', { body: { email, password: 'something else' }, status: 401 })
    await ask(person, 'post', '/session', { body: { email, password }, status: 200 })
    await ask(person, 'put', '/password', { body: { currentPassword: password, newPassword: `${password} again` }, status: 204 })
    await ask(person, 'delete', '/sessions', { status: 200 })
    await ask(person, 'delete', '/session', { status: 204 })
    await ask(person, 'post', '/password-resets', { body: { email }, status: 202 })
  })

  it('says what looking after members answers', async () => {
    const admin = await app.signedIn('wanda')
    const writer = app.agent()
    const { member } = await ask<{ member: { id: string } }>(writer, 'post', '/session', { body: DEMO_PASSWORDS.priya!, status: 200 })
    const { id } = member
    await ask(admin, 'put', `/members/${id}/role`, { body: { role: 'moderator' }, status: 200 })
    await ask(admin, 'put', `/members/${id}/role`, { body: { role: 'king' }, status: 422 })
    await ask(admin, 'put', `/members/${id}/status`, { body: { status: 'suspended' }, status: 200 })
    await ask(admin, 'delete', `/members/${id}/sessions`, { status: 200 })
    await ask(writer, 'put', `/members/${id}/role`, { body: { role: 'admin' }, status: 401 })
  })

  it('says what writing and approving answer', async () => {
    const [writer, moderator] = [await app.signedIn('tomasz'), await app.signedIn('odile')]
    type Edit = { id: string; version: number }
    const begun = await ask<Edit>(writer, 'post', '/edits', { body: { chapter: 'B' }, status: 201 })
    const at = `/edits/${begun.id}`
    await ask(writer, 'put', at, { body: { content: WHOLE_GUIDE }, status: 428 })
    const saved = await ask<Edit>(writer, 'put', at, { body: { content: WHOLE_GUIDE, summary: 'A new guide' }, headers: ifMatch(begun), status: 200 })
    await ask(writer, 'put', at, { body: { content: WHOLE_GUIDE }, headers: ifMatch(begun), status: 412 })
    await ask(writer, 'post', '/preview', { body: { content: { ...WHOLE_GUIDE, body: '::calculator{nowhere}' } }, status: 200 })
    const sent = await ask<Edit>(writer, 'post', `${at}/send`, { body: {}, headers: ifMatch(saved), status: 200 })
    await ask(moderator, 'post', `${at}/notes`, { body: { text: 'Which glue?' }, status: 201 })
    const asked = await ask<Edit>(moderator, 'post', `${at}/ask`, { body: { reason: 'Name the glue.' }, headers: ifMatch(sent), status: 200 })
    await ask(moderator, 'post', `${at}/approve`, { body: {}, headers: ifMatch(asked), status: 409 })
    const again = await ask<Edit>(writer, 'post', `${at}/send`, { body: {}, headers: ifMatch(asked), status: 200 })
    await ask(moderator, 'post', `${at}/approve`, { body: { note: 'Good.' }, headers: ifMatch(again), status: 200 })
    await ask(writer, 'get', at, { status: 200 })
  })

  it('says what an edit answers whose guide has moved on', async () => {
    const [writer, other, moderator] = [await app.signedIn('tomasz'), await app.signedIn('imre'), await app.signedIn('odile')]
    const draft = await saveEdit(writer, await beginEdit(writer, { guideSlug: 'rear-toe' }), { inShort: 'What one says about it, in a sentence.' }, 'In short')
    const sent = await sentEdit(other, { guideSlug: 'rear-toe' }, { inShort: 'What another says about it, in a sentence.' })
    const { edition } = await ask<{ edition: number }>(moderator, 'post', `/edits/${sent.id}/approve`, { body: {}, headers: ifMatch(sent), status: 200 })
    await ask(writer, 'get', `/edits/${draft.id}`, { status: 200 })
    await ask(writer, 'post', `/edits/${draft.id}/send`, { body: {}, headers: ifMatch(draft), status: 409 })
    const content = { ...draft.content, inShort: 'What both say about it, in a sentence.' }
    const settled = await ask<{ version: number }>(writer, 'post', `/edits/${draft.id}/merge`, {
      body: { baseEdition: edition, content },
      headers: ifMatch(draft),
      status: 200,
    })
    await ask(writer, 'post', `/edits/${draft.id}/withdraw`, { headers: ifMatch(settled), status: 200 })
  })
})
