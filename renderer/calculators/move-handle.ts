export { movedValues, saidOf, stepOf }
export type { Grip }

import { runDefinition } from '#shared/calculators/run-definition.ts'
import { figure, plainSentence, say, type Sentence } from '#shared/calculators/sentence.ts'
import { unitFor, type UnitChoices } from '#shared/units/unit-choices.ts'
import { convert, type UnitId } from '#shared/units/units.ts'
import type { CalculatorDefinition, CalculatorInput } from '#shared/calculators/definition.ts'
import type { DrawingHandle } from '#shared/calculators/drawing.ts'

/** What a point of a drawing needs to move the values behind it. */
interface Grip {
  definition: CalculatorDefinition
  /** The values that the drawing shows. */
  inputs: Readonly<Record<string, number>>
  set(values: Record<string, number>): void
}

interface Moved {
  /** The values to take over; none where they would have no answer. */
  values: Record<string, number> | undefined
  /** Why the point does not follow all the way. */
  stopped: Sentence | undefined
}

/** Steps that look round in the reader's unit; drags go by `fine` ones. In `own`, the unit of the inputs. */
function stepOf(own: UnitId, choices: UnitChoices, kind: 'fine' | 'arrow' | 'shift'): number {
  const shown = unitFor(own, choices)
  const steps = shown === 'in' ? { fine: 0.02, arrow: 0.05, shift: 0.2 } : { fine: 0.5, arrow: 1, shift: 5 }
  return convert(steps[kind], shown, own)
}

/**
 * The values with a point at (x, y), in the drawing's unit. It stops at the ends of the ranges, and where the
 * calculator has no answer; then the words say why.
 */
function movedValues({ definition, inputs }: Grip, handle: DrawingHandle, x: number, y: number): Moved {
  const values: Record<string, number> = {}
  let stopped: Sentence | undefined
  for (const [key, wanted] of [[handle.x, x], [handle.y, y]] as const) {
    const input = inputOf(definition, key)
    if (input === undefined) continue
    const value = Math.min(input.max, Math.max(input.min, wanted))
    // Sums of steps are not to end in 0.30000000000000004.
    values[input.key] = Number(value.toPrecision(12))
    if (value !== wanted) stopped = say`${input.label} stops at ${figure(value, input.unit, 7)}: ${input.reason}.`
  }
  const run = runDefinition(definition, { ...inputs, ...values })
  return run.ok ? { values, stopped } : { values: undefined, stopped: run.errors[0]?.message }
}

/** Where a point is, for a screen reader: “Lower outer pin, out 105 mm, Lower outer pin, up 28 mm”. */
function saidOf({ definition, inputs }: Grip, handle: DrawingHandle, choices: UnitChoices): string {
  return [handle.x, handle.y]
    .flatMap((key) => {
      const input = inputOf(definition, key)
      if (input === undefined) return []
      return plainSentence(say`${input.label} ${figure(inputs[input.key] ?? input.default, input.unit, 5)}`, choices)
    })
    .join(', ')
}

function inputOf(definition: CalculatorDefinition, key: string | undefined): CalculatorInput | undefined {
  return definition.inputs.find((input) => input.key === key)
}
