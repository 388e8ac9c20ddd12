export { settlingPlot, wheelRatePlot }

import { roundedUp } from '../common/plot-window.ts'
import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { overshoot, released, type CornerValues } from './corner.ts'

/** Wheel rate against motion ratio: a parabola, so a small move of the shock counts twice. */
function wheelRatePlot(
  { springRate, motionRatio }: CornerValues,
  { wheelRate }: { wheelRate: number },
): PlotSpec {
  const widest = motionRatio > 1 ? roundedUp(motionRatio) : 1
  return {
    alternative: say`Rate at the wheel against motion ratio, rising with its square. At ${figure(motionRatio, '1')} it is ${figure(wheelRate, 'N/mm')}, at 1 all ${figure(springRate, 'N/mm')} of the spring.`,
    x: { label: 'motion ratio', unit: '1', min: 0, max: widest, scale: 'linear' },
    y: {
      label: 'rate at the wheel',
      unit: 'N/mm',
      min: 0,
      max: roundedUp(springRate * widest ** 2),
      scale: 'linear',
    },
    lines: [{ kind: 'main', label: [], points: sampled(0, widest, (ratio) => springRate * ratio ** 2) }],
    points: [{ x: motionRatio, y: wheelRate, label: say`${figure(wheelRate, 'N/mm')}` }],
  }
}

/** How the corner comes to rest after a bump, beside one without swing. Time is counted in undamped swings. */
function settlingPlot({ dampingRatio }: { dampingRatio: number }): PlotSpec {
  const past = overshoot(dampingRatio) * 100
  const curve = (ratio: number) => sampled(0, 3, (swings) => 100 * released(ratio, swings), 90)
  return {
    alternative:
      dampingRatio < 1
        ? say`How the wheel comes to rest after a bump, over three swings. With ${figure(dampingRatio, '1')} of critical damping it swings past rest by ${figure(past, '%', 2)} of the bump. Beside it a wheel with critical damping, which does not swing past.`
        : say`How the wheel comes to rest after a bump, over three swings. With ${figure(dampingRatio, '1')} times critical damping it creeps back and does not swing past rest. Beside it a wheel with critical damping, the quickest way back without a swing.`,
    x: { label: 'swings', unit: '1', min: 0, max: 3, scale: 'linear' },
    y: { label: 'left of the bump', unit: '%', min: past > 25 ? -100 : -25, max: 100, scale: 'linear' },
    lines: [
      { kind: 'other', label: [], points: curve(1) },
      { kind: 'main', label: [], points: curve(dampingRatio) },
    ],
    points: [],
  }
}
