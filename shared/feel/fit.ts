export { fitOf }
export type { FeelConditions }

import { feelWeights } from './weights.ts'
import type { Bite, CarClass, Surface } from '#shared/vocabulary/conditions.ts'

/** What the reader said about car and track; what is missing was not said. */
interface FeelConditions {
  carClass?: CarClass
  surface?: Surface
  bite?: Bite
}

interface Conditional {
  surfaces: readonly Surface[]
  bites: readonly Bite[]
  carClasses: readonly CarClass[]
}

/**
 * How well an effect's conditions fit the reader's: for each thing the reader said, 1 where the effect names
 * it, 0.8 where it is silent about it, 0 where it names another; multiplied. What the reader did not say does
 * not count.
 */
function fitOf(effect: Conditional, { carClass, surface, bite }: FeelConditions): number {
  return one(effect.surfaces, surface) * one(effect.bites, bite) * one(effect.carClasses, carClass)
}

function one<T>(named: readonly T[], reader: T | undefined): number {
  if (reader === undefined) return 1
  if (named.length === 0) return feelWeights.silentFit
  return named.includes(reader) ? feelWeights.namedFit : 0
}
