export { blendPlot }

import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { blendLogLinear, blendRefutas } from './blend.ts'

type Inputs = Record<'lowViscosity' | 'highViscosity' | 'targetViscosity', number>

/**
 * Thickness of the blend against the share of the second fluid, by both rules, with the reader's blend on it.
 */
function blendPlot(
  { lowViscosity, highViscosity, targetViscosity }: Inputs,
  { highFraction }: { highFraction: number },
): PlotSpec {
  const thin = Math.min(lowViscosity, highViscosity)
  const thick = Math.max(lowViscosity, highViscosity)
  const pair = (share: number) => [
    { share: 1 - share, viscosity: lowViscosity },
    { share, viscosity: highViscosity },
  ]
  const share = highFraction * 100
  return {
    alternative: say`Thickness of the mix against the share of the thicker fluid, rising from ${figure(thin, 'cSt')} to ${figure(thick, 'cSt')}. Your mix is at ${figure(share, '%')}: ${figure(targetViscosity, 'cSt')}. The second rule runs a little lower.`,
    x: { label: 'share of the thicker fluid', unit: '%', min: 0, max: 100, scale: 'linear' },
    // Over more than a decade only a logarithmic axis shows both ends; with equal fluids the axis still needs
    // a height.
    y: {
      label: 'thickness',
      unit: 'cSt',
      min: thin * 0.95,
      max: thick * 1.05,
      scale: thick / thin > 8 ? 'log' : 'linear',
    },
    lines: [
      {
        kind: 'other',
        label: say`2nd rule`,
        points: sampled(0, 100, (percent) => blendRefutas(pair(percent / 100))),
      },
      { kind: 'main', label: [], points: sampled(0, 100, (percent) => blendLogLinear(pair(percent / 100))) },
    ],
    points: [
      {
        x: share,
        y: targetViscosity,
        label: say`${figure(targetViscosity, 'cSt')} at ${figure(share, '%')}`,
      },
    ],
  }
}
