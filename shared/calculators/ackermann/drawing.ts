export { steeringDrawing }

import { cosine, sine, tangent } from '../common/degrees.ts'
import { figure, say } from '../sentence.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec } from '../drawing.ts'
import type { Steering } from './steering.ts'

type Outputs = Record<'idealInnerAngle' | 'ackermann' | 'turnRadius', number>

/** The furthest a turn's centre may lie for the picture to reach it, in wheelbases; else lines end at the edge. */
const reach = 4

/**
 * The car from above in a left turn, the middle of the rear axle at 0, 0. Each front wheel's axle runs on to the
 * line of the rear axle; where the outer one meets it is the turn's centre. The picture grows in steps.
 */
function steeringDrawing(steering: Steering, outputs: Outputs): DrawingSpec {
  const { wheelbase, kingpinSpacing, outerAngle, innerAngle } = steering
  const { turnRadius, idealInnerAngle } = outputs
  const half = kingpinSpacing / 2
  const innerPivot: DrawingPoint = [-half, wheelbase]
  const outerPivot: DrawingPoint = [half, wheelbase]
  const centre: DrawingPoint = [-turnRadius, 0]
  const innerMeets: DrawingPoint = [-half - wheelbase / tangent(innerAngle), 0]
  const side = half + 0.45 * wheelbase
  const needed = Math.max(-innerMeets[0], turnRadius, side) / wheelbase
  const left = -wheelbase * Math.min(reach, 0.5 * Math.ceil(2 * needed + 0.2))
  const inside = centre[0] > left
  const axle = (from: DrawingPoint, to: DrawingPoint, style: 'own' | 'thought'): DrawingShape => ({
    kind: 'line',
    style,
    points: [from, cutAt(left, from, to)],
  })
  return {
    caption:
      'From above in a left turn, to scale; tyres only drawn in. Where an axle meets the line of the rear axle is the centre its wheel wants to turn about.',
    alternative: say`The car from above. The outer wheel’s axle meets the line of the rear axle ${figure(turnRadius, 'mm')} from the middle of the car. The inner wheel stands at ${figure(innerAngle, 'deg')}; at ${figure(idealInnerAngle, 'deg')} its axle would meet the same point.`,
    unit: 'mm',
    frame: { left, right: side, bottom: -0.36 * wheelbase, top: 1.44 * wheelbase },
    shapes: [
      {
        kind: 'line',
        style: 'thought',
        points: [
          [left, 0],
          [-half, 0],
        ],
      },
      ...chassis(half, wheelbase),
      tyre([-half - 0.09 * wheelbase, 0], 0, wheelbase),
      tyre([half + 0.09 * wheelbase, 0], 0, wheelbase),
      axle(outerPivot, centre, 'thought'),
      axle(innerPivot, innerMeets, 'own'),
      tyre(hub(innerPivot, innerAngle, -0.09 * wheelbase), innerAngle, wheelbase),
      tyre(hub(outerPivot, outerAngle, 0.09 * wheelbase), outerAngle, wheelbase),
      { kind: 'point', at: innerPivot, style: 'part' },
      { kind: 'point', at: outerPivot, style: 'part' },
      ...(inside ? [{ kind: 'point', at: centre, style: 'part' } as const] : []),
      {
        kind: 'label',
        at: [-half, 1.34 * wheelbase],
        anchor: 'end',
        text: say`${figure(innerAngle, 'deg')}`,
        style: 'own',
      },
      {
        kind: 'label',
        at: [half, 1.34 * wheelbase],
        anchor: 'start',
        text: say`${figure(outerAngle, 'deg')}`,
      },
      inside
        ? {
            kind: 'dimension',
            from: centre,
            to: [0, 0],
            offset: -0.2 * wheelbase,
            label: say`${figure(turnRadius, 'mm')}`,
          }
        : {
            kind: 'label',
            at: [left + 0.05 * wheelbase, -0.2 * wheelbase],
            anchor: 'start',
            text: say`turn’s centre ${figure(turnRadius, 'mm')} away`,
          },
    ],
  }
}

/** The end of a line towards `to`, no further left than the picture. */
function cutAt(left: number, from: DrawingPoint, to: DrawingPoint): DrawingPoint {
  if (to[0] >= left) return to
  const share = (left - from[0]) / (to[0] - from[0])
  return [left, from[1] + share * (to[1] - from[1])]
}

/** The middle of a wheel that is `out` to the right of its pivot, turned with it. */
function hub([x, y]: DrawingPoint, angle: number, out: number): DrawingPoint {
  return [x + out * cosine(angle), y + out * sine(angle)]
}

function tyre([x, y]: DrawingPoint, angle: number, wheelbase: number): DrawingShape {
  const corner = (across: number, along: number): DrawingPoint => [
    x + wheelbase * (across * cosine(angle) - along * sine(angle)),
    y + wheelbase * (across * sine(angle) + along * cosine(angle)),
  ]
  return {
    kind: 'line',
    style: 'part',
    closed: true,
    points: [corner(-0.06, -0.17), corner(0.06, -0.17), corner(0.06, 0.17), corner(-0.06, 0.17)],
  }
}

function chassis(half: number, wheelbase: number): DrawingShape[] {
  return [
    {
      kind: 'line',
      style: 'frame',
      points: [
        [0, 0],
        [0, wheelbase],
      ],
    },
    {
      kind: 'line',
      style: 'frame',
      points: [
        [-half, wheelbase],
        [half, wheelbase],
      ],
    },
    {
      kind: 'line',
      style: 'frame',
      points: [
        [-half, 0],
        [half, 0],
      ],
    },
  ]
}
