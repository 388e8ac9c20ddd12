export { derivation }

import { frac, math, row, sub } from '../mathml.ts'
import type { Derivation } from '../derivation.ts'

const moved = sub('s', 'forward')

/** From the definition of the centre of gravity to the new share on the front wheels. */
const derivation: Derivation = {
  steps: [
    {
      text: 'The centre of gravity is the mean place of all parts of the car, each counted by its weight. Measure every part’s place x from the rear axle.',
      formula: math(
        'm',
        '×',
        'b',
        '=',
        sub('w', '1'),
        '×',
        sub('x', '1'),
        '+',
        sub('w', '2'),
        '×',
        sub('x', '2'),
        '+',
        '…',
      ),
    },
    {
      text: 'Move one part by d. Only its own term changes, by its weight times d; the weight of the car stays.',
      formula: math('m', '×', sub('b', 'new'), '=', 'm', '×', 'b', '+', 'w', '×', 'd'),
    },
    {
      text: 'So the centre of gravity goes the same way as the part, by as much less as the part is lighter than the car. It does not matter where in the car the part was. The same holds sideways and up.',
      formula: math('s', '=', 'd', '×', frac('w', 'm')),
    },
    {
      text: 'By moments about the rear axle the front wheels’ share is the distance of the centre of gravity from that axle over the wheelbase.',
      formula: math('f', '=', 100, '×', frac('b', 'L')),
    },
    {
      text: 'A shift forward therefore adds its own length over the wheelbase.',
      formula: math(sub('f', 'new'), '=', 'f', '+', 100, '×', frac(moved, 'L')),
    },
    {
      text: 'In grams on the axle the weight of the car drops out: what goes from one axle to the other depends on the part, the move and the wheelbase alone.',
      formula: math('Δ', '=', frac(row('w', '×', 'd'), 'L')),
    },
  ],
}
