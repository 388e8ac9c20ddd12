export { toeDrawing, toeView }

import { cosine, sine } from '../common/degrees.ts'
import { figure, say } from '../sentence.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec } from '../drawing.ts'

interface ToeView {
  /** Front and back edge of the rim, seen from above, front of the car up; the centre line is x = 0. */
  front: DrawingPoint
  back: DrawingPoint
  shapes: readonly DrawingShape[]
}

/** One right-hand wheel from above at an angle in degrees, its middle `out` from the centre line. */
function toeView(angle: number, diameter: number, out: number): ToeView {
  const middle: DrawingPoint = [out, 0]
  /** A place on the wheel: across it to the right, along it to the front. */
  const on = (across: number, along: number): DrawingPoint => [
    middle[0] + across * cosine(angle) - along * sine(angle),
    middle[1] + across * sine(angle) + along * cosine(angle),
  ]
  const half = diameter / 2
  const wide = diameter * 0.24
  const tyre = diameter * 0.68
  return {
    front: on(0, half),
    back: on(0, -half),
    shapes: [
      {
        kind: 'line',
        style: 'frame',
        closed: true,
        points: [on(-wide, -tyre), on(wide, -tyre), on(wide, tyre), on(-wide, tyre)],
      },
      { kind: 'line', style: 'own', points: [on(0, -half), on(0, half)] },
    ],
  }
}

/**
 * One wheel from above and how far in its front edge stands. The picture is as large as its rim: only the
 * angle moves it.
 */
function toeDrawing(
  { toeAngle, rimDiameter }: Record<'toeAngle' | 'rimDiameter', number>,
  { toeDistance }: { toeDistance: number },
): DrawingSpec {
  const out = rimDiameter * 0.75
  const { front, back, shapes } = toeView(toeAngle, rimDiameter, out)
  const tall = rimDiameter * 0.72
  const name = toeAngle < 0 ? 'toe-out' : 'toe-in'
  return {
    caption:
      'A right-hand wheel from above, front of the car at the top, to scale. The centre line stands closer than on the car.',
    alternative: say`A wheel seen from above with ${figure(Math.abs(toeAngle), 'deg')} of ${name}. Its front edge stands ${figure(Math.abs(toeDistance), 'mm')} ${toeAngle < 0 ? 'further from' : 'nearer to'} the centre line than its back edge.`,
    unit: 'mm',
    frame: { left: -rimDiameter * 0.25, right: rimDiameter * 1.75, bottom: -tall * 1.2, top: tall * 1.2 },
    shapes: [
      {
        kind: 'line',
        style: 'thought',
        points: [
          [0, -tall],
          [0, tall * 0.86],
        ],
      },
      { kind: 'label', at: [0, tall], anchor: 'middle', text: say`centre line`, style: 'thought' },
      {
        kind: 'line',
        style: 'before',
        points: [
          [out, -tall],
          [out, tall],
        ],
      },
      ...shapes,
      { kind: 'point', at: front, style: 'own' },
      { kind: 'point', at: back, style: 'own' },
      { kind: 'line', style: 'thought', points: [back, [back[0], front[1]]] },
      {
        kind: 'label',
        at: [rimDiameter * 1.16, front[1] - rimDiameter * 0.02],
        anchor: 'start',
        text: say`${figure(Math.abs(toeDistance), 'mm')} ${toeAngle < 0 ? 'out' : 'in'}`,
        style: 'own',
      },
      {
        kind: 'label',
        at: [rimDiameter * 1.16, 0],
        anchor: 'start',
        text: say`${figure(toeAngle, 'deg')}`,
        style: 'own',
      },
    ],
  }
}
