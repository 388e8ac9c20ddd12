export { heatPlot }

import { roundedUp } from '../common/plot-window.ts'
import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { copperWire } from './copper-wire.ts'

type Inputs = Record<'gauge' | 'length' | 'current' | 'temperature', number>

/** Heat in both leads against current, for the reader's wire and the ones two sizes thicker and thinner. */
function heatPlot(inputs: Inputs, { heat }: { heat: number }): PlotSpec {
  const most = roundedUp(inputs.current * 1.5)
  const curve = (gauge: number) =>
    sampled(0, most, (current) => copperWire({ ...inputs, gauge, current }).heat)
  const neighbours = [inputs.gauge + 2, inputs.gauge - 2].filter((gauge) => gauge >= 0 && gauge <= 40)
  return {
    alternative: say`Heat in both leads against current, rising with the square of the current to ${figure(copperWire({ ...inputs, current: most }).heat, 'W')} at ${figure(most, 'A')}. At ${figure(inputs.current, 'A')} it is ${figure(heat, 'W')}. A thicker wire runs lower, a thinner one higher.`,
    x: { label: 'current', unit: 'A', min: 0, max: most, scale: 'linear' },
    y: {
      label: 'heat',
      unit: 'W',
      min: 0,
      max: Math.max(...curve(Math.max(inputs.gauge, ...neighbours)).map(([, watts]) => watts)),
      scale: 'linear',
    },
    lines: [
      ...neighbours.map((gauge) => ({
        kind: 'other' as const,
        label: say`${figure(gauge, 'AWG')}`,
        points: curve(gauge),
      })),
      { kind: 'main', label: say`${figure(inputs.gauge, 'AWG')}`, points: curve(inputs.gauge) },
    ],
    points: [
      { x: inputs.current, y: heat, label: say`${figure(heat, 'W')} at ${figure(inputs.current, 'A')}` },
    ],
  }
}
