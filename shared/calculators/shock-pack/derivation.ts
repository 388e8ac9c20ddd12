export { derivation }

import { fenced, frac, math, power, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import type { Derivation } from '../derivation.ts'
import type { DrawingPoint, DrawingShape } from '../drawing.ts'

const derivation: Derivation = {
  steps: [
    {
      text: 'When the shaft moves at speed v, the piston pushes the oil out of its way. What cannot stay where it was has to go through the holes: the area of the bore less that of the rod, times the speed.',
      formula: math(
        'Q',
        '=',
        'A',
        '×',
        'v',
        ',',
        'A',
        '=',
        frac('π', '4'),
        '×',
        fenced(power(sub('D', 'bore'), '2'), '−', power(sub('D', 'rod'), '2')),
      ),
    },
    {
      text: 'In a narrow hole the oil sticks to the wall and slides over itself towards the middle. Pressure over the section balances drag along the wall, and summing up the sliding layers gives the flow of one hole: a hole twice as wide passes sixteen times as much.',
      formula: math(
        sub('Q', 'hole'),
        '=',
        frac(row('π', '×', power('d', '4'), '×', 'Δp'), row('128', '×', 'μ', '×', 'L')),
      ),
    },
    {
      text: 'All n holes share the flow, which gives the pressure.',
      formula: math(
        'Δp',
        '=',
        frac(row('128', '×', 'μ', '×', 'L', '×', 'A', '×', 'v'), row('n', '×', 'π', '×', power('d', '4'))),
      ),
    },
    {
      text: 'That pressure stands on the same area A. Force over speed is the damping, and the area comes in twice.',
      formula: math(
        'c',
        '=',
        frac(row('Δp', '×', 'A'), 'v'),
        '=',
        frac(row('128', '×', 'μ', '×', 'L', '×', power('A', '2')), row('n', '×', 'π', '×', power('d', '4'))),
      ),
    },
    {
      text: 'Between two pistons of one shock everything but the holes drops out. To damp the same, the oil has to make up for them.',
      formula: math(
        sub('ν', 'new'),
        '=',
        'ν',
        '×',
        frac(row(sub('n', 'new'), '×', power(sub('d', 'new'), '4')), row('n', '×', power('d', '4'))),
      ),
    },
    {
      text: 'The oil also has to be brought to the speed in the hole, and that push is lost behind it. It grows with the square of the speed, so it is felt on landings and hardly as the car rolls.',
      formula: math(
        sub('Δp', 'orifice'),
        '=',
        frac('ρ', '2'),
        '×',
        power(fenced(frac('Q', row('C', '×', 'n', '×', 'π', '×', frac(power('d', '2'), '4')))), '2'),
      ),
    },
    {
      text: 'The Reynolds number compares the two ways of the oil. Up to about 2,000 it slides in layers; in a shock it is nearer to ten.',
      formula: math('Re', '=', frac(row(sub('v', 'hole'), '×', 'd'), 'ν')),
    },
  ],
  drawing: {
    caption: 'The default shock cut along its rod, to scale: oil goes through the holes as the piston moves.',
    alternative: say`A shock body cut lengthwise with its piston on the rod. Two of the piston’s holes are cut, of diameter d and as long as the piston is thick, L. Arrows show the piston moving up and the oil passing down through the holes.`,
    unit: 'mm',
    frame: { left: -20, right: 20, bottom: -10, top: 12 },
    shapes: cutShock(),
  },
}

/** Bore 16, rod 3.5, piston 2.5 thick with holes of 1.3 on a circle of 10; the piston fills the bore. */
function cutShock(): DrawingShape[] {
  const [bore, rod, thick, hole, place] = [8, 1.75, 1.25, 0.65, 5]
  const block = (left: number, right: number): DrawingShape => ({
    kind: 'line',
    points: [
      [left, -thick],
      [left, thick],
      [right, thick],
      [right, -thick],
    ] satisfies DrawingPoint[],
    style: 'part',
    closed: true,
  })
  const flow = (x: number): DrawingShape => ({ kind: 'arrow', from: [x, 4.5], to: [x, -4.5], style: 'own' })
  return [
    {
      kind: 'line',
      points: [
        [-bore, -9],
        [-bore, 10],
      ],
      style: 'frame',
    },
    {
      kind: 'line',
      points: [
        [bore, -9],
        [bore, 10],
      ],
      style: 'frame',
    },
    {
      kind: 'line',
      points: [
        [-place - hole, thick],
        [-place - hole, 7],
      ],
      style: 'thought',
    },
    {
      kind: 'line',
      points: [
        [-place + hole, thick],
        [-place + hole, 7],
      ],
      style: 'thought',
    },
    {
      kind: 'line',
      points: [
        [-rod, -9],
        [-rod, -thick],
      ],
      style: 'part',
    },
    {
      kind: 'line',
      points: [
        [rod, -9],
        [rod, -thick],
      ],
      style: 'part',
    },
    block(-bore, -place - hole),
    block(-place + hole, place - hole),
    block(place + hole, bore),
    flow(-place),
    flow(place),
    { kind: 'arrow', from: [0, 3], to: [0, 8], style: 'thought' },
    { kind: 'label', at: [1, 7.5], anchor: 'start', text: say`v` },
    { kind: 'label', at: [-place, 8.5], anchor: 'middle', text: say`d` },
    { kind: 'dimension', from: [bore, -thick], to: [bore, thick], offset: -4, label: say`L` },
    { kind: 'label', at: [0, -8.4], anchor: 'middle', text: say`rod` },
    { kind: 'label', at: [-9, 4], anchor: 'end', text: say`bore` },
  ]
}
