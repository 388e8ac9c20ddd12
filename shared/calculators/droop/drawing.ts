export { armFromFront, droopDrawing }

import { cosine, sine } from '../common/degrees.ts'
import { figure, say } from '../sentence.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec } from '../drawing.ts'

interface Arm {
  armLength: number
  screwRadius: number
  /** How far the arm has swung down from level, in degrees; up is negative. */
  armAngle: number
}

/**
 * An arm with its screw, its pin and the chassis below, seen from the front: the inner pin at 0, 0 and the wheel
 * on the right. `corner` is where the screw's line meets the level through the pin.
 */
function armFromFront({ armLength, screwRadius, armAngle }: Arm): {
  outer: DrawingPoint
  screw: DrawingPoint
  corner: DrawingPoint
  plate: number
  shapes: readonly DrawingShape[]
} {
  const along = (distance: number): DrawingPoint => [distance * cosine(armAngle), -distance * sine(armAngle)]
  const screw = along(screwRadius)
  const outer = along(armLength)
  const squareToArm = (up: number): DrawingPoint => [
    screw[0] + up * sine(armAngle),
    screw[1] + up * cosine(armAngle),
  ]
  // Deep enough that the arm stands clear of the plate, however far it hangs.
  const plate = -Math.max(0.1 * armLength, 1.3 * Math.abs(screw[1]))
  const tip = squareToArm((plate - screw[1]) / cosine(armAngle))
  return {
    outer,
    screw,
    corner: [screwRadius / cosine(armAngle), 0],
    plate,
    shapes: [
      {
        kind: 'line',
        style: 'frame',
        points: [
          [-0.26 * armLength, plate],
          [Math.max(tip[0], screw[0]) + 0.05 * armLength, plate],
        ],
      },
      {
        kind: 'line',
        style: 'frame',
        points: [
          [0, plate],
          [0, 0],
        ],
      },
      { kind: 'line', style: 'part', points: [[0, 0], outer] },
      { kind: 'line', style: 'own', points: [squareToArm(0.09 * armLength), tip] },
      { kind: 'point', at: [0, 0], style: 'part' },
      { kind: 'point', at: outer, style: 'part' },
    ],
  }
}

/** The arm before and after the turns, to scale. The picture grows in steps when the arm swings far. */
function droopDrawing(
  { armLength, screwRadius }: Record<'armLength' | 'screwRadius', number>,
  outputs: Record<'screwTravel' | 'armAngle' | 'wheelTravel', number>,
): DrawingSpec {
  const { armAngle, wheelTravel, screwTravel } = outputs
  const { outer, plate, shapes } = armFromFront({ armLength, screwRadius, armAngle })
  const quarter = 0.25 * armLength
  const room =
    quarter * Math.max(1, Math.ceil((1.4 * Math.abs(wheelTravel)) / quarter), Math.ceil(-plate / quarter))
  const down = wheelTravel >= 0
  const size = figure(Math.abs(wheelTravel), 'mm')
  return {
    caption:
      'An arm from the front, to scale: dotted level, as before the turn, and where its screw lets it hang now.',
    alternative: say`An arm seen from the front. When the screw goes ${figure(Math.abs(screwTravel), 'mm')} ${down ? 'out' : 'in'}, the arm swings ${down ? 'down' : 'up'} by ${figure(Math.abs(armAngle), 'deg')} and its outer end moves ${size}.`,
    unit: 'mm',
    frame: {
      left: -0.3 * armLength,
      right: Math.max(armLength, screwRadius) + 0.34 * armLength,
      bottom: -room,
      top: room,
    },
    shapes: [
      {
        kind: 'line',
        style: 'before',
        points: [
          [0, 0],
          [armLength, 0],
        ],
      },
      { kind: 'point', at: [armLength, 0], style: 'before' },
      ...shapes,
      {
        kind: 'label',
        at: [armLength * 1.06, (outer[1] - 0.04 * armLength) / 2],
        anchor: 'start',
        text: say`${size}`,
      },
      {
        kind: 'label',
        at: [-0.06 * armLength, 0.09 * armLength],
        anchor: 'end',
        text: say`inner pin`,
      },
      {
        kind: 'label',
        at: [screwRadius, 0.13 * armLength],
        anchor: 'start',
        text: say`screw ${figure(screwTravel, 'mm')}`,
        style: 'own',
      },
    ],
  }
}
