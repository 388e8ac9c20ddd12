export { insidePlot }

import { roundedUp } from '../common/plot-window.ts'
import { figure, say } from '../sentence.ts'
import { rollBalance, type BalanceValues } from './balance.ts'
import type { PlotPoint, PlotSpec } from '../plot.ts'

/** What the two inside wheels still carry as the corner gets harder, down to nothing. */
function insidePlot(values: BalanceValues): PlotSpec {
  const { lateralAcceleration } = values
  const { front, rear } = rollBalance(values)
  const hardest = roundedUp(Math.max(1.5, lateralAcceleration * 1.2))
  // A roll centre below the ground can put load on an inside wheel: then its line climbs.
  const line = ({ inside, moved, liftsAt }: typeof front): [number, number][] => {
    const still = inside + moved
    const end = Math.min(hardest, liftsAt)
    return [
      [0, still],
      [end, still - (moved * end) / lateralAcceleration],
    ]
  }
  const [frontLine, rearLine] = [line(front), line(rear)]
  const stillFront = front.inside + front.moved
  const stillRear = rear.inside + rear.moved
  const highest = Math.max(...[...frontLine, ...rearLine].map(([, load]) => load))
  const [first, name] = front.liftsAt <= rear.liftsAt ? [front.liftsAt, 'front'] : [rear.liftsAt, 'rear']
  const points: PlotPoint[] =
    front.inside >= 0
      ? [
          {
            x: lateralAcceleration,
            y: front.inside,
            label: say`${figure(front.inside, 'N')} at ${figure(lateralAcceleration, 'g0')}`,
          },
        ]
      : []
  return {
    alternative: [
      ...say`Load on the inside wheels against side acceleration, each a straight line: the front from ${figure(stillFront, 'N')}, the rear from ${figure(stillRear, 'N')}. `,
      ...(Number.isFinite(first)
        ? say`The ${name} one is the first to carry nothing, at ${figure(first, 'g0')}.`
        : say`Neither comes to nothing.`),
    ],
    x: { label: 'side acceleration', unit: 'g0', min: 0, max: hardest, scale: 'linear' },
    y: {
      label: 'load on the inside wheel',
      unit: 'N',
      min: 0,
      max: roundedUp(highest * 1.02),
      scale: 'linear',
    },
    lines: [
      { kind: 'other', label: say`rear`, points: rearLine },
      { kind: 'main', label: say`front`, points: frontLine },
    ],
    points,
  }
}
