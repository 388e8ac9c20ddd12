export { ackermannPlot }

import { sampled, type PlotSpec } from '../plot.ts'
import { figure, say } from '../sentence.ts'
import { idealInnerAngle, largestOuterAngle, type Steering } from './steering.ts'

/** The inner angle that follows the turn, against the outer one, with the reader's pair between it and parallel. */
function ackermannPlot(
  steering: Steering,
  { ackermann, idealInnerAngle: ideal }: Record<'ackermann' | 'idealInnerAngle', number>,
): PlotSpec {
  const { outerAngle, innerAngle } = steering
  const wanted = Math.max(35, 5 * Math.ceil((outerAngle + 3) / 5))
  // Close to the largest outer angle the ideal one shoots up to 90° and would flatten everything else.
  const furthest = Math.max(outerAngle, Math.min(wanted, 0.85 * largestOuterAngle(steering)))
  const idealAtEnd = idealInnerAngle(steering, furthest)
  const top = 10 * Math.ceil(Math.max(idealAtEnd, innerAngle + 2) / 10)
  return {
    alternative: say`Inner angle against outer angle. Parallel wheels give a straight line; the ideal line bends up above it. At ${figure(outerAngle, 'deg')} outside the ideal is ${figure(ideal, 'deg')} inside; yours is ${figure(innerAngle, 'deg')}.`,
    x: { label: 'outer wheel', unit: 'deg', min: 0, max: furthest, scale: 'linear' },
    y: { label: 'inner wheel', unit: 'deg', min: 0, max: top, scale: 'linear' },
    lines: [
      { kind: 'other', label: say`${figure(0, '%')}`, points: sampled(0, furthest, (angle) => angle, 1) },
      {
        kind: 'main',
        label: say`${figure(100, '%')}`,
        points: sampled(0, furthest, (angle) => idealInnerAngle(steering, angle)),
      },
    ],
    points: [{ x: outerAngle, y: innerAngle, label: say`${figure(ackermann, '%')}` }],
  }
}
