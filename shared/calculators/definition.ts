export { defineCalculator }
export type {
  CalculatorAnswer,
  CalculatorCaution,
  CalculatorComparison,
  CalculatorCursor,
  CalculatorDefinition,
  CalculatorInput,
  CalculatorOutput,
  CalculatorPart,
  CalculatorSource,
  CalculatorSymbol,
  CalculatorTable,
  CalculatorWorking,
  FieldMessage,
  WorkingStep,
}

import type { DrawingSpec } from './drawing.ts'
import type { MathNode } from './mathml.ts'
import type { PlotSpec } from './plot.ts'
import type { Figure, Sentence } from './sentence.ts'
import type { CarEnd, CarKey } from '#shared/cars/car-values.ts'
import type { UnitId } from '#shared/units/units.ts'
import type { CautionKind } from '#shared/vocabulary/cautions.ts'

type CalculatorPart =
  | 'tyres'
  | 'driveline'
  | 'wheel angles'
  | 'springs and shocks'
  | 'ride height and movement'
  | 'weight'
  | 'motor and gearing'
  | 'bench'

interface CalculatorInput<Key extends string = string> {
  /** Name in the API, in links and in `::calculator` directives; a contract, never renamed. */
  key: Key
  label: string
  /** All numbers of this input below are in this unit, and `compute` gets it in this unit. */
  unit: UnitId
  default: number
  /** Ends of what is accepted, both included. */
  min: number
  max: number
  /** Why nothing outside the range is accepted; ends the sentence “… must be between … and …: ”. */
  reason: string
  /** Only whole numbers (teeth, cells, holes). */
  whole?: true
  /** Where plus and minus go: a fixed step, or a ladder of things one can buy. */
  step?: number
  ladder?: readonly number[]
  /** One short sentence under the field: where to read this off the car. */
  help?: string
  /**
   * Which value of “my car” fills this in. Where the calculator is about one end of the car, one for each end
   * that has such a part; the reader then says which end is meant.
   */
  carKey?: CarKey | Partial<Record<CarEnd, CarKey>>
}

interface CalculatorOutput<Key extends string = string> {
  key: Key
  label: string
  unit: UnitId
  /** Significant digits on the page; the API gives double precision. */
  digits: number
  /** Always shown in `unit`, whatever the reader chose: the output exists to show that unit. */
  fixedUnit?: true
}

/** Something to say about one field. */
interface FieldMessage {
  field: string
  message: Sentence
}

interface CalculatorAnswer {
  /** The result as one sentence with its main figure. */
  says: Sentence
  /** What it means, in at most three more sentences. */
  more: readonly Sentence[]
}

interface WorkingStep {
  /** What the step finds, in words. */
  title: string
  formula?: MathNode
  /** The same with the numbers put in. */
  numbers?: MathNode
  result?: Figure
}

interface CalculatorSymbol {
  symbol: MathNode
  means: Sentence
}

interface CalculatorWorking {
  steps: readonly WorkingStep[]
  symbols: readonly CalculatorSymbol[]
}

/**
 * A table with a head for every row; cells of a row share its unit. An `own` row, the column at place
 * `ownColumn` (from 0) or the cell where both cross is the reader's own.
 */
interface CalculatorTable {
  caption: string
  columns: readonly string[]
  rows: readonly { label: Sentence; unit: UnitId; digits: number; cells: readonly number[]; own?: true }[]
  ownColumn?: number
}

/** What is, beside what would be. The first column is the car as it is, the second the change. */
interface CalculatorComparison extends CalculatorTable {
  /** The difference in words: “0.2 mm thicker makes this bar 38 % stiffer.” */
  says: Sentence
}

/**
 * A movement that the reader can go through without changing any input, such as the travel of the wheel.
 * Plots and drawings get the place as `at`; the numbers of the answer stay those at `start`.
 */
interface CalculatorCursor<In extends string = string> {
  label: string
  unit: UnitId
  step: number
  start: number
  ends(inputs: Record<In, number>): readonly [number, number]
}

interface CalculatorSource {
  text: string
  url?: string
  /**
   * How the project knows it, in plain words: “read in …”, “from memory”, “computed independently with …”,
   * “common practice”.
   */
  known: string
}

interface CalculatorCaution {
  kind: CautionKind
  title: string
  /** What to do, in one sentence. */
  order: string
  reason: string
}

/**
 * Everything about one calculator. Functions are pure; the `inputs` they get have passed `checkInputs`, so
 * they are finite, inside their ranges and related as `relations` wants. `compute` may throw `NoAnswerError`
 * where the values have no answer.
 */
interface CalculatorDefinition<In extends string = string, Out extends string = string> {
  /** Same as the folder's name. */
  slug: string
  title: string
  /** Two sentences: what it answers, and when one wants to know. */
  purpose: string
  part: CalculatorPart
  /** Further words by which people look for it. */
  keywords: readonly string[]
  inputs: readonly CalculatorInput<In>[]
  outputs: readonly CalculatorOutput<Out>[]
  compute(inputs: Record<In, number>): Record<Out, number>
  /** Values that are each in range but do not go together. */
  relations?(inputs: Record<In, number>): FieldMessage[]
  /** Possible values for which the formula holds less well. */
  warnings(inputs: Record<In, number>, outputs: Record<Out, number>): FieldMessage[]
  answer(inputs: Record<In, number>, outputs: Record<Out, number>): CalculatorAnswer
  working(inputs: Record<In, number>, outputs: Record<Out, number>): CalculatorWorking
  cursor?: CalculatorCursor<In>
  /** `at` is the place of the cursor; without a cursor it is 0. */
  plots?(inputs: Record<In, number>, outputs: Record<Out, number>, at: number): readonly PlotSpec[]
  /** To scale, moving with the numbers. */
  drawings?(inputs: Record<In, number>, outputs: Record<Out, number>, at: number): readonly DrawingSpec[]
  /** Before and after, where a change is being considered. */
  comparison?(inputs: Record<In, number>, outputs: Record<Out, number>): CalculatorComparison
  /** Further tables, such as the neighbouring pinions. */
  tables?(inputs: Record<In, number>, outputs: Record<Out, number>): readonly CalculatorTable[]
  limits: { goodBetween: string; howClose: string }
  sources: readonly CalculatorSource[]
  cautions: readonly CalculatorCaution[]
}

/**
 * Writes a definition down with its keys checked: `compute` must give every output, and can read only the
 * inputs there are.
 */
function defineCalculator<const In extends string, const Out extends string>(
  definition: CalculatorDefinition<In, Out>,
): CalculatorDefinition<In, Out> {
  return definition
}
