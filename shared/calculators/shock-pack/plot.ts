export { packPlot }

import { roundedUp } from '../common/plot-window.ts'
import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { shockPack, type PackValues } from './piston.ts'

type Inputs = PackValues & { newHoles: number; newHoleDiameter: number }

/** The new piston as a share of the old one over shaft speed, in the same fluid and in the matched one. */
function packPlot(inputs: Inputs, { viscosityToMatch }: { viscosityToMatch: number }): PlotSpec {
  const { newHoles, newHoleDiameter, shaftSpeed, viscosity } = inputs
  const fastest = roundedUp(Math.max(500, shaftSpeed * 1.2))
  const share = (speed: number, fluid: number) => {
    const own = shockPack({ ...inputs, shaftSpeed: speed })
    const other = shockPack({
      ...inputs,
      holes: newHoles,
      holeDiameter: newHoleDiameter,
      viscosity: fluid,
      shaftSpeed: speed,
    })
    return (100 * other.force) / own.force
  }
  const slowest = fastest / 1000
  const curve = (fluid: number) => sampled(slowest, fastest, (speed) => share(speed, fluid))
  const [same, matched] = [curve(viscosity), curve(viscosityToMatch)]
  const heights = [...same, ...matched].map(([, y]) => y)
  const now = share(shaftSpeed, viscosity)
  return {
    alternative: say`Force of the new piston as a share of yours, from a standstill to ${figure(fastest, 'mm/s')} of shaft speed. With the same fluid it goes from ${figure(same[0]?.[1] ?? now, '%')} to ${figure(same.at(-1)?.[1] ?? now, '%')}; with ${figure(viscosityToMatch, 'cSt')} it starts at 100\u00A0% and ends at ${figure(matched.at(-1)?.[1] ?? now, '%')}.`,
    x: { label: 'shaft speed', unit: 'mm/s', min: 0, max: fastest, scale: 'linear' },
    y: {
      label: 'force, new over yours',
      unit: '%',
      min: Math.min(80, Math.floor(Math.min(...heights) / 10) * 10),
      max: Math.max(120, Math.ceil(Math.max(...heights) / 10) * 10),
      scale: 'linear',
    },
    lines: [
      { kind: 'other', label: say`${figure(viscosityToMatch, 'cSt')}`, points: matched },
      { kind: 'main', label: say`same fluid`, points: same },
    ],
    points: [{ x: shaftSpeed, y: now, label: say`${figure(now, '%')} at ${figure(shaftSpeed, 'mm/s')}` }],
  }
}
