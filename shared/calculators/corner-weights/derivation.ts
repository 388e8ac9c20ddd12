export { derivation }

import { fenced, frac, math, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'

const [fl, fr, rl, rr] = [sub('W', 'FL'), sub('W', 'FR'), sub('W', 'RL'), sub('W', 'RR')]
const [front, rear] = [sub('t', 'F'), sub('t', 'R')]

/** From a car that stands still to its shares, its centre of gravity, and what springs can change. */
const derivation: Derivation = {
  steps: [
    {
      text: 'The car stands still, so the ground pushes up exactly as hard as gravity pulls down. The four scales together show its weight.',
      formula: math('W', '=', fl, '+', fr, '+', rl, '+', rr),
    },
    {
      text: 'It does not tip about the front axle either. The whole weight, at the centre of gravity, turns one way with the lever a; the rear wheels turn the other way with the lever L.',
      formula: math('W', '×', 'a', '=', fenced(rl, '+', rr), '×', 'L'),
    },
    {
      text: 'That gives the place of the centre of gravity along the car.',
      formula: math('a', '=', 'L', '×', frac(row(rl, '+', rr), 'W')),
    },
    {
      text: 'Nor does it tip about its centre line. Each wheel has half its track as lever, the left ones one way and the right ones the other.',
      formula: math(
        'W',
        '×',
        'y',
        '=',
        fenced(fl, '−', fr),
        '×',
        frac(front, '2'),
        '+',
        fenced(rl, '−', rr),
        '×',
        frac(rear, '2'),
      ),
    },
    {
      text: 'These are three conditions for four readings, so one thing is left free: how the load is shared between the diagonals. That is the cross weight, and it is all that springs can change.',
      formula: math('c', '=', 100, '×', frac(row(fr, '+', rl), 'W')),
    },
    {
      text: 'Turn the collars and x grams go from front right to front left. Total and front share stay, so the rear axle passes z grams from rear left to rear right, and the moment about the centre line must stay too.',
      formula: math('x', '×', front, '=', 'z', '×', rear),
    },
    {
      text: 'The diagonals are even when x and z together are half their difference. With equal tracks each is a quarter of it.',
      formula: math('x', '+', 'z', '=', frac(row(fr, '+', rl, '−', fl, '−', rr), '2')),
    },
  ],
  drawing: {
    caption: 'The letters, seen from above with the front at the top.',
    alternative: say`The car from above: four wheels with their loads, the wheelbase L, the two tracks, the centre of gravity a behind the front axle and y left of the centre line.`,
    unit: 'mm',
    frame: { left: -285, right: 285, bottom: -400, top: 70 },
    shapes: [
      {
        kind: 'line',
        points: [
          [-120, 0],
          [120, 0],
        ],
        style: 'frame',
      },
      {
        kind: 'line',
        points: [
          [-130, -325],
          [130, -325],
        ],
        style: 'frame',
      },
      {
        kind: 'line',
        points: [
          [0, 30],
          [0, -355],
        ],
        style: 'thought',
      },
      { kind: 'circle', at: [-120, 0], radius: 22, style: 'part' },
      { kind: 'circle', at: [120, 0], radius: 22, style: 'part' },
      { kind: 'circle', at: [-130, -325], radius: 24, style: 'part' },
      { kind: 'circle', at: [130, -325], radius: 24, style: 'part' },
      { kind: 'label', at: [-152, -5], anchor: 'end', text: say`front left` },
      { kind: 'label', at: [152, -5], anchor: 'start', text: say`front right` },
      { kind: 'label', at: [-164, -330], anchor: 'end', text: say`rear left` },
      { kind: 'label', at: [164, -330], anchor: 'start', text: say`rear right` },
      { kind: 'dimension', from: [-120, 0], to: [120, 0], offset: 44, label: say`front track` },
      { kind: 'dimension', from: [-130, -325], to: [130, -325], offset: -44, label: say`rear track` },
      { kind: 'dimension', from: [80, -325], to: [80, 0], offset: 0, label: say`L` },
      { kind: 'dimension', from: [-30, -172], to: [-30, 0], offset: 30, label: say`a` },
      { kind: 'dimension', from: [-30, -172], to: [0, -172], offset: -24, label: say`y` },
      { kind: 'point', at: [-30, -172], style: 'own' },
      { kind: 'label', at: [12, -166], anchor: 'start', text: say`W`, style: 'own' },
    ],
  },
}
