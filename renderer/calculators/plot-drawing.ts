export { drawPlot }
export type { PlotDrawing }

import { plainSentence } from '#shared/calculators/sentence.ts'
import { formatNumber } from '#shared/units/format-number.ts'
import { unitFor, type UnitChoices } from '#shared/units/unit-choices.ts'
import { convert, unitById } from '#shared/units/units.ts'
import { plotScale, type PlotScale } from './plot-scale.ts'
import type { PlotAxis, PlotSpec } from '#shared/calculators/plot.ts'

const width = 440
const height = 276
const top = 26
const bottom = height - 48
/** Room for a letter at the size of the labels, in drawing units. */
const letter = 7.2

interface PlotLabel {
  x: number
  y: number
  text: string
  anchor: 'start' | 'middle' | 'end'
}
interface PlotDrawing {
  width: number
  height: number
  /** The two axes. */
  frame: string
  grid: string
  tickMarks: string
  ticks: PlotLabel[]
  titles: PlotLabel[]
  lines: { d: string; main: boolean; label: PlotLabel | undefined }[]
  points: { x: number; y: number; drop: string; label: PlotLabel }[]
}

/**
 * Everything a plot needs as places in the drawing, the same on the server and in the browser. `withPoints`
 * is false while the reader's values have no answer: the lines stay, for the range, and the point goes.
 */
function drawPlot(spec: PlotSpec, choices: UnitChoices, withPoints = true): PlotDrawing {
  const endLabels = spec.lines.map(({ label }) => plainSentence(label, choices))
  const yText = (value: number) => formatNumber(value, 5)
  const yUnit = unitFor(spec.y.unit, choices)
  const yEnds = ends(spec.y, choices)
  const widest = Math.max(...plotScale(spec.y.scale, yEnds, [0, 1]).ticks.map((tick) => yText(tick).length))
  const left = Math.max(34, 14 + widest * letter)
  const right = width - Math.max(24, 10 + Math.max(0, ...endLabels.map((label) => label.length)) * letter)
  const [xEnds, yFitted] = spec.equalScale
    ? equalled(ends(spec.x, choices), yEnds, (right - left) / (bottom - top))
    : [ends(spec.x, choices), yEnds]
  const x = plotScale(spec.x.scale, xEnds, [left, right])
  const y = plotScale(spec.y.scale, yFitted, [bottom, top])
  const place = ([px, py]: readonly [number, number]) =>
    [
      round(x.at(convert(px, spec.x.unit, unitFor(spec.x.unit, choices)))),
      round(y.at(convert(py, spec.y.unit, yUnit))),
    ] as const

  const lines = spec.lines.map(({ points, kind }, index) => {
    const placed = points.map(place)
    const [endX = right, endY = bottom] = placed.at(-1) ?? []
    const text = endLabels[index] ?? ''
    return {
      d: `M${placed.map((point) => point.join(' ')).join('L')}`,
      main: kind === 'main',
      label: text === '' ? undefined : { x: endX + 6, y: endY + 5, text, anchor: 'start' as const },
    }
  })
  spreadOut(lines.flatMap(({ label }) => label ?? []))

  return {
    width,
    height,
    lines,
    frame: `M${left} ${top}V${bottom}H${right}`,
    grid: y.ticks.map((tick) => `M${left} ${round(y.at(tick))}H${right}`).join(''),
    tickMarks: x.ticks.map((tick) => `M${round(x.at(tick))} ${bottom}v5`).join(''),
    ticks: [
      ...tickLabels(y, (at, text) => ({ x: left - 8, y: at + 5, text, anchor: 'end' })),
      ...tickLabels(x, (at, text) => ({ x: at, y: bottom + 22, text, anchor: 'middle' })),
    ],
    titles: [
      { x: 0, y: 13, text: titleOf(spec.y, choices), anchor: 'start' },
      { x: right, y: height - 4, text: titleOf(spec.x, choices), anchor: 'end' },
    ],
    points: withPoints
      ? spec.points.map((point) =>
          pointAt(
            place([point.x, point.y]),
            plainSentence(point.label, choices),
            { left, right },
            rises(spec),
          ),
        )
      : [],
  }
}

function ends(axis: PlotAxis, choices: UnitChoices): [number, number] {
  const unit = unitFor(axis.unit, choices)
  return [convert(axis.min, axis.unit, unit), convert(axis.max, axis.unit, unit)]
}

/** Widens the axis that has room, so that a unit is as long across as up. */
function equalled(
  x: [number, number],
  y: [number, number],
  shape: number,
): [[number, number], [number, number]] {
  const perUnit = Math.max((x[1] - x[0]) / shape, y[1] - y[0])
  const widened = ([min, max]: [number, number], span: number): [number, number] => [
    (min + max - span) / 2,
    (min + max + span) / 2,
  ]
  return [widened(x, perUnit * shape), widened(y, perUnit)]
}

function tickLabels(scale: PlotScale, label: (at: number, text: string) => PlotLabel): PlotLabel[] {
  return scale.ticks.map((tick) => label(round(scale.at(tick)), formatNumber(tick, 5)))
}

function titleOf(axis: PlotAxis, choices: UnitChoices): string {
  const { symbol } = unitById(unitFor(axis.unit, choices))
  return symbol === '' ? axis.label : `${axis.label}, ${symbol}`
}

function rises(spec: PlotSpec): boolean {
  const main = spec.lines.find(({ kind }) => kind === 'main')?.points
  return (main?.at(-1)?.[1] ?? 0) > (main?.[0]?.[1] ?? 0)
}

/**
 * The label stands below the line: right of the point where the line rises, left where it falls, unless there
 * is no room.
 */
function pointAt(
  [x, y]: readonly [number, number],
  text: string,
  { left, right }: { left: number; right: number },
  rising: boolean,
) {
  const room = text.length * letter + 12
  const toRight = rising ? x + room <= right || x - room < left : x - room < left
  const below = y + 24 < bottom
  return {
    x,
    y,
    drop: `M${x} ${bottom}V${y}H${left}`,
    label: {
      x: toRight ? x + 12 : x - 12,
      y: below ? y + 24 : y - 14,
      text,
      anchor: toRight ? ('start' as const) : ('end' as const),
    },
  }
}

/** Labels at the ends of lines that lie close together are moved apart, from the lowest up. */
function spreadOut(labels: PlotLabel[]): void {
  const fromBelow = [...labels].sort((a, b) => b.y - a.y)
  fromBelow.forEach((label, index) => {
    const under = fromBelow[index - 1]
    if (under !== undefined) label.y = Math.min(label.y, under.y - 15)
  })
}

function round(value: number): number {
  return Math.round(value * 10) / 10
}
