export { travelPlots }

import { figure, say, type Sentence } from '../sentence.ts'
import { poseAt, posesOver, travelOf, type Pose } from './curves.ts'
import { linkageFrom, type LinkageInputs } from './linkage.ts'
import type { PlotSpec } from '../plot.ts'

interface Curve {
  key: 'camber' | 'toe' | 'rollCentre' | 'track'
  label: string
  unit: 'deg' | 'mm'
  digits: number
  /** The least that the axis spans, so that a curve of hundredths does not look like a mountain. */
  least: number
}

const curves: readonly Curve[] = [
  { key: 'camber', label: 'camber change, top out', unit: 'deg', digits: 2, least: 1 },
  { key: 'toe', label: 'toe change, toe-in', unit: 'deg', digits: 2, least: 1 },
  { key: 'rollCentre', label: 'roll centre above the ground', unit: 'mm', digits: 3, least: 10 },
  { key: 'track', label: 'track', unit: 'mm', digits: 4, least: 4 },
]

/** Camber, toe, roll centre and track over the travel, each with its point where the cursor stands. */
function travelPlots(inputs: LinkageInputs, at: number): PlotSpec[] {
  const linkage = linkageFrom(inputs)
  const travel = travelOf(linkage, inputs.travelUp, inputs.travelDown)
  const poses = posesOver(linkage, travel)
  const here = poseAt(linkage, travel, at)
  return curves.map((curve) => plotOf(curve, poses, here))
}

function plotOf({ key, label, unit, digits, least }: Curve, poses: readonly Pose[], here: Pose): PlotSpec {
  const [first, last] = [poses.at(0) ?? here, poses.at(-1) ?? here]
  const [min, max] = axisAround(
    poses.map((pose) => pose[key]),
    least,
  )
  const reading = (pose: Pose): Sentence =>
    say`${figure(pose[key], unit, digits)} at ${figure(pose.travel, 'mm')}`
  return {
    alternative: [
      `Against wheel travel, up counted positive: ${label} is `,
      ...reading(first),
      ', ',
      ...reading(last),
      '; where the cursor stands it is ',
      ...reading(here),
      '.',
    ],
    x: { label: 'wheel travel, up', unit: 'mm', min: first.travel, max: last.travel, scale: 'linear' },
    y: { label, unit, min, max, scale: 'linear' },
    lines: [{ kind: 'main', label: [], points: poses.map((pose) => [pose.travel, pose[key]] as const) }],
    points: [{ x: here.travel, y: here[key], label: say`${figure(here[key], unit, digits)}` }],
  }
}

/** Ends of the axis on round numbers: they jump in steps, and the picture stands still while points move a little. */
function axisAround(values: readonly number[], least: number): [number, number] {
  const [low, high] = [Math.min(...values), Math.max(...values)]
  const span = Math.max(high - low, least)
  const power = 10 ** Math.floor(Math.log10(span / 3))
  const step = power * ([1, 2, 5, 10].find((times) => span / (times * power) <= 5) ?? 10)
  const middle = (low + high) / 2
  return [
    step * Math.floor(Math.min(low, middle - least / 2) / step),
    step * Math.ceil(Math.max(high, middle + least / 2) / step),
  ]
}
