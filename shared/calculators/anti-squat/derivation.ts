export { derivation }

import { fn, frac, math, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'

const moved = sub('F', 'moved')
const drive = sub('F', 'drive')
const arms = sub('F', 'arms')

/** From the push of the tyres to the share of the moved load that the arms carry. */
const derivation: Derivation = {
  steps: [
    {
      text: 'On power the ground pushes the car forward with its mass times its acceleration. The push acts at the ground, the mass resists at the height of the centre of gravity.',
      formula: math('F', '=', 'm', '×', 'a'),
    },
    {
      text: 'These two turn the car nose up. It does not tip over, so the rear axle must gain, and the front axle lose, a load that turns it back with the wheelbase as lever.',
      formula: math(moved, '=', frac(row('F', '×', 'h'), 'L')),
    },
    {
      text: 'The rear wheels bring their share of the push. The diff sits on the chassis, so the shafts bring only turning effort to the hub, and the push reaches the suspension at the wheel centre.',
      formula: math(drive, '=', 'p', '×', 'F'),
    },
    {
      text: 'A wheel on pins tilted by β moves up and back along a path tilted by β. Let the wheel rise by a little: it moves back by that little times tan β, against the push. The arms need no spring to take up the work this costs, and by the rule of virtual work they hold a vertical load.',
      formula: math(arms, '=', drive, '×', fn('tan', 'β')),
    },
    {
      text: 'Anti-squat is what the arms hold over what moves. The push itself cancels, so weight and acceleration do not matter.',
      formula: math('A', '=', frac(arms, moved), '=', 'p', '×', fn('tan', 'β'), '×', frac('L', 'h')),
    },
    {
      text: 'In the drawing L times tan β is the rise of the line above the front axle. Anti-squat is 100 % when that rise is h over p.',
      formula: math('L', '×', fn('tan', 'β'), '=', frac('h', 'p')),
    },
  ],
  drawing: {
    caption:
      'The letters, seen from the side with the front to the right. The tilt is drawn five times as large as usual, 10°.',
    alternative: say`Side view: the rear wheel with its centre, a line tilted by β from there to above the front axle, the centre of gravity at height h, and the forces at the ground.`,
    unit: 'mm',
    frame: { left: -80, right: 490, bottom: -50, top: 150 },
    shapes: [
      {
        kind: 'line',
        points: [
          [-80, 0],
          [490, 0],
        ],
        style: 'ground',
      },
      { kind: 'circle', at: [0, 57.5], radius: 57.5, style: 'part' },
      { kind: 'circle', at: [325, 57.5], radius: 57.5, style: 'frame' },
      {
        kind: 'line',
        points: [
          [0, 57.5],
          [325, 57.5],
        ],
        style: 'thought',
      },
      {
        kind: 'line',
        points: [
          [0, 57.5],
          [325, 114.8],
        ],
        style: 'own',
      },
      { kind: 'point', at: [0, 57.5], style: 'own' },
      { kind: 'arc', at: [0, 57.5], radius: 110, from: 0, to: 10, style: 'own' },
      { kind: 'label', at: [118, 62], anchor: 'start', text: say`β` },
      {
        kind: 'line',
        points: [
          [325, 57.5],
          [325, 114.8],
        ],
        style: 'own',
      },
      { kind: 'label', at: [392, 86], anchor: 'start', text: say`L tan β`, style: 'own' },
      { kind: 'point', at: [170, 40], style: 'part' },
      { kind: 'dimension', from: [170, 0], to: [170, 40], offset: -34, label: say`h` },
      { kind: 'arrow', from: [170, 40], to: [120, 40], style: 'thought' },
      { kind: 'label', at: [136, 22], anchor: 'middle', text: say`m a` },
      { kind: 'dimension', from: [0, 0], to: [325, 0], offset: -34, label: say`L` },
    ],
  },
}
