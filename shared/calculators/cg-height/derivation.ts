export { derivation }

import { fenced, fn, frac, math, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'

const level = sub('F', 'level')
const raised = sub('F', 'raised')
const above = sub('h', 'axles')

/** From a car on a level scale and on a block to the height of its centre of gravity. */
const derivation: Derivation = {
  steps: [
    {
      text: 'Level, the car does not tip about its rear axle: the front scale’s push with the wheelbase as lever balances the weight with the lever b, the distance of the centre of gravity from the rear axle.',
      formula: math(level, '×', 'L', '=', 'm', '×', 'b'),
    },
    {
      text: 'Raise the front axle by e. The line through the axles tilts by θ.',
      formula: math(fn('sin', 'θ'), '=', frac('e', 'L')),
    },
    {
      text: 'Seen from above the wheelbase gets shorter. So does b, and a centre of gravity above the axle line moves back by its height times the sine; one below it moves forward.',
      formula: math(
        raised,
        '×',
        'L',
        '×',
        fn('cos', 'θ'),
        '=',
        'm',
        '×',
        fenced('b', '×', fn('cos', 'θ'), '−', above, '×', fn('sin', 'θ')),
      ),
    },
    {
      text: 'Divide by the cosine and put in what the level scale said. Everything about b drops out.',
      formula: math(fenced(level, '−', raised), '×', 'L', '=', 'm', '×', above, '×', fn('tan', 'θ')),
    },
    {
      text: 'That is the height above the line through the axles. When the raised front reads more it is below that line, and the number is negative.',
      formula: math(above, '=', 'L', '×', frac(row(level, '−', raised), row('m', '×', fn('tan', 'θ')))),
    },
    {
      text: 'The axles are a tyre’s radius above the ground.',
      formula: math('h', '=', 'r', '+', above),
    },
  ],
  drawing: {
    caption:
      'The letters, front to the right, with a centre of gravity above the axles so that the lever can be seen.',
    alternative: say`Side view of a car with its front axle raised by e: the line through the axles is tilted by θ; the centre of gravity lies the height over the axles above that line, at b from the rear axle.`,
    unit: 'mm',
    frame: { left: -90, right: 420, bottom: -40, top: 240 },
    shapes: [
      {
        kind: 'line',
        points: [
          [-90, 0],
          [420, 0],
        ],
        style: 'ground',
      },
      {
        kind: 'line',
        closed: true,
        points: [
          [263, 0],
          [355, 0],
          [355, 100],
          [263, 100],
        ],
        style: 'frame',
      },
      { kind: 'label', at: [309, 44], anchor: 'middle', text: say`e` },
      { kind: 'circle', at: [0, 57.5], radius: 57.5, style: 'part' },
      { kind: 'circle', at: [309.2, 157.5], radius: 57.5, style: 'part' },
      {
        kind: 'line',
        points: [
          [0, 57.5],
          [220, 57.5],
        ],
        style: 'thought',
      },
      {
        kind: 'line',
        points: [
          [0, 57.5],
          [309.2, 157.5],
        ],
        style: 'part',
      },
      { kind: 'arc', at: [0, 57.5], radius: 90, from: 0, to: 17.9, style: 'frame' },
      { kind: 'label', at: [98, 64], anchor: 'start', text: say`θ` },
      { kind: 'dimension', from: [0, 57.5], to: [145.9, 104.7], offset: 34, label: say`b` },
      {
        kind: 'line',
        points: [
          [145.9, 104.7],
          [127.5, 161.8],
        ],
        style: 'own',
      },
      { kind: 'point', at: [127.5, 161.8], style: 'own' },
      { kind: 'label', at: [116, 180], anchor: 'end', text: say`over the axles`, style: 'own' },
      { kind: 'arrow', from: [127.5, 161.8], to: [127.5, 20], style: 'thought' },
      { kind: 'label', at: [136, 22], anchor: 'start', text: say`m` },
    ],
  },
}
