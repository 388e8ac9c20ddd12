export { raisedDrawing }

import { cosine, sine } from '../common/degrees.ts'
import { pictureUnit } from '../common/picture-unit.ts'
import { figure, say } from '../sentence.ts'
import { raisedCar } from './raised-car.ts'
import type { DrawingPoint, DrawingSpec } from '../drawing.ts'

type Inputs = Record<'mass' | 'wheelbase' | 'frontLevel' | 'frontRaised' | 'raisedBy' | 'tyreRadius', number>

/** The car on the block, to scale, with the line through the axles and the centre of gravity it gives. */
function raisedDrawing(inputs: Inputs, { cgHeight }: { cgHeight: number }): DrawingSpec {
  const { wheelbase, raisedBy, tyreRadius } = inputs
  const { angle, aboveAxles, beforeRearAxle } = raisedCar(inputs)
  const length = Math.ceil(wheelbase / 50) * 50
  const margin = Math.ceil(tyreRadius / 20) * 20 + 20
  const px = pictureUnit(length + 2 * margin)
  const rear: DrawingPoint = [0, tyreRadius]
  const front: DrawingPoint = [wheelbase * cosine(angle), tyreRadius + raisedBy]
  const onCar = (along: number, up: number): DrawingPoint => [
    along * cosine(angle) - up * sine(angle),
    tyreRadius + along * sine(angle) + up * cosine(angle),
  ]
  const cg = onCar(beforeRearAxle, aboveAxles)
  const below = aboveAxles < 0
  const block = 0.8 * tyreRadius
  return {
    caption:
      'The car on the block, front to the right, with the line through its axles. The point is the centre of gravity that your readings give.',
    alternative: say`Side view: the front axle is raised by ${figure(raisedBy, 'mm')}, which tilts the car by ${figure(angle, 'deg')}. The centre of gravity lies ${figure(Math.abs(aboveAxles), 'mm')} ${below ? 'below' : 'above'} the line through the axles, ${figure(cgHeight, 'mm')} above the ground when the car stands level.`,
    unit: 'mm',
    frame: {
      left: -margin,
      right: length + margin,
      bottom: -24 * px,
      top: 2 * margin + 50 * Math.ceil(raisedBy / 50) - 20,
    },
    shapes: [
      {
        kind: 'line',
        points: [
          [-margin, 0],
          [length + margin, 0],
        ],
        style: 'ground',
      },
      {
        kind: 'line',
        closed: true,
        points: [
          [front[0] - block, 0],
          [front[0] + block, 0],
          [front[0] + block, raisedBy],
          [front[0] - block, raisedBy],
        ],
        style: 'frame',
      },
      { kind: 'circle', at: rear, radius: tyreRadius, style: 'part' },
      { kind: 'circle', at: front, radius: tyreRadius, style: 'part' },
      { kind: 'line', points: [rear, front], style: 'frame' },
      { kind: 'line', points: [onCar(beforeRearAxle, 0), cg], style: 'own' },
      { kind: 'line', points: [cg, [cg[0], 0]], style: 'thought' },
      { kind: 'point', at: cg, style: 'own' },
      {
        kind: 'label',
        at: [cg[0] - 8 * px, Math.max(cg[1], onCar(beforeRearAxle, 0)[1]) + 16 * px],
        anchor: 'end',
        text: say`${figure(Math.abs(aboveAxles), 'mm')} ${below ? 'below' : 'above'}`,
        style: 'own',
      },
      {
        kind: 'label',
        at: [front[0], raisedBy / 2 - 5 * px],
        anchor: 'middle',
        text: say`${figure(raisedBy, 'mm')}`,
      },
    ],
  }
}
