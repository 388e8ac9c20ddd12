export { squatDrawing }

import { tangent } from '../common/degrees.ts'
import { pictureUnit } from '../common/picture-unit.ts'
import { figure, say } from '../sentence.ts'
import type { DrawingShape, DrawingSpec } from '../drawing.ts'

type Inputs = Record<'pinAngle' | 'wheelbase' | 'cgHeight' | 'rearDriveShare', number>

/** Drawn only so that the line has a wheel to start from; the answer does not depend on it, mm. */
const tyreRadius = 57.5

/** The slope of the pins carried from the rear wheel centre to above the front axle, to scale. */
function squatDrawing(inputs: Inputs, { antiSquat }: { antiSquat: number }): DrawingSpec {
  const { pinAngle, wheelbase, cgHeight, rearDriveShare } = inputs
  const rise = wheelbase * tangent(pinAngle)
  const length = Math.ceil(wheelbase / 50) * 50
  const left = -tyreRadius - 20
  const right = length + 165
  const px = pictureUnit(right - left)
  const full = rearDriveShare > 0 ? (100 * cgHeight) / rearDriveShare : Infinity
  const reach = 100 * Math.ceil(Math.max(rise, 90) / 100)
  const fullShown = full <= reach
  const shapes: DrawingShape[] = [
    {
      kind: 'line',
      points: [
        [left, 0],
        [right, 0],
      ],
      style: 'ground',
    },
    { kind: 'circle', at: [0, tyreRadius], radius: tyreRadius, style: 'part' },
    { kind: 'circle', at: [wheelbase, tyreRadius], radius: tyreRadius, style: 'frame' },
    {
      kind: 'line',
      points: [
        [0, tyreRadius],
        [wheelbase, tyreRadius],
      ],
      style: 'thought',
    },
    {
      kind: 'line',
      points: [
        [0, tyreRadius],
        [wheelbase, tyreRadius + rise],
      ],
      style: 'own',
    },
    { kind: 'point', at: [0, tyreRadius], style: 'own' },
    { kind: 'label', at: [0, tyreRadius * 2 + 8 * px], anchor: 'middle', text: say`rear` },
    {
      kind: 'line',
      points: [
        [wheelbase, tyreRadius],
        [wheelbase, tyreRadius + rise],
      ],
      style: 'own',
    },
    {
      kind: 'label',
      at: [wheelbase + tyreRadius + 6 * px, tyreRadius + rise / 2],
      anchor: 'start',
      text: say`${figure(rise, 'mm')}`,
      style: 'own',
    },
  ]
  if (fullShown)
    shapes.push(
      {
        kind: 'line',
        points: [
          [wheelbase, tyreRadius],
          [wheelbase, tyreRadius + full],
        ],
        style: 'thought',
      },
      { kind: 'point', at: [wheelbase, tyreRadius + full], style: 'thought' },
      {
        kind: 'label',
        at: [wheelbase + tyreRadius + 6 * px, tyreRadius + full],
        anchor: 'start',
        text: say`${figure(100, '%')}`,
      },
    )
  return {
    caption: `The tilt of the pins, drawn from the rear wheel centre to the front axle, which is to the right, with its rise there. The ring marks the rise that would be 100\u00A0%: height of the centre of gravity over the rear’s share of the drive${fullShown ? '' : '; here it is above the picture'}. Tyres are drawn 115\u00A0mm across; their size does not matter here.`,
    alternative: say`Side view, front to the right. From the rear wheel centre a line tilted by ${figure(pinAngle, 'deg')} has ${rise < 0 ? 'fallen' : 'risen'} ${figure(Math.abs(rise), 'mm')} when it reaches the front axle; that is ${figure(antiSquat, '%')} anti-squat.`,
    unit: 'mm',
    frame: {
      left,
      right,
      bottom: -10 * px - 100 * Math.max(0, Math.ceil((-rise - tyreRadius) / 100)),
      top: tyreRadius + reach + 16 * px,
    },
    shapes,
  }
}
