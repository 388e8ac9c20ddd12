export { pinDrawings }

import { figure, say, type Sentence } from '../sentence.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec } from '../drawing.ts'
import type { Axle, Inserts } from './inserts.ts'

/** Offsets of tenths of a millimetre on a pin of 60 mm would not be seen; the captions say so. */
const enlarged = 5

interface View {
  caption: string
  alternative: Sentence
  /** Offset of the hole in the front and the rear block, up in the drawing. */
  front: number
  rear: number
  /** What lies above and below the pin in this view. */
  above: string
  below: string
  result: Sentence
}

/** The pin from above and from the side, the front of the car on the left. */
function pinDrawings(inputs: Inserts, outputs: Axle): DrawingSpec[] {
  const { blockSpacing, frontOut, frontUp, rearOut, rearUp } = inputs
  return [
    view(blockSpacing, {
      caption: `The pin from above, front of the car on the left. Offsets are drawn ${enlarged} times as large.`,
      alternative: say`The hinge pin from above. Its front end stands ${figure(frontOut, 'mm')} out from the middle of its block, its rear end ${figure(rearOut, 'mm')}. The wheel has ${figure(outputs.toe, 'deg')} of toe-in.`,
      front: frontOut,
      rear: rearOut,
      above: 'out, to the wheel',
      below: 'in, to the centre line',
      result: say`toe ${figure(outputs.toe, 'deg')}`,
    }),
    view(blockSpacing, {
      caption: `The pin from the side, front of the car on the left. Offsets are drawn ${enlarged} times as large.`,
      alternative: say`The hinge pin from the side. Its front end stands ${figure(frontUp, 'mm')} above the middle of its block, its rear end ${figure(rearUp, 'mm')}. The pin is tilted by ${figure(outputs.pinAngle, 'deg')}, front end higher counted positive.`,
      front: frontUp,
      rear: rearUp,
      above: 'up',
      below: 'down',
      result: say`pin ${figure(outputs.pinAngle, 'deg')}`,
    }),
  ]
}

function view(blockSpacing: number, { front, rear, above, below, result, ...words }: View): DrawingSpec {
  const frontHole: DrawingPoint = [0, front * enlarged]
  const rearHole: DrawingPoint = [blockSpacing, rear * enlarged]
  const margin = 0.42 * blockSpacing
  const quarter = 0.25 * blockSpacing
  const middle = blockSpacing / 2
  const furthest = enlarged * Math.max(Math.abs(front), Math.abs(rear)) + 0.15 * blockSpacing
  const room = quarter * Math.max(1, Math.ceil(furthest / quarter))
  return {
    ...words,
    unit: 'mm',
    frame: { left: -margin, right: blockSpacing + margin, bottom: -room * 1.25, top: room * 1.25 },
    shapes: [
      {
        kind: 'line',
        style: 'before',
        points: [
          [-0.1 * blockSpacing, 0],
          [1.1 * blockSpacing, 0],
        ],
      },
      ...block([0, 0], blockSpacing, room),
      ...block([blockSpacing, 0], blockSpacing, room),
      { kind: 'line', style: 'own', points: [frontHole, rearHole] },
      { kind: 'point', at: frontHole, style: 'own' },
      { kind: 'point', at: rearHole, style: 'own' },
      { kind: 'label', at: [-0.11 * blockSpacing, 0], anchor: 'end', text: say`front` },
      { kind: 'label', at: [1.11 * blockSpacing, 0], anchor: 'start', text: say`rear` },
      { kind: 'label', at: [middle, 1.05 * room], anchor: 'middle', text: say`${above}`, style: 'thought' },
      { kind: 'label', at: [middle, -1.05 * room], anchor: 'middle', text: say`${below}`, style: 'thought' },
      { kind: 'label', at: [middle, -0.5 * room], anchor: 'middle', text: result, style: 'own' },
    ],
  }
}

function block([x, y]: DrawingPoint, blockSpacing: number, room: number): DrawingShape[] {
  const [wide, tall] = [0.07 * blockSpacing, room * 0.85]
  return [
    {
      kind: 'line',
      style: 'frame',
      closed: true,
      points: [
        [x - wide, y - tall],
        [x + wide, y - tall],
        [x + wide, y + tall],
        [x - wide, y + tall],
      ],
    },
  ]
}
