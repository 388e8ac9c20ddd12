export { calculator }

import { carMass, frontWeight, wheelbase } from '../common/car-inputs.ts'
import { defineCalculator, type CalculatorInput, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { shiftDrawing } from './drawing.ts'
import { shifted } from './shifted.ts'
import { moveWorking } from './working.ts'

type Inputs = Record<
  'mass' | 'frontWeight' | 'wheelbase' | 'partMass' | 'moveForward' | 'moveLeft' | 'moveUp',
  number
>
type Outputs = Record<'newFrontWeight' | 'cgForward' | 'cgLeft' | 'cgUp', number>

const move = <const Key extends string>(
  key: Key,
  label: string,
  standard: number,
  reach: number,
  help: string,
): CalculatorInput<Key> => ({
  key,
  label,
  help,
  unit: 'mm',
  default: standard,
  min: -reach,
  max: reach,
  step: 1,
  reason: 'further, the part would no longer be in the car',
})

const calculator = defineCalculator({
  slug: 'move-weight',
  title: 'What moving a weight does',
  purpose:
    'Says how far the balance of the car goes when you move the battery, the receiver or a piece of ballast. Use it before you drill a new battery tray, or to see whether a move is worth the work.',
  part: 'weight',
  keywords: [
    'ballast',
    'battery position',
    'move',
    'weight',
    'lead',
    'brass',
    'front and rear',
    'balance',
    'centre of gravity',
    'lower',
  ],
  inputs: [
    {
      key: 'partMass',
      label: 'Part that moves',
      unit: 'g',
      default: 400,
      min: 1,
      max: 5000,
      step: 10,
      reason: 'less nobody feels, and more is not a part but a car',
      help: 'On a kitchen scale, with its tray and screws if they move too.',
    },
    move('moveForward', 'Forward', 10, 400, 'Minus moves it back.'),
    move('moveLeft', 'To the left', 0, 300, 'Minus moves it to the right.'),
    move('moveUp', 'Up', 0, 150, 'Minus moves it down, which is what you usually want.'),
    carMass,
    frontWeight,
    wheelbase,
  ],
  outputs: [
    { key: 'newFrontWeight', label: 'Then on the front wheels', unit: '%', digits: 4 },
    { key: 'cgForward', label: 'Centre of gravity forward', unit: 'mm', digits: 3 },
    { key: 'cgLeft', label: 'To the left', unit: 'mm', digits: 3 },
    { key: 'cgUp', label: 'Up', unit: 'mm', digits: 3 },
  ],
  compute: shifted,
  relations(inputs) {
    const { mass, partMass } = inputs
    if (partMass >= 1000 * mass) {
      return [
        {
          field: 'partMass',
          message: say`A part of ${figure(partMass, 'g', 6)} cannot be in a car of ${figure(mass, 'kg', 5)}.`,
        },
      ]
    }
    const { newFrontWeight } = shifted(inputs)
    if (newFrontWeight > 0 && newFrontWeight < 100) return []
    return [
      {
        field: 'moveForward',
        message: say`Moved so far the ${newFrontWeight > 0 ? 'rear' : 'front'} wheels would carry nothing, and the car would stand on its other axle.`,
      },
    ]
  },
  warnings({ mass, partMass }, { newFrontWeight }) {
    const warnings: FieldMessage[] = []
    if (partMass > 500 * mass) {
      warnings.push({
        field: 'partMass',
        message: say`That is more than half the car. Give the part that moves, not the whole car.`,
      })
    }
    if (newFrontWeight < 35 || newFrontWeight > 65) {
      warnings.push({
        field: 'moveForward',
        message: say`${figure(newFrontWeight, '%')} on the front wheels is outside what off-road cars are built to, about ${figure(35, '%')} to ${figure(65, '%')} (common practice). The sum still holds.`,
      })
    }
    return warnings
  },
  answer(inputs, outputs) {
    return {
      says: mainSentence(inputs, outputs),
      more: [axles(inputs), sideways(inputs, outputs), height(outputs)].flatMap((part) =>
        part === undefined ? [] : [part],
      ),
    }
  },
  working: moveWorking,
  drawings: (_inputs, outputs) => [shiftDrawing(outputs)],
  comparison(inputs, { newFrontWeight }) {
    const { mass, frontWeight: before } = inputs
    return {
      says: frontDifference(inputs),
      caption: 'Before and after the move',
      columns: ['Now', 'Moved'],
      rows: [
        { label: say`On the front wheels`, unit: '%', digits: 4, cells: [before, newFrontWeight] },
        {
          label: say`Front axle`,
          unit: 'g',
          digits: 4,
          cells: [10 * before * mass, 10 * newFrontWeight * mass],
        },
        {
          label: say`Rear axle`,
          unit: 'g',
          digits: 4,
          cells: [10 * (100 - before) * mass, 10 * (100 - newFrontWeight) * mass],
        },
      ],
    }
  },
  limits: {
    goodBetween:
      'A part that moves and nothing else, the car standing level and still. For a part that you add, weigh the car again; this is for parts that stay in it.',
    howClose:
      'Exact for what you enter. A gram on a scale is a gram; where the middle of a battery lies is known to a few millimetres, but only how far it moves counts.',
  },
  sources: [
    {
      text: 'Nicholls’s Seamanship and Nautical Knowledge, stability equations: shift of the centre of gravity = distance × weight moved / displacement of the ship.',
      url: 'http://www.archive.org/download/NichollssSeamanshipAndNauticalKnowledge/TXT/00000559.txt',
      known: 'Read, with its exercises. A car that does not float obeys the same rule.',
    },
    {
      text: 'Moments about the rear axle, as in any school book of statics.',
      known: 'From memory; worked examples were read and are checked beside this one.',
    },
  ],
  cautions: [],
})

/** Grams that go from one axle to the other; forward counts plus. */
function gramsForward({ partMass, moveForward, wheelbase: length }: Inputs): number {
  return (partMass * moveForward) / length
}

function mainSentence(inputs: Inputs, { newFrontWeight, cgForward }: Outputs): Sentence {
  if (cgForward === 0)
    return say`The front wheels keep their ${mainFigure(newFrontWeight, '%', 3)} of the weight.`
  return say`The front wheels then carry ${mainFigure(newFrontWeight, '%', 3)} of the weight instead of ${figure(inputs.frontWeight, '%', 3)}.`
}

function axles(inputs: Inputs): Sentence | undefined {
  const grams = gramsForward(inputs)
  if (grams === 0) return undefined
  const [to, from] = grams > 0 ? ['front', 'rear'] : ['rear', 'front']
  return say`${figure(Math.abs(grams), 'g', 3)} go from the ${from} axle to the ${to} one.`
}

function sideways({ moveLeft }: Inputs, { cgLeft, cgForward }: Outputs): Sentence | undefined {
  const along = say`The centre of gravity moves ${figure(Math.abs(cgForward), 'mm', 2)} ${cgForward < 0 ? 'back' : 'forward'}`
  if (moveLeft === 0) return cgForward === 0 ? undefined : [...along, '.']
  return [
    ...along,
    ...say` and ${figure(Math.abs(cgLeft), 'mm', 2)} to the ${cgLeft > 0 ? 'left' : 'right'}; weigh all four wheels afterwards.`,
  ]
}

function height({ cgUp }: Outputs): Sentence | undefined {
  if (cgUp === 0) return undefined
  return cgUp < 0
    ? say`It comes down by ${figure(-cgUp, 'mm', 2)}: less load moves in corners, on power and on the brakes.`
    : say`It rises by ${figure(cgUp, 'mm', 2)}: more load moves in corners, on power and on the brakes.`
}

function frontDifference(inputs: Inputs): Sentence {
  const grams = gramsForward(inputs)
  if (Math.abs(grams) < 0.05) return say`Front and rear axle carry what they did.`
  return say`${figure(inputs.partMass, 'g', 4)} moved ${figure(Math.abs(inputs.moveForward), 'mm', 3)} ${grams > 0 ? 'forward' : 'back'} ${grams > 0 ? 'puts' : 'takes'} ${figure(Math.abs(grams), 'g', 3)} ${grams > 0 ? 'more on' : 'off'} the front wheels.`
}
