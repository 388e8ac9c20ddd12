export { shiftDrawing }

import { pictureUnit } from '../common/picture-unit.ts'
import { roundedUp } from '../common/plot-window.ts'
import { figure, say, type Sentence } from '../sentence.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec } from '../drawing.ts'

type Shift = Record<'cgForward' | 'cgLeft' | 'cgUp', number>

/**
 * The centre of gravity close up, before and after, from above and from the side one below the other, forward
 * to the right in both.
 */
function shiftDrawing({ cgForward, cgLeft, cgUp }: Shift): DrawingSpec {
  const reach = roundedUp(
    Math.max(1, Math.abs(cgForward) / 1.7, Math.abs(cgLeft) / 0.6, Math.abs(cgUp) / 0.6),
  )
  const px = pictureUnit(4.4 * reach)
  const half = 0.8 * reach
  const view = (middle: number, name: string, side: string, sideways: number): DrawingShape[] => {
    const [before, after]: [DrawingPoint, DrawingPoint] = [
      [0, middle],
      [cgForward, middle + sideways],
    ]
    return [
      {
        kind: 'line',
        closed: true,
        points: [
          [-2 * reach, middle - half],
          [2 * reach, middle - half],
          [2 * reach, middle + half],
          [-2 * reach, middle + half],
        ],
        style: 'frame',
      },
      {
        kind: 'line',
        points: [
          [-2 * reach, middle],
          [2 * reach, middle],
        ],
        style: 'thought',
      },
      {
        kind: 'line',
        points: [
          [0, middle - half],
          [0, middle + half],
        ],
        style: 'thought',
      },
      {
        kind: 'label',
        at: [-2 * reach + 8 * px, middle + half - 18 * px],
        anchor: 'start',
        text: say`${name}`,
      },
      {
        kind: 'label',
        at: [2 * reach - 8 * px, middle - half + 18 * px],
        anchor: 'end',
        text: say`forward →`,
      },
      { kind: 'label', at: [8 * px, middle + half - 18 * px], anchor: 'start', text: say`${side} ↑` },
      { kind: 'point', at: before, style: 'before' },
      ...(cgForward === 0 && sideways === 0
        ? []
        : ([{ kind: 'line', points: [before, after], style: 'own' }] satisfies DrawingShape[])),
      { kind: 'point', at: after, style: 'own' },
    ]
  }
  const above = 0.95 * reach
  return {
    caption:
      'The centre of gravity close up, not the whole car: the ring is where it was, the filled point where it goes. The measure below gives the scale.',
    alternative: [
      'Two views of the centre of gravity, close up. It moves ',
      ...way(cgForward, 'forward', 'back'),
      ', ',
      ...way(cgLeft, 'left', 'right'),
      ' and ',
      ...way(cgUp, 'up', 'down'),
      '.',
    ],
    unit: 'mm',
    frame: { left: -2.2 * reach, right: 2.2 * reach, bottom: -1.8 * reach - 40 * px, top: 1.8 * reach },
    shapes: [
      ...view(above, 'from above', 'left', cgLeft),
      ...view(-above, 'from the side', 'up', cgUp),
      {
        kind: 'dimension',
        from: [0, -1.75 * reach],
        to: [reach, -1.75 * reach],
        offset: -16 * px,
        label: say`${figure(reach, 'mm')}`,
      },
    ],
  }
}

function way(distance: number, one: string, other: string): Sentence {
  if (distance === 0) return say`neither ${one} nor ${other}`
  return say`${figure(Math.abs(distance), 'mm', 2)} ${distance > 0 ? one : other}`
}
