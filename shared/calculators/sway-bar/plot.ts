export { barPlot }

import { roundedUp } from '../common/plot-window.ts'
import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { endRate, type BarValues } from './bar.ts'

type Inputs = BarValues & { comparisonDiameter: number }

/** Rate of one end against the diameter, with both bars on it. */
function barPlot(inputs: Inputs, outputs: Record<'endRate' | 'comparisonEndRate', number>): PlotSpec {
  const { diameter, comparisonDiameter } = inputs
  const thinner = Math.min(diameter, comparisonDiameter)
  const thicker = Math.max(diameter, comparisonDiameter)
  const from = Math.floor(thinner * 2 - 1e-9) / 2
  const to = Math.ceil(thicker * 2 + 1e-9) / 2
  const at = (size: number) => endRate({ ...inputs, diameter: size })
  return {
    alternative: say`Rate of one end against the diameter of the bar, rising with its fourth power. At ${figure(diameter, 'mm', 4)} it is ${figure(outputs.endRate, 'N/mm')}, at ${figure(comparisonDiameter, 'mm', 4)} ${figure(outputs.comparisonEndRate, 'N/mm')}.`,
    x: { label: 'bar', unit: 'mm', min: from, max: to, scale: 'linear' },
    y: { label: 'rate of one end', unit: 'N/mm', min: 0, max: roundedUp(at(to)), scale: 'linear' },
    lines: [{ kind: 'main', label: [], points: sampled(Math.max(from, 0.1), to, at) }],
    points: [
      { x: diameter, y: outputs.endRate, label: say`yours` },
      ...(comparisonDiameter === diameter
        ? []
        : [{ x: comparisonDiameter, y: outputs.comparisonEndRate, label: say`the other` }]),
    ],
  }
}
