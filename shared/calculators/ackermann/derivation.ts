export { derivation }

import { fn, frac, math, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'

const inner = sub('δ', 'in')
const outer = sub('δ', 'out')
const ideal = sub('δ', 'ideal')

const derivation: Derivation = {
  steps: [
    {
      text: 'A wheel rolls without scrubbing when it moves at right angles to its axle. So in a turn about one point, every axle must point at that point. The rear axle does not steer: the point lies on its line.',
    },
    {
      text: 'Call its distance from the middle of the rear axle R. From the outer pivot it is L back along the car and R + t/2 across. The outer wheel’s angle from straight ahead is the angle of that triangle at the centre.',
      formula: math(fn('cot', outer), '=', frac(row('R', '+', frac('t', 2)), 'L')),
    },
    {
      text: 'The inner pivot stands t nearer the centre, so its wheel turns further.',
      formula: math(fn('cot', inner), '=', frac(row('R', '−', frac('t', 2)), 'L')),
    },
    {
      text: 'Taking one from the other leaves R out. This is the condition for a turn without scrubbing; solved for the inner angle it gives the ideal one.',
      formula: math(fn('cot', outer), '−', fn('cot', ideal), '=', frac('t', 'L')),
    },
    {
      text: 'The first triangle also gives the radius of the turn.',
      formula: math('R', '=', 'L', '×', fn('cot', outer), '−', frac('t', 2)),
    },
    {
      text: 'Percent Ackermann says how much of the ideal difference between the wheels there is: 0 when they stay parallel, 100 when the condition holds. Here it is counted in angles, from the outer wheel.',
      formula: math('A', '=', 100, '×', frac(row(inner, '−', outer), row(ideal, '−', outer))),
    },
    {
      text: 'Counting from the ideal outer wheel, or in cotangents, has the same 0 and the same 100 and differs between them by several points.',
    },
  ],
  drawing: {
    caption:
      'A left turn from above, to scale: both front axles point at one centre on the line of the rear axle.',
    alternative: say`A car from above with wheelbase L and pivots t apart. The axles of both front wheels meet the line of the rear axle in one point, R from the car’s middle. The angles at that point are the wheels’ angles.`,
    unit: 'mm',
    frame: { left: -560, right: 240, bottom: -110, top: 430 },
    shapes: [
      {
        kind: 'line',
        style: 'thought',
        points: [
          [-500, 0],
          [-100, 0],
        ],
      },
      {
        kind: 'line',
        style: 'frame',
        points: [
          [0, 0],
          [0, 325],
        ],
      },
      {
        kind: 'line',
        style: 'frame',
        points: [
          [-100, 325],
          [100, 325],
        ],
      },
      {
        kind: 'line',
        style: 'frame',
        points: [
          [-100, 0],
          [100, 0],
        ],
      },
      {
        kind: 'line',
        style: 'own',
        points: [
          [-500, 0],
          [-100, 325],
        ],
      },
      {
        kind: 'line',
        style: 'part',
        points: [
          [-500, 0],
          [100, 325],
        ],
      },
      { kind: 'point', at: [-500, 0], style: 'own' },
      { kind: 'point', at: [-100, 325], style: 'part' },
      { kind: 'point', at: [100, 325], style: 'part' },
      // Angles at the centre: atan(325/600) for the outer wheel, atan(325/400) for the inner one.
      { kind: 'arc', at: [-500, 0], radius: 150, from: 0, to: 28.4, style: 'part' },
      { kind: 'arc', at: [-500, 0], radius: 105, from: 0, to: 39.1, style: 'own' },
      { kind: 'label', at: [-335, 30], anchor: 'start', text: say`δ out` },
      { kind: 'label', at: [-430, 100], anchor: 'end', text: say`δ in`, style: 'own' },
      { kind: 'label', at: [16, 160], anchor: 'start', text: say`L` },
      { kind: 'dimension', from: [-100, 325], to: [100, 325], offset: 46, label: say`t` },
      { kind: 'dimension', from: [-500, 0], to: [0, 0], offset: -52, label: say`R` },
    ],
  },
}
