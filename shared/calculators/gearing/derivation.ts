export { derivation }

import { frac, math, row, sub, type MathNode } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'
import type { DrawingShape } from '../drawing.ts'

const z = (gear: string) => sub('z', gear)
const words = (text: string): MathNode => ({ tag: 'mtext', text })

const derivation: Derivation = {
  steps: [
    {
      text: 'Two gears in mesh pass one tooth for one tooth. While the spur turns once, all its teeth go by, and the pinion has to turn until it has passed as many.',
      formula: math(words('turns of the pinion'), '=', frac(z('spur'), z('pinion'))),
    },
    {
      text: 'The diff’s pinion sits on the shaft of the spur and turns with it. It drives the ring gear in the same way.',
      formula: math(words('turns of the diff’s pinion'), '=', frac(z('ring'), z('diff pinion'))),
    },
    {
      text: 'For one turn of the ring gear the shaft between turns by the second fraction, and for each of those turns the motor turns by the first: the fractions multiply.',
      formula: math('i', '=', frac(z('spur'), z('pinion')), '×', frac(z('ring'), z('diff pinion'))),
    },
    {
      text: 'A wheel that rolls without slip moves the car by its own circumference in one turn. The motor makes i turns meanwhile, so one turn of the motor is worth an i-th of that.',
      formula: math('s', '=', frac(row('π', '×', 'D'), 'i')),
    },
    {
      text: 'A motor without load turns in proportion to its voltage; kV is that proportion.',
      formula: math('n', '=', 'K', '×', 'U'),
    },
    {
      text: 'Turns in a minute times distance in a turn is distance in a minute; sixty of them make an hour.',
      formula: math('v', '=', '60', '×', 'n', '×', 's'),
    },
    {
      text: 'While the diff turns freely, both wheels of an axle average that speed; in a corner the outer one runs faster and the inner one slower.',
    },
  ],
  drawing: {
    caption:
      'The default gears from the side, their heights in proportion to their teeth. The bevel gears are drawn as if their shafts were parallel.',
    alternative: say`Three shafts one above the other. The motor’s carries the small pinion, which meets the large spur on the middle shaft; the same shaft carries the small diff pinion, which meets the large ring gear on the shaft of the wheels.`,
    unit: 'mm',
    frame: { left: -32, right: 88, bottom: -14, top: 84 },
    shapes: train(),
  },
}

function train(): DrawingShape[] {
  const motor = 0
  const middle = (15 + 46) / 2
  const wheels = middle + (11 + 43) / 2
  const shaft = (y: number, from: number, to: number): DrawingShape => ({
    kind: 'line',
    points: [
      [from, y],
      [to, y],
    ],
    style: 'frame',
  })
  const gear = (x: number, y: number, teeth: number): DrawingShape => ({
    kind: 'line',
    points: [
      [x - 2.5, y - teeth / 2],
      [x - 2.5, y + teeth / 2],
      [x + 2.5, y + teeth / 2],
      [x + 2.5, y - teeth / 2],
    ],
    style: 'part',
    closed: true,
  })
  const name = (x: number, y: number, text: string, anchor: 'start' | 'end' = 'start'): DrawingShape => ({
    kind: 'label',
    at: [x, y],
    anchor,
    text: [text],
  })
  return [
    shaft(motor, -14, 12),
    shaft(middle, 2, 44),
    shaft(wheels, 32, 60),
    gear(6, motor, 15),
    gear(6, middle, 46),
    gear(38, middle, 11),
    gear(38, wheels, 43),
    { kind: 'arrow', from: [-29, motor], to: [-16, motor], style: 'own' },
    { kind: 'arrow', from: [62, wheels], to: [75, wheels], style: 'own' },
    name(-29, motor + 3, 'motor'),
    name(62, wheels + 3, 'wheels'),
    name(12, motor - 7, 'pinion, 15'),
    name(0, middle + 14, 'spur, 46', 'end'),
    name(44, middle - 7, 'diff’s pinion, 11'),
    name(44, wheels + 17, 'ring gear, 43'),
  ]
}
