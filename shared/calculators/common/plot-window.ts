export { roundedUp, windowAround }

/**
 * Ends of a plot axis that jump in steps, so that the picture stands still while the value on it moves: from
 * a step below the nearest multiple of `step` to a step above it.
 */
function windowAround(value: number, step: number): [number, number] {
  const middle = Math.round(value / step) * step
  return [middle - step, middle + step]
}

/** The next of 1, 1.5, 2, 3, 4, 5, 6, 8, 10 times a power of ten; for the top of an axis. Positive values only. */
function roundedUp(value: number): number {
  const power = 10 ** Math.floor(Math.log10(value))
  const times = [1, 1.5, 2, 3, 4, 5, 6, 8].find((rung) => rung * power >= value) ?? 10
  return Number((times * power).toPrecision(6))
}
