export { keepInAddress, linkOf }

import { linkQuery } from '#shared/calculators/query.ts'
import type { CarEnd } from '#shared/cars/car-ends.ts'
import type { CalculatorDefinition } from '#shared/calculators/definition.ts'
import type { InstrumentProps } from './instrument-props.ts'

/** Where this instrument stands, with these numbers, about this end of the car; without numbers, with the guide's. */
function linkOf(
  definition: CalculatorDefinition,
  { action = '', instanceId }: InstrumentProps,
  inputs: Readonly<Record<string, number>> = {},
  end?: CarEnd,
): string {
  const query = linkQuery(definition, instanceId, inputs, end)
  return `${action}${query === '' ? '' : `?${query}`}#${instanceId}`
}

/**
 * Puts the numbers into the address of this page, so that reload and bookmark keep them, and leaves other
 * instruments' alone.
 */
function keepInAddress(instanceId: string, link: string): void {
  const address = new URL(location.href)
  const own = [...address.searchParams.keys()].filter((name) => name.startsWith(`${instanceId}.`))
  for (const name of own) address.searchParams.delete(name)
  for (const [name, value] of new URL(link, address).searchParams) address.searchParams.set(name, value)
  address.hash = instanceId
  history.replaceState(history.state, '', address)
}
