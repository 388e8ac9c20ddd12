export type { BodySegment, CalculatorPart, EffectsPart, RenderedPart, WorkedPart }

import type { CarEnd } from '#shared/cars/car-ends.ts'

/** A calculator with the writer's starting values, in the unit of each input. */
interface CalculatorPart {
  n: number
  kind: 'calculator'
  slug: string
  preset: Record<string, number>
  /** Which end of the car it is about, where the writer says so. */
  end?: CarEnd
}

/** The lap line of one adjustable. */
interface EffectsPart {
  n: number
  kind: 'effects'
  adjustable: string
}

/**
 * A worked example: the run, the answer the writer expects, and how far off it may be as a fraction (0.01 =
 * 1 %).
 */
interface WorkedPart {
  n: number
  kind: 'worked'
  slug: string
  inputs: Record<string, number>
  expect: { key: string; value: number }
  tolerance: number
}

type RenderedPart = CalculatorPart | EffectsPart | WorkedPart

/** A body in reading order: stretches of complete HTML with the parts between them. */
type BodySegment = { kind: 'html'; html: string } | RenderedPart
