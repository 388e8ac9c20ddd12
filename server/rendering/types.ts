export type { CalculatorVocabulary, Heading, RenderProblem, RenderResult, RenderVocabulary }

import type { CarEnd } from '#shared/cars/car-ends.ts'
import type { RenderedPart } from '#shared/rendering/parts.ts'

/** What the renderer has to know of one calculator to check the numbers a guide gives it. */
interface CalculatorVocabulary {
  slug: string
  title: string
  inputs: { key: string; min: number; max: number; unit: string }[]
  outputs: { key: string; unit: string }[]
  /** The ends of the car it can be about; none where it is about the whole car. */
  ends: CarEnd[]
}

/**
 * Everything outside the text that a body may refer to, as plain data because it crosses into a worker
 * thread.
 */
interface RenderVocabulary {
  calculators: CalculatorVocabulary[]
  /** Glossary entries by key; `short` is one sentence. */
  glossary: Record<string, { term: string; short: string }>
  /** Keys of the adjustables, such as `front_diff_fluid`. */
  adjustables: string[]
}

/** Something the writer should mend. The text is still rendered. `line` counts from 1 in the Markdown. */
interface RenderProblem {
  line: number
  code: string
  message: string
}

/** A heading of the body outside lists and quotes; `id` is the fragment to link to. */
interface Heading {
  level: number
  id: string
  text: string
}

interface RenderResult {
  /** Sanitised HTML with one empty placeholder for each part (see shared/rendering/split-parts.ts). */
  html: string
  parts: RenderedPart[]
  headings: Heading[]
  problems: RenderProblem[]
  /** The words alone, one line a block, for descriptions and search. */
  plainText: string
  rendererVersion: number
}
