export { derivation }

import { fenced, fn, frac, math, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'

const front = (letter: string) => sub(letter, 'front')
const rear = (letter: string) => sub(letter, 'rear')

const derivation: Derivation = {
  steps: [
    {
      text: 'A hinge pin is a straight line through two points: the hole in the front insert and the hole in the rear insert, b apart along the car. With every hole in its middle the pin lies along the car and level.',
    },
    {
      text: 'Seen from above, the holes stand out from the middle by different amounts. The pin turns by the angle whose tangent is the difference over b. Arm and hub are carried by the pin, so the wheel turns with it.',
      formula: math(
        fn('tan', fenced('δ', '−', sub('δ', '0'))),
        '=',
        frac(row(rear('y'), '−', front('y')), 'b'),
      ),
    },
    {
      text: 'The sign: a rear hole further out swings the arm’s outer end forward and points the front of the wheel inwards. That is toe-in, and positive.',
      formula: math(
        'δ',
        '=',
        sub('δ', '0'),
        '+',
        fn('arctan', fenced(frac(row(rear('y'), '−', front('y')), 'b'))),
      ),
    },
    {
      text: 'Seen from the side the same happens with the heights. A front hole further up lifts the front end of the pin.',
      formula: math(
        'β',
        '=',
        sub('β', '0'),
        '+',
        fn('arctan', fenced(frac(row(front('z'), '−', rear('z')), 'b'))),
      ),
    },
    {
      text: 'The arm hangs about half-way between the blocks, so its root moves by the mean of the two holes: up by h, and out on each side. Both sides together widen the track by twice the mean.',
      formula: math('h', '=', frac(row(front('z'), '+', rear('z')), 2)),
    },
    {
      text: 'The two angles do not disturb each other: each is seen along one axis only, and b is measured along the car, not along the pin.',
    },
  ],
  drawing: {
    caption:
      'The pin from above, front of the car on the left, the wheel’s side at the top. Offsets are drawn large.',
    alternative: say`A pin through two holes b apart. The front hole stands y front out from the line of middles, the rear hole y rear. The pin makes the angle δ with that line.`,
    unit: 'mm',
    frame: { left: -22, right: 82, bottom: -14, top: 30 },
    shapes: [
      {
        kind: 'line',
        style: 'before',
        points: [
          [-8, 0],
          [68, 0],
        ],
      },
      {
        kind: 'line',
        style: 'thought',
        points: [
          [0, 6],
          [60, 6],
        ],
      },
      {
        kind: 'line',
        style: 'own',
        points: [
          [0, 6],
          [60, 18],
        ],
      },
      { kind: 'point', at: [0, 6], style: 'own' },
      { kind: 'point', at: [60, 18], style: 'own' },
      { kind: 'arc', at: [0, 6], radius: 34, from: 0, to: 11.3, style: 'own' },
      { kind: 'label', at: [40, 9], anchor: 'start', text: say`δ`, style: 'own' },
      {
        kind: 'line',
        style: 'frame',
        points: [
          [0, 0],
          [0, 6],
        ],
      },
      { kind: 'label', at: [-3, 3], anchor: 'end', text: say`y front` },
      {
        kind: 'line',
        style: 'frame',
        points: [
          [60, 0],
          [60, 18],
        ],
      },
      { kind: 'label', at: [63, 9], anchor: 'start', text: say`y rear` },
      { kind: 'dimension', from: [0, 0], to: [60, 0], offset: -7, label: say`b` },
      { kind: 'label', at: [30, 25], anchor: 'middle', text: say`out, to the wheel`, style: 'thought' },
    ],
  },
}
