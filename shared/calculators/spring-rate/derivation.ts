export { derivation }

import { frac, math, power, row } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'
import type { DrawingShape } from '../drawing.ts'

const half = frac('D', '2')

const derivation: Derivation = {
  steps: [
    {
      text: 'Press a spring along its middle with a force F. Cut the wire anywhere: the force stands half a coil diameter away from the cut, so what the wire feels there is mostly a twist.',
      formula: math('T', '=', 'F', '×', half),
    },
    {
      text: 'Every piece of the wire is twisted by the same T. Unwound, the wire is a straight round rod, as long as all the coils together.',
      formula: math('L', '=', 'π', '×', 'D', '×', 'n'),
    },
    {
      text: 'A round rod of that length twists by an angle that its stiffness against shear G and the polar moment J of its section decide. In J the thickness of the wire counts four times over.',
      formula: math(
        'θ',
        '=',
        frac(row('T', '×', 'L'), row('G', '×', 'J')),
        ',',
        'J',
        '=',
        frac(row('π', '×', power('d', '4')), '32'),
      ),
    },
    {
      text: 'The twist of the wire lowers the end of the spring: each bit of twist acts on an arm of half a coil diameter.',
      formula: math('δ', '=', 'θ', '×', half),
    },
    {
      text: 'Put in T, L and J. The coil diameter comes in three times: once in the twist, once in the length of the wire, once in the arm.',
      formula: math(
        'δ',
        '=',
        frac(row('8', '×', 'F', '×', power('D', '3'), '×', 'n'), row('G', '×', power('d', '4'))),
      ),
    },
    {
      text: 'The rate is force per movement, so the force drops out.',
      formula: math(
        'k',
        '=',
        frac('F', 'δ'),
        '=',
        frac(row('G', '×', power('d', '4')), row('8', '×', power('D', '3'), '×', 'n')),
      ),
    },
    {
      text: 'Left out: the part of the force that shears the wire across instead of twisting it, and the tighter curve on the inside of the coil. Together they are under 1 % when the coils are eight times as wide as the wire, and less above.',
    },
  ],
  drawing: {
    caption: 'The default spring cut through its middle, to scale. D goes from wire middle to wire middle.',
    alternative: say`A coil spring cut lengthwise: two columns of round wire sections, the wire diameter d on one of them, the mean diameter D between the columns, and a force F along the middle at either end.`,
    unit: 'mm',
    frame: { left: -24, right: 24, bottom: -10, top: 34 },
    shapes: cutSpring(),
  },
}

/** Coils of the default spring as they show when it is cut: a section on each side, half a pitch apart in height. */
function cutSpring(): DrawingShape[] {
  const [mean, wire, pitch] = [21.4, 1.6, 4.5]
  const heights = [0, 1, 2, 3, 4, 5].map((turn) => 2 + turn * pitch)
  const left = heights.map((y): DrawingShape => ({
    kind: 'circle',
    at: [-mean / 2, y],
    radius: wire / 2,
    style: 'part',
  }))
  const right = heights.map((y): DrawingShape => ({
    kind: 'circle',
    at: [mean / 2, y + pitch / 2],
    radius: wire / 2,
    style: 'part',
  }))
  const behind = heights.map((y): DrawingShape => ({
    kind: 'line',
    points: [
      [-mean / 2, y],
      [mean / 2, y + pitch / 2],
    ],
    style: 'frame',
  }))
  return [
    ...behind,
    ...left,
    ...right,
    {
      kind: 'line',
      points: [
        [0, -5],
        [0, 32],
      ],
      style: 'thought',
    },
    { kind: 'arrow', from: [0, 33.5], to: [0, 28.5], style: 'own' },
    { kind: 'arrow', from: [0, -9.5], to: [0, -4.5], style: 'own' },
    { kind: 'label', at: [1.5, 31.5], anchor: 'start', text: say`F` },
    { kind: 'label', at: [1.5, -8], anchor: 'start', text: say`F` },
    { kind: 'dimension', from: [-mean / 2, 2], to: [mean / 2, 2], offset: -4, label: say`D` },
    { kind: 'label', at: [mean / 2 + wire, 22.25], anchor: 'start', text: say`d` },
  ]
}
