export { derivation }

import { frac, math, power, root, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'
import type { DrawingShape } from '../drawing.ts'

const shock = sub('x', 'shock')
const wheelTravel = sub('x', 'wheel')
const wheel = sub('k', 'w')

const derivation: Derivation = {
  steps: [
    {
      text: 'When the wheel rises, the shock shortens by a share of that. The share is the motion ratio; on a plain arm it comes from where the shock stands on the arm and how far it leans.',
      formula: math('r', '=', frac(shock, wheelTravel)),
    },
    {
      text: 'The spring pushes back with its rate times its own, smaller, movement.',
      formula: math(sub('F', 'spring'), '=', 'k', '×', shock, '=', 'k', '×', 'r', '×', wheelTravel),
    },
    {
      text: 'An arm makes no work out of nothing: force times way is the same at the wheel and at the shock. So the force at the wheel is smaller by the same share.',
      formula: math(
        sub('F', 'wheel'),
        '×',
        wheelTravel,
        '=',
        sub('F', 'spring'),
        '×',
        shock,
      ),
    },
    {
      text: 'The share comes in twice, once for the way and once for the force. The same holds for the damper.',
      formula: math(wheel, '=', frac(sub('F', 'wheel'), wheelTravel), '=', 'k', '×', power('r', '2')),
    },
    {
      text: 'A mass on that rate, let go, swings so that its inertia and the spring balance at each moment: m (2 π f)² is the rate.',
      formula: math(
        'f',
        '=',
        frac('1', row('2', '×', 'π')),
        '×',
        root(wheel, '/', 'm'),
      ),
    },
    {
      text: 'With a damper the same balance has a third force, damping times speed. Its equation stops having swings in it when the damping reaches one value, which is called critical; the damping ratio says how much of it there is.',
      formula: math(
        sub('c', 'crit'),
        '=',
        '2',
        '×',
        root(wheel, '×', 'm'),
        ',',
        'ζ',
        '=',
        frac(row('c', '×', power('r', '2')), sub('c', 'crit')),
      ),
    },
    {
      text: 'At rest the spring carries the weight, which gives the sag.',
      formula: math('δ', '=', frac(row('m', '×', 'g'), wheel)),
    },
  ],
  drawing: {
    caption:
      'An arm from the front with its shock, to scale. Wheel up by x wheel (dotted: before), shock shorter by x shock.',
    alternative: say`A suspension arm on an inner pin at the left, its wheel end at the right. The shock stands on the arm at about two thirds of its length. The arm is shown before and after the wheel has risen; the shock end has risen less than the wheel end.`,
    unit: 'mm',
    frame: { left: -14, right: 128, bottom: -14, top: 98 },
    shapes: armWithShock(),
  },
}

/** A plain arm of 100 mm with an upright shock at 65 mm, so that the letters can be read off. */
function armWithShock(): DrawingShape[] {
  const rise = 18
  return [
    {
      kind: 'line',
      points: [
        [0, 0],
        [100, 0],
      ],
      style: 'before',
    },
    {
      kind: 'line',
      points: [
        [65, 0],
        [65, 90],
      ],
      style: 'thought',
    },
    {
      kind: 'line',
      points: [
        [-10, 90],
        [80, 90],
      ],
      style: 'frame',
    },
    {
      kind: 'line',
      points: [
        [0, 0],
        [100, rise],
      ],
      style: 'own',
    },
    {
      kind: 'line',
      points: [
        [60, 0.65 * rise + 4],
        [70, 0.65 * rise + 4],
        [70, 52],
        [60, 52],
      ],
      style: 'part',
      closed: true,
    },
    {
      kind: 'line',
      points: [
        [65, 52],
        [65, 90],
      ],
      style: 'part',
    },
    { kind: 'point', at: [0, 0], style: 'part' },
    { kind: 'point', at: [65, 0.65 * rise], style: 'part' },
    { kind: 'point', at: [65, 90], style: 'part' },
    { kind: 'point', at: [100, rise], style: 'own' },
    { kind: 'dimension', from: [100, 0], to: [100, rise], offset: -12, label: say`x wheel` },
    { kind: 'dimension', from: [65, 0], to: [65, 0.65 * rise], offset: -14, label: say`x shock` },
    { kind: 'label', at: [0, -10], anchor: 'middle', text: say`pin` },
    { kind: 'label', at: [74, 70], anchor: 'start', text: say`shock, k and c` },
  ]
}
