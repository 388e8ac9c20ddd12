export type { ApiAnswer, ApiDescription, ApiOperation, AnswerHeader, Who }

import type { z } from 'zod'

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'
type Who = 'members' | 'verified members' | 'moderators' | 'admins'
type AnswerHeader = 'ETag' | 'Link' | 'Location' | 'X-Total-Count'

interface ApiAnswer {
  says: string
  /** JSON; nothing is sent when it is left out. */
  body?: z.ZodType
  headers?: AnswerHeader[]
}

/** One route. What goes wrong with any request of its kind need not be named: see common-problems.ts. */
interface ApiOperation {
  /** A verb and its object; programs that make a client from the document call its function so. */
  id: string
  summary: string
  /** Everybody when left out. */
  who?: Who
  /** What stands for each `:name` of the path. */
  params?: Record<string, z.ZodType>
  query?: z.ZodObject
  body?: z.ZodType
  /** Takes an Idempotency-Key. */
  once?: true
  /** Wants the version that it was made for in If-Match. */
  ifMatch?: true
  /** May be done only so often. */
  limited?: true
  answers: Record<number, ApiAnswer>
  /** What can go wrong besides, by status. */
  problems?: Record<number, string>
}

/** What a capability says about its routes under /api. It stands beside them; server/app.ts names both. */
interface ApiDescription {
  name: string
  about: string
  /** As the routers spell them, such as `GET /guides/:slug`. */
  operations: Record<`${Method} /${string}`, ApiOperation>
  /** Schemas with a name of their own in the document, of what is answered and of what is sent. */
  answers?: Record<string, z.ZodType>
  inputs?: Record<string, z.ZodType>
}
