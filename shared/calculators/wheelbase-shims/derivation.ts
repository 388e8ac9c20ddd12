export { derivation }

import { frac, math, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'

const longer = sub('L', 'new')
const after = sub('f', 'new')

/** From moments about the rear axle to the new share on the front wheels. */
const derivation: Derivation = {
  steps: [
    {
      text: 'The car does not tip about its rear axle: the front wheels’ load with the wheelbase as lever balances the whole weight with the lever b.',
      formula: math(sub('W', 'front'), '×', 'L', '=', 'W', '×', 'b'),
    },
    {
      text: 'So the share on the front wheels tells where the centre of gravity is.',
      formula: math('f', '=', 100, '×', frac('b', 'L'), ',', 'b', '=', 'L', '×', frac('f', 100)),
    },
    {
      text: 'Shims move the rear axle back by e. The centre of gravity stays where it is on the chassis, so its distance from the rear axle and the wheelbase both grow by e.',
      formula: math(longer, '=', 'L', '+', 'e'),
    },
    {
      text: 'The same moments with the new lengths give the new share. Growing by the same e, the shorter length b grows by more of itself, so the front always gains.',
      formula: math(after, '=', 100, '×', frac(row('b', '+', 'e'), row('L', '+', 'e'))),
    },
  ],
  drawing: {
    caption: 'The letters, from the side with the front to the right; e is drawn larger than any shim.',
    alternative: say`Side view: two wheels the wheelbase L apart, the centre of gravity at b before the rear axle, the rear axle moved back by e.`,
    unit: 'mm',
    frame: { left: -80, right: 430, bottom: -90, top: 130 },
    shapes: [
      {
        kind: 'line',
        points: [
          [-80, 0],
          [430, 0],
        ],
        style: 'ground',
      },
      { kind: 'circle', at: [40, 50], radius: 50, style: 'before' },
      { kind: 'circle', at: [0, 50], radius: 50, style: 'own' },
      { kind: 'circle', at: [365, 50], radius: 50, style: 'part' },
      {
        kind: 'line',
        points: [
          [0, 50],
          [365, 50],
        ],
        style: 'frame',
      },
      { kind: 'point', at: [0, 50], style: 'own' },
      { kind: 'point', at: [40, 50], style: 'before' },
      { kind: 'point', at: [365, 50], style: 'part' },
      { kind: 'point', at: [196, 50], style: 'own' },
      { kind: 'arrow', from: [196, 50], to: [196, 6], style: 'own' },
      { kind: 'label', at: [206, 14], anchor: 'start', text: say`W`, style: 'own' },
      { kind: 'dimension', from: [40, 50], to: [196, 50], offset: 36, label: say`b` },
      { kind: 'dimension', from: [0, 50], to: [40, 50], offset: 66, label: say`e` },
      { kind: 'dimension', from: [40, 0], to: [365, 0], offset: -40, label: say`L` },
    ],
  },
}
