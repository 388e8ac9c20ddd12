export { derivation }

import { frac, math, power, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import { barFromAbove } from './drawings.ts'
import type { Derivation } from '../derivation.ts'
import type { DrawingSpec } from '../drawing.ts'

const twisted = frac(row(power('a', '2'), '×', 'b'), row('2', '×', 'G', '×', 'J'))
const bent = frac(power('a', '3'), row('3', '×', 'E', '×', 'I'))

const derivation: Derivation = {
  steps: [
    {
      text: 'When the car rolls, one link pushes its end of the bar up with a force F and the other pulls its end down with the same force. Each force twists the straight middle on an arm of length a.',
      formula: math('T', '=', 'F', '×', 'a'),
    },
    {
      text: 'The two twists are opposite, so the very middle of the bar stands still and each end twists only half of it.',
      formula: math(
        'θ',
        '=',
        frac(row('T', '×', 'b'), row('2', '×', 'G', '×', 'J')),
        ',',
        'J',
        '=',
        frac(row('π', '×', power('d', '4')), '32'),
      ),
    },
    {
      text: 'The twist swings the arm, and its end moves by that angle times the arm. The arm counts twice: once in the twist, once in the swing.',
      formula: math(sub('δ', 'twist'), '=', 'θ', '×', 'a', '=', 'F', '×', twisted),
    },
    {
      text: 'The arm is also a beam held at the bend and pushed at its end. How far it bends is the standard case of every handbook of beams.',
      formula: math(
        sub('δ', 'bend'),
        '=',
        'F',
        '×',
        bent,
        ',',
        'I',
        '=',
        frac(row('π', '×', power('d', '4')), '64'),
      ),
    },
    {
      text: 'The same force goes through the middle and the arm one after the other, so their movements add up. The rate is force over movement.',
      formula: math(
        'k',
        '=',
        frac('F', row(sub('δ', 'twist'), '+', sub('δ', 'bend'))),
        '=',
        frac('1', row(twisted, '+', bent)),
      ),
    },
    {
      text: 'Both J and I hold the diameter to the fourth power, so for two bars of one shape everything else drops out.',
      formula: math(
        frac(sub('k', 'other'), 'k'),
        '=',
        power(row('(', frac(sub('d', 'other'), 'd'), ')'), '4'),
      ),
    },
    {
      text: 'This is the rate of one end when both ends move. Some books give the force over the difference between the two ends instead, which is half of it; check which one you compare with.',
    },
  ],
  drawing: withLetters(),
}

/** The bar from above with letters in the place of the numbers. */
function withLetters(): DrawingSpec {
  const bar = barFromAbove({
    diameter: 2.4,
    comparisonDiameter: 2.4,
    middleLength: 70,
    armLength: 30,
    shearModulus: 79.3,
    youngsModulus: 207,
  })
  const letters = ['b', 'a']
  return {
    ...bar,
    caption: 'The default bar from above, to scale: middle b, arm a, thickness d.',
    alternative: say`A U-shaped bar from above: a straight middle b in two bearings, an arm a at each end, square to it, all of wire of the thickness d.`,
    shapes: [
      ...bar.shapes.map((shape) =>
        shape.kind === 'dimension' ? { ...shape, label: [letters.shift() ?? ''] } : shape,
      ),
      { kind: 'label', at: [37.5, -15], anchor: 'start', text: say`d` },
    ],
  }
}
