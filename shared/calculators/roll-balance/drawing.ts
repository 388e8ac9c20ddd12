export { rollAxisDrawing }

import { roundedUp } from '../common/plot-window.ts'
import { figure, say } from '../sentence.ts'
import { rollBalance, type BalanceValues } from './balance.ts'
import type { DrawingSpec } from '../drawing.ts'

/** The car from its side: ground, roll centres, the roll axis between them and the lever up to the mass. */
function rollAxisDrawing(values: BalanceValues): DrawingSpec {
  const { wheelbase, frontWeight, cgHeight, rollCentreFront, rollCentreRear } = values
  const { axisHeight, lever } = rollBalance(values)
  const massAt = (wheelbase * frontWeight) / 100
  const highest = Math.max(cgHeight, rollCentreFront, rollCentreRear)
  const lowest = Math.min(0, rollCentreFront, rollCentreRear)
  const wide = roundedUp(wheelbase)
  // Letters need a band of their own below everything else, whatever the scale.
  const band = wide * 0.08
  const bottom = lowest < 0 ? -roundedUp(-lowest) : 0
  return {
    caption:
      'From the side, front to the right, to scale: the body leans about the dashed line between the roll centres.',
    alternative: say`A side view. The roll axis runs from ${figure(rollCentreRear, 'mm')} at the rear axle to ${figure(rollCentreFront, 'mm')} at the front axle. The centre of gravity stands ${figure(cgHeight, 'mm')} above the ground, ${figure(lever, 'mm')} above that line.`,
    unit: 'mm',
    frame: {
      left: -wide * 0.06,
      right: wide * 1.06,
      bottom: bottom - band * 1.6,
      top: roundedUp(highest * 1.1) + band * 1.4,
    },
    shapes: [
      {
        kind: 'line',
        points: [
          [-wide * 0.05, 0],
          [wide * 1.05, 0],
        ],
        style: 'ground',
      },
      {
        kind: 'line',
        points: [
          [0, 0],
          [0, rollCentreRear],
        ],
        style: 'frame',
      },
      {
        kind: 'line',
        points: [
          [wheelbase, 0],
          [wheelbase, rollCentreFront],
        ],
        style: 'frame',
      },
      {
        kind: 'line',
        points: [
          [0, rollCentreRear],
          [wheelbase, rollCentreFront],
        ],
        style: 'thought',
      },
      { kind: 'point', at: [0, rollCentreRear], style: 'part' },
      { kind: 'point', at: [wheelbase, rollCentreFront], style: 'part' },
      { kind: 'point', at: [massAt, cgHeight], style: 'own' },
      { kind: 'arrow', from: [massAt, axisHeight], to: [massAt, cgHeight], style: 'frame' },
      {
        kind: 'label',
        at: [massAt + wide * 0.03, (axisHeight + cgHeight) / 2],
        anchor: 'start',
        text: say`${figure(lever, 'mm')}`,
      },
      {
        kind: 'label',
        at: [massAt, cgHeight + band * 0.9],
        anchor: 'middle',
        text: say`mass at ${figure(cgHeight, 'mm')}`,
      },
      {
        kind: 'label',
        at: [0, bottom - band * 1.2],
        anchor: 'start',
        text: say`rear ${figure(rollCentreRear, 'mm')}`,
      },
      {
        kind: 'label',
        at: [wheelbase, bottom - band * 1.2],
        anchor: 'end',
        text: say`front ${figure(rollCentreFront, 'mm')}`,
      },
    ],
  }
}
