export { calculator }

import { sine } from '../common/degrees.ts'
import { carMass, wheelbase } from '../common/car-inputs.ts'
import { defineCalculator, type CalculatorInput, type FieldMessage } from '../definition.ts'
import { NoAnswerError } from '../run-definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { raisedDrawing } from './drawing.ts'
import { raisedCar } from './raised-car.ts'
import { heightWorking } from './working.ts'

const reading = <const Key extends string>(
  key: Key,
  label: string,
  standard: number,
  help: string,
): CalculatorInput<Key> => ({
  key,
  label,
  help,
  unit: 'g',
  default: standard,
  min: 1,
  max: 11_999,
  step: 1,
  reason: 'both axles must carry something, and the whole car weighs 12\u00A0kg at most',
})

const calculator = defineCalculator({
  slug: 'cg-height',
  title: 'How high your car’s centre of gravity is',
  purpose:
    'Says how high the centre of gravity lies, from weighing the front axle level and raised. Measure it once for your car: anti-squat, roll and weight transfer all need it.',
  part: 'weight',
  keywords: [
    'centre of gravity',
    'cg',
    'height',
    'weigh',
    'scale',
    'raise',
    'tilt',
    'how high',
    'roll over',
    'traction roll',
  ],
  inputs: [
    carMass,
    wheelbase,
    reading(
      'frontLevel',
      'Front axle, car level',
      1700,
      'Both front wheels on the scale, rear wheels on a block as high as the scale.',
    ),
    reading(
      'frontRaised',
      'Front axle, front raised',
      1745,
      'Scale and front wheels on a block. It may read more than level: then the centre of gravity lies below the axles.',
    ),
    {
      key: 'raisedBy',
      label: 'Front axle raised by',
      unit: 'mm',
      default: 100,
      min: 10,
      max: 500,
      step: 5,
      reason: 'less changes the readings too little to see, and more is no tilt but a car on its tail',
      help: 'How much higher the front axle is than the rear one.',
    },
    {
      key: 'tyreRadius',
      label: 'Tyre radius',
      unit: 'mm',
      default: 57.5,
      min: 10,
      max: 150,
      step: 0.5,
      reason: 'R/C tyres are not smaller or larger than that',
      help: 'From the ground to the middle of the axle, the car standing on it.',
      carKey: 'tyreRadius',
    },
  ],
  outputs: [{ key: 'cgHeight', label: 'Height of the centre of gravity', unit: 'mm', digits: 3 }],
  compute(inputs) {
    const { cgHeight } = raisedCar(inputs)
    if (cgHeight > 0) return { cgHeight }
    throw new NoAnswerError(
      'frontRaised',
      say`These readings would put the centre of gravity ${figure(-cgHeight, 'mm')} below the ground, which cannot be. Weigh again, and check that both readings are of the front axle.`,
    )
  },
  relations({ mass, wheelbase: length, frontLevel, frontRaised, raisedBy }) {
    const errors: FieldMessage[] = []
    for (const [field, grams] of [
      ['frontLevel', frontLevel],
      ['frontRaised', frontRaised],
    ] as const) {
      if (grams < 1000 * mass) continue
      errors.push({
        field,
        message: say`${figure(grams, 'g', 6)} on the front axle would leave the rear axle nothing: the whole car weighs ${figure(mass, 'kg', 5)}.`,
      })
    }
    if (raisedBy >= length * Math.SQRT1_2) {
      errors.push({
        field: 'raisedBy',
        message: say`Raised by ${figure(raisedBy, 'mm')} a car of ${figure(length, 'mm')} wheelbase stands steeper than 45°. It would roll or tip; raise it by a third of its wheelbase.`,
      })
    }
    return errors
  },
  warnings({ wheelbase: length, raisedBy, tyreRadius, frontLevel, mass, frontRaised }, { cgHeight }) {
    const warnings: FieldMessage[] = []
    const share = (100 * frontLevel) / (1000 * mass)
    if (share < 20 || share > 80) {
      warnings.push({
        field: 'frontLevel',
        message: say`That is ${figure(share, '%')} of the car on its front wheels. Check that the rear wheels stood as high as the scale.`,
      })
    }
    if (cgHeight < 15) {
      warnings.push({
        field: 'frontRaised',
        message: say`${figure(cgHeight, 'mm')} is lower than a battery can lie. Look for a wheel that rubs on the block or a shock that sank.`,
      })
    } else if (cgHeight > tyreRadius + 40) {
      warnings.push({
        field: 'frontRaised',
        message: say`The front reads ${figure(frontLevel - frontRaised, 'g')} less when raised, which puts the centre of gravity high above the axles. Check that the shocks were blocked and nothing in the car slid back.`,
      })
    }
    if (raisedBy < length * sine(5)) {
      warnings.push({
        field: 'raisedBy',
        message: say`So small a tilt makes every gram of error count. Raise it by about ${figure(Math.round(length / 30) * 10, 'mm')}.`,
      })
    }
    return warnings
  },
  answer(inputs, { cgHeight }) {
    const { aboveAxles, perGram } = raisedCar(inputs)
    return {
      says: say`The centre of gravity is ${mainFigure(cgHeight, 'mm')} above the ground.`,
      more: [
        place(aboveAxles),
        say`One gram of error on the scale moves that by ${figure(perGram, 'mm', 2)}. Raise and weigh three times, at different heights, and take the mean.`,
        say`Block the shocks, with spacers on their shafts or solid links, or the car sinks at the rear and the answer comes out wrong.`,
      ],
    }
  },
  working: heightWorking,
  drawings: (inputs, outputs) => [raisedDrawing(inputs, outputs)],
  tables(inputs, { cgHeight }) {
    const { perGram } = raisedCar(inputs)
    const row = (grams: number, own?: true) => ({
      label: say`Front raised reads ${figure(inputs.frontRaised + grams, 'g', 6)}`,
      unit: 'mm' as const,
      digits: 3,
      cells: [cgHeight - grams * perGram],
      ...(own && { own }),
    })
    return [
      {
        caption: 'If the scale is off',
        columns: ['Height'],
        rows: [row(-2), row(-1), row(0, true), row(1), row(2)],
      },
    ]
  },
  limits: {
    goodBetween:
      'A tilt of 5 to 45°, shocks blocked, wheels free to roll, front and rear tyres of one radius, battery strapped down. A car whose front and rear tyres differ by a few millimetres comes out a tenth of a millimetre wrong.',
    howClose:
      'To about a millimetre with a scale that reads whole grams and three heights. The same with the rear axle raised is a good second opinion.',
  },
  sources: [
    {
      text: 'ISO 10392:2011, Road vehicles, determination of centre of gravity, 6.2.1 to 6.2.6: raise one axle in three or more steps, take the mean, repeat with the other axle.',
      known: 'These clauses were read in excerpts; the equations in 6.5 were not.',
    },
    {
      text: 'A van maker’s guideline for body builders, section 3.5: centre of gravity height from weighing with one axle raised.',
      url: 'http://www.vwn-aufbaurichtlinien.de/en/models/crafter/3-body-attachments-and-equipment/35-centre-of-gravity-heights/',
      known: 'Read; its chain of formulas comes to the same result.',
    },
  ],
  cautions: [],
})

function place(aboveAxles: number): Sentence {
  if (Math.abs(aboveAxles) < 0.05)
    return say`That is level with the axles: raising the front changed nothing.`
  return aboveAxles < 0
    ? say`That is ${figure(-aboveAxles, 'mm')} below the axles, as usual on a buggy with large wheels: raised, the front reads more.`
    : say`That is ${figure(aboveAxles, 'mm')} above the axles: raised, the front reads less.`
}
