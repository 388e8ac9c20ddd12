export { axleDrawing }

import { pictureUnit } from '../common/picture-unit.ts'
import { figure, say } from '../sentence.ts'
import { movedAxle } from './moved-axle.ts'
import type { DrawingShape, DrawingSpec } from '../drawing.ts'

type Inputs = Record<'wheelbase' | 'frontWeight' | 'rearAxleBack', number>
type Outputs = Record<'newWheelbase' | 'newFrontWeight' | 'rearLoadChange', number>

/** The two axles and the centre of gravity from the side, to scale, front to the right, zero at the front axle. */
function axleDrawing(inputs: Inputs, { newWheelbase, newFrontWeight }: Outputs): DrawingSpec {
  const { wheelbase, frontWeight, rearAxleBack } = inputs
  const { toRearAxle } = movedAxle(inputs)
  const length = Math.ceil((wheelbase + 15) / 50) * 50
  const margin = length / 5
  const px = pictureUnit(length + 2 * margin)
  const radius = length / 7
  const cg = toRearAxle - wheelbase
  const wheel = (x: number, style: 'part' | 'before' | 'own'): DrawingShape[] => [
    { kind: 'circle', at: [x, radius], radius, style },
    { kind: 'point', at: [x, radius], style },
  ]
  return {
    caption:
      'From the side, front to the right: dotted the rear axle as it is, strong where the shims put it. The tyres are drawn for show.',
    alternative: say`Side view, front to the right. The rear axle stands ${figure(newWheelbase, 'mm', 4)} behind the front axle instead of ${figure(wheelbase, 'mm', 4)}. The centre of gravity stays ${figure(-cg, 'mm')} behind the front axle, so the front wheels carry ${figure(newFrontWeight, '%', 4)} instead of ${figure(frontWeight, '%', 4)}.`,
    unit: 'mm',
    frame: { left: -length - margin, right: margin, bottom: -52 * px, top: 2 * radius + 12 * px },
    shapes: [
      {
        kind: 'line',
        points: [
          [-length - margin, 0],
          [margin, 0],
        ],
        style: 'ground',
      },
      {
        kind: 'line',
        points: [
          [-newWheelbase, radius],
          [0, radius],
        ],
        style: 'frame',
      },
      ...(rearAxleBack === 0 ? [] : wheel(-wheelbase, 'before')),
      ...wheel(-newWheelbase, 'own'),
      ...wheel(0, 'part'),
      {
        kind: 'line',
        points: [
          [cg, 0],
          [cg, radius + 30 * px],
        ],
        style: 'thought',
      },
      { kind: 'point', at: [cg, radius], style: 'part' },
      { kind: 'label', at: [cg, radius + 38 * px], anchor: 'middle', text: say`centre of gravity` },
      {
        kind: 'dimension',
        from: [-newWheelbase, 0],
        to: [0, 0],
        offset: -34 * px,
        label: say`${figure(newWheelbase, 'mm', 4)}`,
      },
    ],
  }
}
