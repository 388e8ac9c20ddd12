export { plotScale }
export type { PlotScale }

interface PlotScale {
  /** Place in the drawing of a value on the axis. */
  at(value: number): number
  ticks: number[]
}

/**
 * A linear or logarithmic axis from `[min, max]` to `[from, to]` in the drawing. Gives what d3-scale gives
 * (plot-scale.test.ts holds it against that library), but an instrument would spend 13 kB on d3-scale in the
 * browser, more than all its own code.
 */
function plotScale(
  kind: 'linear' | 'log',
  [min, max]: readonly [number, number],
  [from, to]: readonly [number, number],
  count = 5,
): PlotScale {
  const bend = kind === 'log' ? Math.log10 : (value: number) => value
  const low = bend(min)
  const span = bend(max) - low
  const decades = kind === 'log' ? decadeTicks(min, max) : []
  return {
    at: (value) => from + ((bend(value) - low) / span) * (to - from),
    // Less than three marks of 1, 2 and 5 would not tell a reader where a value is, so a short axis gets even
    // marks.
    ticks: decades.length >= 3 ? decades : evenTicks(min, max, count),
  }
}

/** Round marks, 1, 2 or 5 times a power of ten apart, about `count` of them, inside [min, max]. */
function evenTicks(min: number, max: number, count: number): number[] {
  const raw = (max - min) / count
  const power = 10 ** Math.floor(Math.log10(raw))
  const over = raw / power
  const step = power * (over >= Math.sqrt(50) ? 10 : over >= Math.sqrt(10) ? 5 : over >= Math.sqrt(2) ? 2 : 1)
  const first = Math.ceil(min / step - 1e-9)
  const last = Math.floor(max / step + 1e-9)
  return Array.from({ length: last - first + 1 }, (_, index) =>
    Number(((first + index) * step).toPrecision(12)),
  )
}

/** 1, 2 and 5 of every decade; whole decades alone when that would be more than eight marks. */
function decadeTicks(min: number, max: number): number[] {
  const first = Math.floor(Math.log10(min))
  const last = Math.ceil(Math.log10(max))
  const marks = (digits: number[]) =>
    Array.from({ length: last - first + 1 }, (_, index) => first + index)
      .flatMap((exponent) => digits.map((digit) => Number(`${digit}e${exponent}`)))
      .filter((value) => value >= min && value <= max)
  const fine = marks([1, 2, 5])
  return fine.length > 8 ? marks([1]) : fine
}
