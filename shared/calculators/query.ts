export { linkQuery, parametersFor }

import { endsOf } from './ends.ts'
import type { CarEnd } from '#shared/cars/car-ends.ts'
import type { CalculatorDefinition } from './definition.ts'

/**
 * What the address of a page says about one instrument on it. `kept['heat.temperature']` becomes
 * `temperature` for the instance `heat`. A parameter given twice counts once, with its first value.
 */
function parametersFor(
  query: Readonly<Record<string, string | readonly string[] | undefined>>,
  instanceId: string,
): Record<string, string> {
  const prefix = `${instanceId}.`
  const found: Record<string, string> = {}
  for (const [name, value] of Object.entries(query)) {
    const first = typeof value === 'string' ? value : value?.[0]
    if (name.startsWith(prefix) && first !== undefined) found[name.slice(prefix.length)] = first
  }
  return found
}

/**
 * The query that carries every number, always in the calculator's own units, so that the link means the same
 * to a reader with other units: `heat.temperature=55&heat.viscosityAt25=7000`. Where the calculator is about one end of the
 * car, the link says which.
 */
function linkQuery(
  definition: CalculatorDefinition,
  instanceId: string,
  inputs: Readonly<Record<string, number>>,
  end?: CarEnd,
): string {
  const numbers = definition.inputs.flatMap(({ key }) => (inputs[key] === undefined ? [] : [[key, String(inputs[key])]]))
  const said = end !== undefined && endsOf(definition).length > 1 ? [...numbers, ['end', end]] : numbers
  return said
    .map(([key, value]) => `${encodeURIComponent(`${instanceId}.${key}`)}=${encodeURIComponent(value!)}`)
    .join('&')
}
