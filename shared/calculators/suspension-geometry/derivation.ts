export { derivation }

import { degreesIn } from '../common/degrees.ts'
import { fenced, fn, frac, math, power, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import { sideShapes } from './front-view.ts'
import { instantCentre, motionOf, type Linkage } from './linkage.ts'
import type { Derivation } from '../derivation.ts'

const y = (index: string) => sub('y', index)
const z = (index: string) => sub('z', index)
const m = (index: string) => sub('m', index)

/** Short in the lower arm and steep above, so that the lines meet inside the picture. */
const shown: Linkage = {
  lowerInner: [30, 34],
  lowerOuter: [104, 26],
  upperInner: [44, 62],
  upperOuter: [98, 74],
  tieRodInner: [36, 46],
  tieRodOuter: [101, 46],
  contact: [127, 0],
  steeringArm: 20,
}
const [icY, icZ] = instantCentre(shown, motionOf(shown)).at

const derivation: Derivation = {
  steps: [
    {
      text: 'Seen from the front, an arm can only turn about its inner pin. So the joint at its outer end moves square to the arm, and whatever centre the upright turns about at this moment lies somewhere on the line of the arm.',
      formula: math(m('low'), '=', frac(row(z('2'), '−', z('1')), row(y('2'), '−', y('1')))),
    },
    {
      text: 'The same holds for the upper link. The upright is held by both, so it turns about the one point that both lines have: the instant centre.',
      formula: math(
        y('IC'),
        '=',
        frac(
          row(z('1'), '−', m('low'), '×', y('1'), '−', z('3'), '+', m('up'), '×', y('3')),
          row(m('up'), '−', m('low')),
        ),
      ),
    },
    {
      text: 'Turning by a small angle about a point f away sideways lifts the tyre by f times that angle (in radians). So each millimetre of rise turns the wheel by 1/f, and a centre on the inner side tips its top inwards.',
      formula: math(
        'γ′',
        '=',
        '−',
        frac(degreesIn(180), 'π'),
        '×',
        frac(1, 'f'),
        ',',
        'f',
        '=',
        y('c'),
        '−',
        y('IC'),
      ),
    },
    {
      text: 'While it rises, the tyre’s contact moves square to its line to the instant centre. In a corner the ground pushes the tyre sideways; where that line crosses the middle of the car, the pushes of both sides act on the body without making it roll. That is the roll centre.',
      formula: math('h', '=', frac(row(z('IC'), '×', y('c')), 'f')),
    },
    {
      text: 'With parallel arms the lines never meet: f grows without end, camber does not change at that moment, and the line through the tyre is simply parallel to the arms.',
      formula: math('h', '=', '−', m('low'), '×', y('c')),
    },
    {
      text: 'The upright carries the tie rod’s outer end about the instant centre too. If the rod’s own line passes through that point the end moves just as the rod lets it. If not, the rod pulls it sideways, and on a steering arm of length a the wheel turns.',
      formula: math(
        'δ′',
        '=',
        frac(degreesIn(180), 'π'),
        '×',
        frac(row(z('IC'), '−', z('6'), '+', m('rod'), '×', fenced(y('6'), '−', y('IC'))), row('a', '×', 'f')),
      ),
    },
    {
      text: 'All this is for one moment. Over the travel the centre wanders, so the linkage is solved anew at each place: the lower arm is turned, the upper joint is found where two circles meet, one about the lower joint, one about the upper link’s inner end, until the tyre has risen as far as asked.',
      formula: math(
        power(fenced(y('4'), '−', y('3')), 2),
        '+',
        power(fenced(z('4'), '−', z('3')), 2),
        '=',
        power(sub('l', 'up'), 2),
        ',',
        power(fenced(y('4'), '−', y('2')), 2),
        '+',
        power(fenced(z('4'), '−', z('2')), 2),
        '=',
        power(sub('l', 'u'), 2),
      ),
    },
    {
      text: 'Where the circles no longer meet, or the tyre rises no further however the arm turns, the linkage binds. Toe over the travel follows from the rod’s length: its outer end is moved sideways by d until the length is right again.',
      formula: math('δ', '=', fn('arcsin', fenced(frac('d', 'a')))),
    },
  ],
  drawing: {
    caption: 'One side from the front, with the letters of the formulas; to scale.',
    alternative: say`The lines of the lower arm, through points 1 and 2, and of the upper link, through 3 and 4, meet in the instant centre IC on the far side of the car. The line from the tyre’s contact c to IC crosses the centre line at the height h, the roll centre. The tie rod runs from 5 to 6. The distance across from c to IC is f.`,
    unit: 'mm',
    frame: { left: Math.floor(icY / 10) * 10 - 20, right: 160, bottom: -40, top: 120 },
    shapes: [
      {
        kind: 'line',
        style: 'ground',
        points: [
          [Math.floor(icY / 10) * 10 - 20, 0],
          [160, 0],
        ],
      },
      {
        kind: 'line',
        style: 'thought',
        points: [
          [0, 0],
          [0, 112],
        ],
      },
      { kind: 'line', style: 'thought', points: [shown.lowerInner, [icY, icZ]] },
      { kind: 'line', style: 'thought', points: [shown.upperInner, [icY, icZ]] },
      { kind: 'line', style: 'own', points: [shown.contact, [icY, icZ]] },
      ...sideShapes(shown, { turned: 0, radius: 50 }),
      { kind: 'point', at: [icY, icZ], style: 'part' },
      { kind: 'point', at: [0, (icZ * shown.contact[0]) / (shown.contact[0] - icY)], style: 'own' },
      ...(
        [
          ['1', shown.lowerInner, -1, -8],
          ['2', shown.lowerOuter, -4, -9],
          ['3', shown.upperInner, 0, 9],
          ['4', shown.upperOuter, -4, 9],
          ['5', shown.tieRodInner, -5, 1],
          ['6', shown.tieRodOuter, -8, 7],
        ] as const
      ).flatMap(([text, [py, pz], right, up]) => [
        { kind: 'point' as const, at: [py, pz] as const, style: 'part' as const },
        {
          kind: 'label' as const,
          at: [py + right, pz + up] as const,
          anchor: 'end' as const,
          text: say`${text}`,
        },
      ]),
      { kind: 'label', at: [134, 8], anchor: 'start', text: say`c` },
      { kind: 'label', at: [icY + 4, icZ + 12], anchor: 'middle', text: say`IC` },
      { kind: 'label', at: [-4, 8], anchor: 'end', text: say`h`, style: 'own' },
      { kind: 'dimension', from: [icY, 0], to: [shown.contact[0], 0], offset: -22, label: say`f` },
    ],
  },
}
