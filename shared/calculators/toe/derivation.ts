export { derivation }

import { fn, frac, math, power, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import { toeView } from './drawing.ts'
import type { Derivation } from '../derivation.ts'

const shown = toeView(9, 83, 62)

const derivation: Derivation = {
  steps: [
    {
      text: 'Look at one wheel from above. Its rim is a straight line of length D, the diameter at which you hold the gauge, and the toe δ is the angle between that line and the car’s centre line.',
    },
    {
      text: 'Draw a line through the back edge, along the car. Together with the rim and the gap s at the front edge it makes a right-angled triangle: D is its longest side, and s stands opposite δ.',
      formula: math(fn('sin', 'δ'), '=', frac('s', 'D')),
    },
    {
      text: 'So the millimetres follow from the angle.',
      formula: math('s', '=', 'D', '×', fn('sin', 'δ')),
    },
    {
      text: 'And the angle from the millimetres.',
      formula: math('δ', '=', fn('arcsin', row('(', frac('s', 'D'), ')'))),
    },
    {
      text: 'A gauge across both wheels reads the two gaps added, so with the same toe on both sides it reads twice as much.',
      formula: math(sub('s', 'both'), '=', 2, '×', 's'),
    },
    {
      text: 'For small angles the sine is nearly the angle in radians. Counting in proportion, from 1° upwards, is wrong by less than 0.3 % up to 7°.',
      formula: math(
        's',
        '≈',
        'D',
        '×',
        frac(row('π', '×', 'δ'), 180),
        '×',
        row('(', 1, '−', frac(power('δ', 2), 19700), ')'),
      ),
    },
  ],
  drawing: {
    caption:
      'A right-hand wheel from above, front at the top. The angle is drawn at 9° so that the letters fit.',
    alternative: say`A wheel seen from above, turned by δ from the line along the car. The rim, of length D, is the longest side of a right-angled triangle, and the gap s at the front edge stands opposite δ.`,
    unit: 'mm',
    frame: { left: -20, right: 130, bottom: -72, top: 72 },
    shapes: [
      {
        kind: 'line',
        style: 'thought',
        points: [
          [0, -60],
          [0, 52],
        ],
      },
      { kind: 'label', at: [0, 60], anchor: 'middle', text: say`centre line`, style: 'thought' },
      ...shown.shapes,
      { kind: 'line', style: 'thought', points: [shown.back, [shown.back[0], 62]] },
      { kind: 'arc', at: shown.back, radius: 34, from: 90, to: 99, style: 'own' },
      { kind: 'label', at: [shown.back[0] + 3, -2], anchor: 'start', text: say`δ`, style: 'own' },
      { kind: 'label', at: [52, 12], anchor: 'end', text: say`D`, style: 'own' },
      {
        kind: 'dimension',
        from: shown.front,
        to: [shown.back[0], shown.front[1]],
        offset: 22,
        label: say`s`,
      },
    ],
  },
}
