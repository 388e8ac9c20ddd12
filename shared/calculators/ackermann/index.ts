export { calculator }

import { defineCalculator, type CalculatorInput, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { steeringDrawing } from './drawing.ts'
import { ackermannPlot } from './plot.ts'
import { ackermannShares, idealInnerAngle, largestOuterAngle, turnRadius } from './steering.ts'
import { ackermannWorking } from './working.ts'

const wheelAngle = <const Key extends string>(
  key: Key,
  label: string,
  standard: number,
  help: string,
): CalculatorInput<Key> => ({
  key,
  label,
  help,
  unit: 'deg',
  default: standard,
  min: 0.5,
  max: 75,
  step: 1,
  reason: 'straight wheels make no turn to compare, and no joint steers further',
})

const calculator = defineCalculator({
  slug: 'ackermann',
  title: 'How much Ackermann your steering has',
  purpose:
    'Says how far your inner wheel turns compared with the angle that would follow the turn without scrubbing. Use it when you move the ends of the steering links and want to know what became of it.',
  part: 'wheel angles',
  keywords: [
    'steering',
    'Ackerman',
    'inner wheel',
    'outer wheel',
    'steering angle',
    'turn radius',
    'turning circle',
    'scrub',
    'toe-out in turns',
    'servo',
    'rack',
  ],
  inputs: [
    {
      key: 'wheelbase',
      label: 'Wheelbase',
      unit: 'mm',
      default: 325,
      min: 100,
      max: 5000,
      step: 1,
      reason: 'that is the range from the smallest model to a full-size car',
      help: 'From the middle of a front axle to the middle of the rear axle.',
      carKey: 'wheelbase',
    },
    {
      key: 'kingpinSpacing',
      label: 'Between the steering pivots',
      unit: 'mm',
      default: 200,
      min: 20,
      max: 2500,
      step: 1,
      reason: 'that is the range from the smallest model to a full-size car',
      help: 'From the axis one front hub steers about to the other, at axle height.',
      carKey: 'kingpinSpacing',
    },
    wheelAngle(
      'outerAngle',
      'Outer wheel',
      25,
      'The wheel outside the turn, from straight ahead. Take the toe off first.',
    ),
    wheelAngle('innerAngle', 'Inner wheel', 30, 'The other wheel, with the steering held in the same place.'),
  ],
  outputs: [
    { key: 'idealInnerAngle', label: 'Inner wheel for no scrub', unit: 'deg', digits: 4 },
    { key: 'ackermann', label: 'Ackermann', unit: '%', digits: 3 },
    { key: 'turnRadius', label: 'Turn radius, middle of the rear axle', unit: 'mm', digits: 4 },
  ],
  compute: (inputs) => ({
    idealInnerAngle: idealInnerAngle(inputs, inputs.outerAngle),
    ackermann: ackermannShares(inputs).byInner,
    turnRadius: turnRadius(inputs),
  }),
  relations(inputs) {
    const largest = largestOuterAngle(inputs)
    if (inputs.outerAngle < largest) return []
    return [
      {
        field: 'outerAngle',
        message: say`With these lengths the outer wheel must stay below ${figure(largest, 'deg')}: there the inner wheel would stand square to the car, and no angle of it follows the turn.`,
      },
    ]
  },
  warnings({ outerAngle, innerAngle }, outputs) {
    const warnings: FieldMessage[] = []
    if (outerAngle < 5) {
      warnings.push({
        field: 'outerAngle',
        message: say`Below ${figure(5, 'deg')} the two wheels differ so little that half a degree of measuring error decides the answer. Measure near full lock.`,
      })
    }
    if (innerAngle < outerAngle) {
      warnings.push({
        field: 'innerAngle',
        message: say`The inner wheel turns less than the outer one. Check that the two are not exchanged.`,
      })
    }
    if (outerAngle >= 5 && Math.abs(outputs.ackermann) > 200) {
      warnings.push({
        field: 'innerAngle',
        message: say`Far more than ${figure(100, '%')} comes from angles that no steering gives. Measure both wheels again, near full lock.`,
      })
    }
    if (outputs.turnRadius < 0) {
      warnings.push({
        field: 'outerAngle',
        message: say`The turn’s centre lies under the car. No car turns like that without sliding.`,
      })
    }
    return warnings
  },
  answer(inputs, outputs) {
    const { byOuter, byCotangent } = ackermannShares(inputs)
    return {
      says: say`With ${figure(inputs.outerAngle, 'deg')} outside and ${figure(inputs.innerAngle, 'deg')} inside, your steering has ${mainFigure(outputs.ackermann, '%')} Ackermann.`,
      more: [
        againstIdeal(inputs.innerAngle, outputs.idealInnerAngle),
        say`If nothing slipped, the middle of the rear axle would run on a circle of ${figure(outputs.turnRadius, 'mm')} radius.`,
        say`Two other definitions call the same wheels ${figure(byOuter, '%')} and ${figure(byCotangent, '%')}: compare figures only when you know they mean the same.`,
      ],
    }
  },
  working: ackermannWorking,
  plots: (inputs, outputs) => [ackermannPlot(inputs, outputs)],
  drawings: (inputs, outputs) => [steeringDrawing(inputs, outputs)],
  comparison(inputs, outputs) {
    const further = ackermannShares({ ...inputs, innerAngle: inputs.innerAngle + 1 }).byInner
    return {
      says: say`${figure(1, 'deg')} more at the inner wheel adds ${figure(further - outputs.ackermann, '%')} of Ackermann.`,
      caption: 'If the inner wheel turns one degree further',
      columns: ['Now', 'One degree more'],
      rows: [
        {
          label: say`Inner wheel`,
          unit: 'deg',
          digits: 4,
          cells: [inputs.innerAngle, inputs.innerAngle + 1],
        },
        { label: say`Ackermann`, unit: '%', digits: 3, cells: [outputs.ackermann, further] },
      ],
    }
  },
  tables(inputs) {
    const { byInner, byOuter, byCotangent } = ackermannShares(inputs)
    const row = (label: Sentence, share: number) => ({ label, unit: '%' as const, digits: 3, cells: [share] })
    return [
      {
        caption: 'The same two wheels by three definitions',
        columns: ['Ackermann'],
        rows: [
          { ...row(say`Angles, against the ideal inner wheel (used here)`, byInner), own: true },
          row(say`Angles, against the ideal outer wheel`, byOuter),
          row(say`Cotangents of the angles`, byCotangent),
        ],
      },
    ]
  },
  limits: {
    goodBetween:
      'Steering axes that stand upright, both angles read at the same place of the steering, a flat turn driven slowly.',
    howClose:
      'Exact for these angles. Caster and kingpin inclination turn the wheels’ contact a little more than the hub: about a degree at full lock. At speed tyres run at slip angles of several degrees, so 100\u00A0% is a reference, not a target.',
  },
  sources: [
    {
      text: 'ISO 8855:2011, 7.1.9, Ackermann geometry: the axes of the steerable wheels pass through the centre of the turn when cornering force is negligible.',
      known: 'Read in a paraphrase.',
    },
    {
      text: 'cot(outer) − cot(inner) = pivot spacing / wheelbase, the fundamental equation for correct steering.',
      known: 'Read on several pages of engineering examinations.',
    },
    {
      text: 'W. C. Mitchell, A. Staniforth, I. Scott, Analysis of Ackermann Steering Geometry, SAE 2006-01-3638: two common measures give very different results.',
      known: 'The abstract was read.',
    },
  ],
  cautions: [],
})

function againstIdeal(innerAngle: number, ideal: number): Sentence {
  const short = ideal - innerAngle
  if (Math.abs(short) < 0.005) return say`That is the pair of angles that follows the turn without scrubbing.`
  return say`To follow the turn without scrubbing the inner wheel would stand at ${figure(ideal, 'deg')}: yours is ${figure(Math.abs(short), 'deg', 2)} ${short > 0 ? 'short of it' : 'past it'}.`
}
