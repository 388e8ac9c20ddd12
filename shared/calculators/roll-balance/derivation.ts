export { derivation }

import { fenced, frac, math, power, row, sub } from '../mathml.ts'
import { say } from '../sentence.ts'
import { rollAxisDrawing } from './drawing.ts'
import type { Derivation } from '../derivation.ts'
import type { DrawingSpec } from '../drawing.ts'

const derivation: Derivation = {
  steps: [
    {
      text: 'When an axle leans by φ, its outside wheel goes up and its inside wheel down by half the track times φ. Springs and bar push back with their rates, each on an arm of half the track: twice their sum times the square of half the track.',
      formula: math(
        'K',
        '=',
        frac(row(fenced(sub('k', 'wheel'), '+', sub('k', 'bar')), '×', power('t', '2')), '2'),
      ),
    },
    {
      text: 'At each axle there is a height at which a side force makes the body slide but not lean: the roll centre. The body leans about the line between the two, the roll axis. Under the mass it lies between them in proportion to the weight.',
      formula: math(
        'h′',
        '=',
        'h',
        '−',
        fenced(sub('h', 'front'), '×', sub('w', 'front'), '+', sub('h', 'rear'), '×', sub('w', 'rear')),
      ),
    },
    {
      text: 'The side force m a acts at the mass, on the lever h′. Once the body leans, its weight stands off the axis by h′ φ and leans it further. Springs and bars hold against both.',
      formula: math(
        fenced(sub('K', 'front'), '+', sub('K', 'rear')),
        '×',
        'φ',
        '=',
        'm',
        '×',
        'a',
        '×',
        'h′',
        '+',
        'm',
        '×',
        'g',
        '×',
        'h′',
        '×',
        'φ',
      ),
    },
    {
      text: 'Solved for the lean. When the weight’s part is as large as the springs’, nothing holds the car up.',
      formula: math(
        'φ',
        '=',
        frac(
          row('m', '×', 'a', '×', 'h′'),
          row(sub('K', 'front'), '+', sub('K', 'rear'), '−', 'm', '×', 'g', '×', 'h′'),
        ),
      ),
    },
    {
      text: 'Now take one axle alone. Its springs and bar pass on K φ; its arms pass on its part of the side force at the height of its roll centre. Both are held by the difference of the two wheel loads on the track.',
      formula: math(
        'ΔF',
        '×',
        't',
        '=',
        'K',
        '×',
        'φ',
        '+',
        sub('m', 'axle'),
        '×',
        'a',
        '×',
        sub('h', 'axle'),
      ),
    },
    {
      text: 'What moves goes from the inside wheel, which had half the axle’s weight. When it has nothing left, it lifts.',
      formula: math(sub('F', 'inside'), '=', frac(row(sub('m', 'axle'), '×', 'g'), '2'), '−', 'ΔF'),
    },
    {
      text: 'With the same track at both ends the sum of both hardly depends on springs, bars or roll centres: height, track and weight set it. They only share it out, and that is why a stiffer front bar takes load change off the rear.',
      formula: math(
        fenced(sub('ΔF', 'front'), '+', sub('ΔF', 'rear')),
        '×',
        't',
        '=',
        'm',
        '×',
        'a',
        '×',
        'h',
        '+',
        'm',
        '×',
        'g',
        '×',
        'h′',
        '×',
        'φ',
      ),
    },
  ],
  drawing: withLetters(),
}

/** The default car from the side, with letters in the place of the numbers. */
function withLetters(): DrawingSpec {
  const side = rollAxisDrawing({
    mass: 3.6,
    frontWeight: 48,
    wheelbase: 325,
    cgHeight: 45,
    trackFront: 255,
    trackRear: 255,
    rollCentreFront: 15,
    rollCentreRear: 20,
    wheelRateFront: 0.3,
    wheelRateRear: 0.28,
    barRateFront: 0.2,
    barRateRear: 0.15,
    lateralAcceleration: 1,
  })
  const labels = ['h′', 'mass, h', 'h rear', 'h front']
  return {
    ...side,
    caption: 'The default car from the side, front to the right, to scale. The dashed line is the roll axis.',
    alternative: say`A side view with the ground, the roll centres of the rear axle at the height h rear and of the front axle at the height h front, the roll axis between them, and the mass at the height h, by h′ above that line.`,
    shapes: side.shapes.map((shape) => {
      if (shape.kind === 'label') return { ...shape, text: [labels.shift() ?? ''] }
      return shape
    }),
  }
}
