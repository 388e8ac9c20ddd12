export { nextStep }

import { convert, type UnitId } from '#shared/units/units.ts'
import type { CalculatorInput } from './definition.ts'

/**
 * Where plus (`up`) or minus takes a value: the next rung of the ladder, or the next multiple of the step as
 * the reader sees it in `shown`. Steps stop at the ends of the range, where this returns undefined; from
 * outside it, the way back leads to the nearer end. Value and result are in the input's unit.
 */
function nextStep(
  input: CalculatorInput,
  value: number,
  direction: 'up' | 'down',
  shown: UnitId,
): number | undefined {
  if (value > input.max) return direction === 'down' ? input.max : undefined
  if (value < input.min) return direction === 'up' ? input.min : undefined
  const next =
    input.ladder === undefined
      ? nextMultiple(input, value, direction, shown)
      : nextRung(input.ladder, value, direction)
  return next === undefined || next < input.min || next > input.max ? undefined : next
}

function nextRung(ladder: readonly number[], value: number, direction: 'up' | 'down'): number | undefined {
  return direction === 'up' ? ladder.find((rung) => rung > value) : ladder.findLast((rung) => rung < value)
}

function nextMultiple(
  input: CalculatorInput,
  value: number,
  direction: 'up' | 'down',
  shown: UnitId,
): number {
  const own = input.step ?? 1
  const span = Math.abs(convert(own, input.unit, shown) - convert(0, input.unit, shown))
  const step = shown === input.unit ? own : roundStep(span)
  const seen = convert(value, input.unit, shown)
  // Rounding keeps 0.1 + 0.2 a rung of the ladder of tenths.
  const rung = Number((seen / step).toPrecision(12))
  const next = Number(
    ((direction === 'up' ? Math.floor(rung) + 1 : Math.ceil(rung) - 1) * step).toPrecision(12),
  )
  return convert(next, shown, input.unit)
}

/** The nearest of 1, 2, 5, 10, 20 ... to a converted step: nobody steps in 0.0393701 in. */
function roundStep(span: number): number {
  const power = 10 ** Math.floor(Math.log10(span))
  const nice = [1, 2, 5, 10].map((digit) => digit * power)
  const nearest = nice.reduce((best, step) =>
    Math.abs(Math.log(step / span)) < Math.abs(Math.log(best / span)) ? step : best,
  )
  return Number(nearest.toPrecision(6))
}
