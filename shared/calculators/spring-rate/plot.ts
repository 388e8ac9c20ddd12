export { springPlot }

import { roundedUp, windowAround } from '../common/plot-window.ts'
import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { coilSpring, type CoilSpringValues } from './coil-spring.ts'

/** Rate against wire for the reader's coils, with half a coil fewer and more beside it. */
function springPlot(inputs: CoilSpringValues, { rate }: { rate: number }): PlotSpec {
  const { wireDiameter, outsideDiameter, activeCoils } = inputs
  const [from, to] = windowAround(wireDiameter, 0.5)
  const thinnest = Math.max(0.1, from)
  // Towards a coil without a hole the curve climbs without end, so it stops before.
  const thickest = Math.min(to, Math.max(wireDiameter, 0.4 * outsideDiameter))
  const curve = (coils: number) =>
    sampled(
      thinnest,
      thickest,
      (wire) => coilSpring({ ...inputs, wireDiameter: wire, activeCoils: coils }).rate,
    )
  const neighbours = [activeCoils - 0.5, activeCoils + 0.5].filter((coils) => coils >= 0.5)
  const fewest = Math.min(activeCoils, ...neighbours)
  const highest = coilSpring({ ...inputs, wireDiameter: thickest, activeCoils: fewest }).rate
  return {
    alternative: say`Rate against wire diameter from ${figure(thinnest, 'mm')} to ${figure(thickest, 'mm')}, rising ever more steeply. Your ${figure(wireDiameter, 'mm', 4)} wire makes ${figure(rate, 'N/mm')}. Half a coil more or less moves the curve a little.`,
    x: { label: 'wire', unit: 'mm', min: thinnest, max: thickest, scale: 'linear' },
    y: { label: 'rate', unit: 'N/mm', min: 0, max: roundedUp(highest), scale: 'linear' },
    lines: [
      ...neighbours.map((coils) => ({
        kind: 'other' as const,
        label: say`${figure(coils, '1')} coils`,
        points: curve(coils),
      })),
      { kind: 'main', label: say`${figure(activeCoils, '1')} coils`, points: curve(activeCoils) },
    ],
    points: [{ x: wireDiameter, y: rate, label: say`${figure(rate, 'N/mm')}` }],
  }
}
