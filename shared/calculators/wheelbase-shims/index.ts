export { calculator }

import { frontWeight, wheelbase } from '../common/car-inputs.ts'
import { defineCalculator } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { axleDrawing } from './drawing.ts'
import { movedAxle } from './moved-axle.ts'
import { axleWorking } from './working.ts'

const calculator = defineCalculator({
  slug: 'wheelbase-shims',
  title: 'What wheelbase shims do to the balance',
  purpose:
    'Says how the weight on the front and rear wheels changes when shims move the rear axle. Use it when you move rear hubs on their pins and want to know how much of what you feel is weight.',
  part: 'weight',
  keywords: [
    'wheelbase',
    'shims',
    'spacers',
    'rear hub',
    'longer',
    'shorter',
    'rear traction',
    'hinge pin spacers',
    'weight on the rear',
  ],
  inputs: [
    wheelbase,
    frontWeight,
    {
      key: 'rearAxleBack',
      label: 'Rear axle moves back',
      unit: 'mm',
      default: 2,
      min: -15,
      max: 15,
      step: 0.5,
      reason: 'no rear hub has room for more shims than that',
      help: 'Shims taken from behind the hub and put in front of it. Minus moves the axle forward.',
    },
  ],
  outputs: [
    { key: 'newWheelbase', label: 'New wheelbase', unit: 'mm', digits: 4 },
    { key: 'newFrontWeight', label: 'Then on the front wheels', unit: '%', digits: 4 },
    { key: 'rearLoadChange', label: 'Change on the rear wheels', unit: '%', digits: 3 },
  ],
  compute(inputs) {
    const { newWheelbase, newFrontWeight, rearLoadChange } = movedAxle(inputs)
    return { newWheelbase, newFrontWeight, rearLoadChange }
  },
  warnings({ rearAxleBack }) {
    if (Math.abs(rearAxleBack) <= 6) return []
    return [
      {
        field: 'rearAxleBack',
        message: say`More than ${figure(6, 'mm')} is more than shims usually allow. Check that the drive shafts keep enough of their length in the cups, and take the arm’s own shims off the sum.`,
      },
    ]
  },
  answer(inputs, { newFrontWeight, newWheelbase, rearLoadChange }) {
    return {
      says:
        inputs.rearAxleBack === 0
          ? say`Nothing moves: the front wheels keep ${mainFigure(newFrontWeight, '%', 4)} of the weight.`
          : say`The front wheels then carry ${mainFigure(newFrontWeight, '%', 4)} of the weight, the rear wheels ${figure(100 - newFrontWeight, '%', 4)}.`,
      more: [
        say`The wheelbase is ${figure(newWheelbase, 'mm', 4)}.`,
        ...(rearLoadChange === 0 ? [] : [sense(rearLoadChange)]),
        ...(inputs.rearAxleBack === 0
          ? []
          : [
              say`${Math.abs(rearLoadChange) < 1 ? 'That is little weight. What you feel more is' : 'You feel'} the longer or shorter wheelbase, and toe, anti-squat and the drive shafts’ angles move along: check them afterwards.`,
            ]),
      ],
    }
  },
  working: axleWorking,
  drawings: (inputs, outputs) => [axleDrawing(inputs, outputs)],
  comparison({ wheelbase: before, frontWeight: front }, { newWheelbase, newFrontWeight, rearLoadChange }) {
    return {
      says: difference(before - newWheelbase, rearLoadChange),
      caption: 'Before and after the shims',
      columns: ['Now', 'With shims'],
      rows: [
        { label: say`Wheelbase`, unit: 'mm', digits: 4, cells: [before, newWheelbase] },
        { label: say`On the front wheels`, unit: '%', digits: 4, cells: [front, newFrontWeight] },
        { label: say`On the rear wheels`, unit: '%', digits: 4, cells: [100 - front, 100 - newFrontWeight] },
      ],
    }
  },
  limits: {
    goodBetween:
      'The rear axle moves and the centre of gravity stays where it is on the chassis. Move the hub by a few millimetres, not the whole rear end.',
    howClose:
      'Wheels and hubs move back too and take a part of the effect with them: where the rear wheels and hubs are 15\u00A0% of the car, that is about 0.09 of the 0.32\u00A0% that 2\u00A0mm give on a Kestrel 8e.',
  },
  sources: [
    {
      text: 'Moments about the rear axle, as in any school book of statics: the front share is the distance of the centre of gravity from the rear axle over the wheelbase.',
      url: 'https://asklearnings.org/asktema/6436263',
      known: 'A worked example was read and is checked beside this one.',
    },
    {
      text: 'Moving the rear axle forward puts more weight on the rear wheels; toe and shaft angles are checked afterwards.',
      known: 'Common practice; the first half is what the moments say too.',
    },
  ],
  cautions: [],
})

function sense(rearLoadChange: number): Sentence {
  return rearLoadChange < 0
    ? say`Moving the axle back takes weight off the rear wheels: the centre of gravity is farther from them now.`
    : say`Moving the axle forward puts weight on the rear wheels: they stand closer to the centre of gravity.`
}

function difference(shorterBy: number, rearLoadChange: number): Sentence {
  if (rearLoadChange === 0) return say`Without a shim nothing changes.`
  return say`${figure(Math.abs(shorterBy), 'mm', 3)} ${shorterBy > 0 ? 'shorter puts' : 'longer takes'} ${figure(Math.abs(rearLoadChange), '%', 2)} of the car’s weight ${shorterBy > 0 ? 'on' : 'off'} the rear wheels.`
}
