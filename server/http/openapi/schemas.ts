export { nameSchemas, propertiesOf }
export type { JsonSchema, SchemaNames }

import { z } from 'zod'
import { Problem } from '../problem.ts'
import type { ApiDescription, ApiOperation } from './describe.ts'

type JsonSchema = Record<string, unknown>

interface SchemaNames {
  /** Every schema of the document by its name. */
  all: Record<string, JsonSchema>
  /** A reference to a schema that some operation answers, or is sent. */
  ref(schema: z.ZodType): { $ref: string }
}

const addressOf = (name: string) => `#/components/schemas/${name}`

/**
 * Turns every schema that the operations speak of into JSON Schema; those without a name of their own are called after
 * their operation. Throws when two would have the same name.
 */
function nameSchemas(descriptions: readonly ApiDescription[]): SchemaNames {
  const answers = z.registry<{ id: string }>()
  const inputs = z.registry<{ id: string }>()
  const taken = new Set<string>()
  const name = (registry: typeof answers, schema: z.ZodType, id: string) => {
    if (registry.has(schema)) return
    if (taken.has(id)) throw new Error(`Two schemas of the API are called ${id}.`)
    taken.add(id)
    registry.add(schema, { id })
  }
  name(answers, Problem, 'Problem')
  for (const description of descriptions) {
    for (const [id, schema] of Object.entries(description.answers ?? {})) name(answers, schema, id)
    for (const [id, schema] of Object.entries(description.inputs ?? {})) name(inputs, schema, id)
  }
  for (const { id, answers: sent, body } of descriptions.flatMap(({ operations }) => Object.values<ApiOperation>(operations))) {
    const title = id[0]!.toUpperCase() + id.slice(1)
    if (body !== undefined) name(inputs, body, `${title}Body`)
    for (const [status, answer] of Object.entries(sent)) {
      if (answer.body !== undefined) name(answers, answer.body, `${title}Answer${status.startsWith('2') ? '' : status}`)
    }
  }
  const { schemas: ofInputs } = z.toJSONSchema(inputs, { io: 'input', uri: addressOf, override: ({ jsonSchema }) => leaveOutNoise(jsonSchema) })
  const { schemas: ofAnswers } = z.toJSONSchema(answers, {
    io: 'output',
    // What a transform makes cannot be told from its code; such a member then may be anything.
    unrepresentable: 'any',
    uri: addressOf,
    override: ({ jsonSchema }) => {
      leaveOutNoise(jsonSchema)
      // An answer may gain members in a later version, so the document does not close what the server sends.
      if (jsonSchema.additionalProperties === false) delete jsonSchema.additionalProperties
    },
  })
  const bare = Object.entries({ ...ofAnswers, ...ofInputs }).map(([id, schema]) => {
    const { $schema: _dialect, $id: _address, ...rest } = schema as JsonSchema
    return [id, rest] as const
  })
  return {
    all: Object.fromEntries(bare.sort(([one], [other]) => one.localeCompare(other))),
    ref: (schema) => ({ $ref: addressOf((answers.get(schema) ?? inputs.get(schema))!.id) }),
  }
}

/** A pattern that says what the format says already, and limits that are only those of every number. */
function leaveOutNoise(schema: JsonSchema): void {
  if (schema.format !== undefined) delete schema.pattern
  if (schema.minimum === Number.MIN_SAFE_INTEGER) delete schema.minimum
  if (schema.maximum === Number.MAX_SAFE_INTEGER) delete schema.maximum
}

/** The members of an object that is sent, each as JSON Schema: for parameters. */
function propertiesOf(schema: z.ZodObject): { name: string; schema: JsonSchema; required: boolean }[] {
  const { properties = {}, required = [] } = z.toJSONSchema(schema, { io: 'input', override: ({ jsonSchema }) => leaveOutNoise(jsonSchema) })
  return Object.entries(properties).map(([name, property]) => ({ name, schema: property as JsonSchema, required: required.includes(name) }))
}
