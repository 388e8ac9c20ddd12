export { listUses }
export type { CarUses }

import type { App } from '../context.ts'
import { enteredFor } from '#shared/cars/derived-values.ts'
import type { CarKey, EnteredCarKey } from '#shared/cars/car-values.ts'

/** The calculators that start from a value, by the value that is entered. */
type CarUses = Partial<Record<EnteredCarKey, { slug: string; title: string }[]>>

/** Which calculators ask a car for what. Adding a calculator changes nothing here. */
function listUses({ calculators }: Pick<App, 'calculators'>): CarUses {
  const uses: CarUses = {}
  for (const { slug, title, inputs } of calculators.values()) {
    const asked = inputs.flatMap(({ carKey = {} }): CarKey[] => (typeof carKey === 'object' ? Object.values(carKey) : [carKey]))
    for (const key of new Set(asked.flatMap(enteredFor))) uses[key] = [...(uses[key] ?? []), { slug, title }]
  }
  return uses
}
