export { cornerDrawing }

import { pictureUnit } from '../common/picture-unit.ts'
import { figure, say, type Sentence } from '../sentence.ts'
import type { DrawingPoint, DrawingShape, DrawingSpec } from '../drawing.ts'
import type { CornerInputs } from './wheel-loads.ts'

type Outputs = Record<
  'total' | 'frontShare' | 'leftShare' | 'crossWeight' | 'cgFromFrontAxle' | 'cgFromCentreLine',
  number
>

/** The car from above, to scale; the area of a circle is what the wheel carries. */
function cornerDrawing(car: CornerInputs, outputs: Outputs): DrawingSpec {
  const { wheelbase, trackFront, trackRear } = car
  const halfTrack = (Math.ceil(Math.max(trackFront, trackRear) / 50) * 50) / 2
  const length = Math.ceil(wheelbase / 50) * 50
  const width = halfTrack * 4
  const px = pictureUnit(width)
  const heavy = Math.abs(outputs.crossWeight - 50) < 0.05 ? 0 : Math.sign(outputs.crossWeight - 50)
  const wheels = [
    { x: -trackFront / 2, y: 0, grams: car.frontLeft, diagonal: -1 },
    { x: trackFront / 2, y: 0, grams: car.frontRight, diagonal: 1 },
    { x: -trackRear / 2, y: -wheelbase, grams: car.rearLeft, diagonal: 1 },
    { x: trackRear / 2, y: -wheelbase, grams: car.rearRight, diagonal: -1 },
  ]
  const [fl, fr, rl, rr] = wheels.map(({ x, y }): DrawingPoint => [x, y]) as [
    DrawingPoint,
    DrawingPoint,
    DrawingPoint,
    DrawingPoint,
  ]
  const cg: DrawingPoint = [-outputs.cgFromCentreLine, -outputs.cgFromFrontAxle]
  const line = (from: DrawingPoint, to: DrawingPoint, style: 'frame' | 'thought'): DrawingShape => ({
    kind: 'line',
    points: [from, to],
    style,
  })
  return {
    caption:
      'The car from above, front at the top. The area of a circle is what that wheel carries; strong circles are the heavier diagonal.',
    alternative: say`The car from above. Front left carries ${figure(car.frontLeft, 'g', 5)}, front right ${figure(car.frontRight, 'g', 5)}, rear left ${figure(car.rearLeft, 'g', 5)}, rear right ${figure(car.rearRight, 'g', 5)}. The centre of gravity is ${figure(outputs.cgFromFrontAxle, 'mm')} behind the front axle, ${aside(outputs.cgFromCentreLine)}.`,
    unit: 'mm',
    frame: { left: -width / 2, right: width / 2, bottom: -length - 40 * px, top: 62 * px },
    shapes: [
      line(fl, fr, 'frame'),
      line(rl, rr, 'frame'),
      line([0, 0], [0, -wheelbase], 'frame'),
      line(fr, rl, 'thought'),
      line(fl, rr, 'thought'),
      { kind: 'arrow', from: [0, 12 * px], to: [0, 40 * px], style: 'frame' },
      { kind: 'label', at: [8 * px, 28 * px], anchor: 'start', text: say`front` },
      ...wheels.flatMap(({ x, y, grams, diagonal }): DrawingShape[] => {
        const radius = 44 * px * Math.sqrt(grams / outputs.total)
        const outwards = Math.sign(x)
        return [
          { kind: 'circle', at: [x, y], radius, style: diagonal === heavy ? 'own' : 'part' },
          {
            kind: 'label',
            at: [x + outwards * (radius + 7 * px), y - 5 * px],
            anchor: outwards > 0 ? 'start' : 'end',
            text: say`${figure(grams, 'g', 4)}`,
          },
        ]
      }),
      { kind: 'point', at: cg, style: 'own' },
      {
        kind: 'label',
        at: [cg[0] + 24 * px, cg[1] - 5 * px],
        anchor: 'start',
        text: say`centre of gravity`,
        style: 'own',
      },
    ],
  }
}

function aside(left: number): Sentence[number] {
  if (Math.abs(left) < 0.05) return 'on the centre line'
  return left > 0 ? 'left of the centre line' : 'right of the centre line'
}
