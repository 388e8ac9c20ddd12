export { drawPlot }
export type { PlotDrawing }

import { plainSentence } from '#shared/calculators/sentence.ts'
import { formatNumber } from '#shared/units/format-number.ts'
import { unitFor, type UnitChoices } from '#shared/units/unit-choices.ts'
import { convert, unitById } from '#shared/units/units.ts'
import { figureWidth, letter, round } from './figure-size.ts'
import { keepApart, type PlacedText } from './keep-apart.ts'
import { clippedPath, type PlotPlace } from './plot-path.ts'
import { plotScale, type PlotScale } from './plot-scale.ts'
import type { PlotAxis, PlotSpec } from '#shared/calculators/plot.ts'

const top = 28

type PlotLabel = PlacedText
interface PlotDrawing {
  width: number
  height: number
  /** The two axes. */
  frame: string
  grid: string
  /** Where an axis goes through zero on the way from negative to positive. */
  zero: string
  tickMarks: string
  lines: { d: string; main: boolean }[]
  points: { x: number; y: number; drop: string }[]
  words: PlotLabel[]
}

/**
 * Everything a plot needs as places in the drawing, the same on the server and in the browser. `withPoints`
 * is false while the reader's values have no answer: the lines stay, for the range, and the point goes.
 */
function drawPlot(spec: PlotSpec, choices: UnitChoices, withPoints = true, width = figureWidth): PlotDrawing {
  const height = Math.round(width * 0.66 + 24)
  const bottom = height - 46
  const endLabels = spec.lines.map(({ label }) => plainSentence(label, choices))
  const marks = width < figureWidth ? 4 : 5
  const yText = (value: number) => formatNumber(value, 5)
  const yUnit = unitFor(spec.y.unit, choices)
  const yEnds = ends(spec.y, choices)
  const widest = Math.max(
    ...plotScale(spec.y.scale, yEnds, [0, 1], marks).ticks.map((tick) => yText(tick).length),
  )
  const left = Math.round(Math.max(30, 13 + widest * letter))
  // Long words at the end of a line would leave no room for the line, so they stand over its end instead.
  const longest = Math.max(0, ...endLabels.map((label) => label.length)) * letter
  const beside = longest <= width * 0.22
  const right = Math.round(width - (beside ? Math.max(20, 10 + longest) : 14))
  const [xEnds, yFitted] = spec.equalScale
    ? equalled(ends(spec.x, choices), yEnds, (right - left) / (bottom - top))
    : [ends(spec.x, choices), yEnds]
  const x = plotScale(spec.x.scale, xEnds, [left, right], marks)
  const y = plotScale(spec.y.scale, yFitted, [bottom, top], marks)
  const place = ([px, py]: readonly [number, number]): PlotPlace => [
    round(x.at(convert(px, spec.x.unit, unitFor(spec.x.unit, choices)))),
    round(y.at(convert(py, spec.y.unit, yUnit))),
  ]

  const lines = spec.lines.map(({ points, kind }) => ({ placed: points.map(place), main: kind === 'main' }))
  const atEnds = lines.flatMap(({ placed, main }, index) => {
    const seen = placed.findLast((point) => point[1] >= top - 1 && point[1] <= bottom + 1)
    const text = endLabels[index] ?? ''
    return seen === undefined || text === '' ? [] : [endLabel(seen, text, main ? 'ck' : '', beside)]
  })
  if (beside) spreadOut(atEnds)
  const points = withPoints ? spec.points.map((point) => place([point.x, point.y])) : []
  const edges = { left, right: width, bottom }
  const own = points.map((at, index) =>
    besidePoint(at, plainSentence(spec.points[index]!.label, choices), edges, rises(spec)),
  )
  const around: PlotLabel[] = [
    ...tickLabels(y, (at, text) => ({ x: left - 7, y: at + 5, text, anchor: 'end', look: '' })),
    ...sparse(tickLabels(x, (at, text) => ({ x: at, y: bottom + 20, text, anchor: 'middle', look: '' }))),
    { x: 0, y: 13, text: titleOf(spec.y, choices), anchor: 'start', look: '' },
    { x: right, y: height - 5, text: titleOf(spec.x, choices), anchor: 'end', look: '' },
  ]

  return {
    width,
    height,
    frame: `M${left} ${top}V${bottom}H${right}`,
    grid: y.ticks.map((tick) => `M${left} ${round(y.at(tick))}H${right}`).join(''),
    zero:
      (crossesZero(spec.y, yFitted) ? `M${left} ${round(y.at(0))}H${right}` : '') +
      (crossesZero(spec.x, xEnds) ? `M${round(x.at(0))} ${top}V${bottom}` : ''),
    tickMarks: x.ticks.map((tick) => `M${round(x.at(tick))} ${bottom}v5`).join(''),
    lines: lines.map(({ placed, main }) => ({ d: clippedPath(placed, top, bottom), main })),
    points: points.map(([px, py]) => ({ x: px, y: py, drop: `M${px} ${bottom}V${py}H${left}` })),
    // Words in the margin stand where their line ends; inside, the reader's own come first.
    words: keepApart(beside ? [...around, ...atEnds, ...own] : [...around, ...own, ...atEnds], width, height),
  }
}

function crossesZero({ scale }: PlotAxis, [min, max]: readonly [number, number]): boolean {
  return scale === 'linear' && min < 0 && max > 0
}

/** Words for a whole line: in the margin beside its end, or over the end, under it where there is no room. */
function endLabel([x, y]: PlotPlace, text: string, look: string, beside: boolean): PlotLabel {
  if (beside) return { x: x + 6, y: y + 5, text, anchor: 'start', look }
  return { x, y: y < top + 22 ? y + 19 : y - 9, text, anchor: 'end', look }
}

/** Marks without those whose number would touch the one before. */
function sparse(labels: PlotLabel[]): PlotLabel[] {
  let free = -Infinity
  return labels.filter(({ x, text }) => {
    const half = (text.length * letter) / 2
    if (x - half < free) return false
    free = x + half + 6
    return true
  })
}

/** The ends of an axis as the reader sees it; a flat line still gets an axis with some height. */
function ends(axis: PlotAxis, choices: UnitChoices): [number, number] {
  const unit = unitFor(axis.unit, choices)
  const [min, max] = [convert(axis.min, axis.unit, unit), convert(axis.max, axis.unit, unit)]
  return max > min ? [min, max] : axis.scale === 'log' ? [min / 2, min * 2] : [min - 1, min + 1]
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
function besidePoint(
  [x, y]: PlotPlace,
  text: string,
  { left, right, bottom }: { left: number; right: number; bottom: number },
  rising: boolean,
): PlotLabel {
  const room = text.length * letter + 12
  const fits = { right: x + room <= right, left: x - room >= left }
  const toRight = rising ? fits.right || !fits.left : !fits.left
  const below = y + 24 < bottom
  return {
    x: toRight ? x + 12 : x - 12,
    y: below ? y + 24 : y - 14,
    text,
    anchor: toRight ? 'start' : 'end',
    look: 'me',
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
