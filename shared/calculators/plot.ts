export { sampled }
export type { PlotAxis, PlotLine, PlotPoint, PlotSpec }

import type { Sentence } from './sentence.ts'
import type { UnitId } from '#shared/units/units.ts'

interface PlotAxis {
  /** What the axis measures, for the text beside the plot: “temperature”. */
  label: string
  unit: UnitId
  /** Ends of the axis in `unit`; min < max, and min > 0 when the scale is logarithmic. */
  min: number
  max: number
  scale: 'linear' | 'log'
}

interface PlotLine {
  points: readonly (readonly [x: number, y: number])[]
  /** Printed at the right end of the line. */
  label: Sentence
  /** The reader's own line is drawn strong, the others dashed for comparison. */
  kind: 'main' | 'other'
}

interface PlotPoint {
  x: number
  y: number
  label: Sentence
}

/**
 * A drawing as data, in the calculator's own units. `equalScale` makes one millimetre as long on both axes:
 * with it, a linkage seen from the front is a plot too.
 */
interface PlotSpec {
  /** Says in words what the picture shows; read aloud in its place. */
  alternative: Sentence
  x: PlotAxis
  y: PlotAxis
  lines: readonly PlotLine[]
  points: readonly PlotPoint[]
  equalScale?: true
}

/** `count` + 1 points of y(x), evenly spaced from `from` to `to`. */
function sampled(from: number, to: number, y: (x: number) => number, count = 40): [number, number][] {
  return Array.from({ length: count + 1 }, (_, index) => {
    const x = from + ((to - from) * index) / count
    return [x, y(x)]
  })
}
