export { derivation }

import { fenced, fn, frac, math } from '../mathml.ts'
import { say } from '../sentence.ts'
import { armFromFront } from './drawing.ts'
import type { Derivation } from '../derivation.ts'

const shown = armFromFront({ armLength: 100, screwRadius: 36, armAngle: 16 })

const derivation: Derivation = {
  steps: [
    {
      text: 'The screw is threaded through the arm and its tip rests on the chassis. That tip is the stop: the wheel falls until it touches.',
    },
    {
      text: 'A thread of pitch p moves the screw by p in every turn, so n turns move it by s.',
      formula: math('s', '=', 'p', '×', 'n'),
    },
    {
      text: 'Wind the screw out by s and the arm can swing down by θ before the tip touches again. The level through the pin, the arm and the screw make a right-angled triangle, because the screw stands square to the arm: r lies along the arm, s along the screw.',
      formula: math(fn('tan', 'θ'), '=', frac('s', 'r')),
    },
    {
      text: 'That is exact for a plate level with the pin. One that lies h lower asks for a little less screw, because the screw leans with the arm; at 10° that is 1.5 % of h.',
      formula: math(
        's',
        '=',
        'r',
        '×',
        fn('tan', 'θ'),
        '−',
        'h',
        '×',
        fenced(frac(1, fn('cos', 'θ')), '−', 1),
      ),
    },
    {
      text: 'The outer pin is L from the inner one. Swinging by θ from level, it drops by the side opposite θ of a triangle whose longest side is L.',
      formula: math('w', '=', 'L', '×', fn('sin', 'θ')),
    },
    {
      text: 'For the small angles of a turn or two, tangent and sine are nearly equal, and the arm is a plain lever.',
      formula: math('w', '≈', 'p', '×', 'n', '×', frac('L', 'r')),
    },
    {
      text: 'An arm that hangs at an angle β already moves its wheel less, because part of the swing goes sideways. Near β the change shrinks by its cosine.',
      formula: math('w', '≈', 'L', '×', fn('sin', 'θ'), '×', fn('cos', fenced('β'))),
    },
  ],
  drawing: {
    caption: 'An arm from the front, screw square to it. The swing is drawn at 16° so that the letters fit.',
    alternative: say`An arm of length L swings down by θ about its inner pin. The level through the pin, the arm up to its screw at the distance r, and the length s along the screw make a right-angled triangle. The outer end drops by w.`,
    unit: 'mm',
    frame: { left: -30, right: 130, bottom: -56, top: 22 },
    shapes: [
      {
        kind: 'line',
        style: 'before',
        points: [
          [0, 0],
          [100, 0],
        ],
      },
      ...shown.shapes,
      { kind: 'line', style: 'thought', points: [shown.screw, shown.corner] },
      { kind: 'arc', at: [0, 0], radius: 58, from: -16, to: 0, style: 'thought' },
      { kind: 'label', at: [62, -8], anchor: 'start', text: say`θ` },
      { kind: 'dimension', from: [0, 0], to: shown.screw, offset: 11, label: say`r` },
      { kind: 'label', at: [40, -5], anchor: 'start', text: say`s`, style: 'own' },
      { kind: 'dimension', from: [0, 0], to: shown.outer, offset: -26, label: say`L` },
      { kind: 'dimension', from: shown.outer, to: [shown.outer[0], 0], offset: -8, label: say`w` },
    ],
  },
}
