export { calculator }

import { wheelbase } from '../common/car-inputs.ts'
import { defineCalculator, type CalculatorInput, type FieldMessage } from '../definition.ts'
import { figure, say } from '../sentence.ts'
import { cornerDrawing } from './drawing.ts'
import { balance } from './wheel-loads.ts'
import { cornerAnswer, evenedComparison } from './words.ts'
import { cornerWorking } from './working.ts'
import type { CarKey } from '#shared/cars/car-values.ts'

const wheel = <const Key extends string>(
  key: Key,
  label: string,
  standard: number,
  carKey: CarKey,
  help?: string,
): CalculatorInput<Key> => ({
  key,
  label,
  carKey,
  ...(help !== undefined && { help }),
  unit: 'g',
  default: standard,
  min: 0,
  max: 5000,
  step: 1,
  reason: 'a wheel cannot pull at its scale, and no R/C car puts more on one wheel',
})
const track = <const Key extends string>(key: Key, label: string): CalculatorInput<Key> => ({
  key,
  label,
  unit: 'mm',
  default: 255,
  min: 80,
  max: 600,
  step: 1,
  reason: 'R/C cars are not built narrower or wider than that',
  help: 'Middle of the left tyre to middle of the right tyre, where they touch the ground.',
  carKey: key as CarKey,
})

const calculator = defineCalculator({
  slug: 'corner-weights',
  title: 'What each wheel carries',
  purpose:
    'Says how the weight is shared front to rear, side to side and across, and what to do about a car that is uneven. Use it after a build, after a crash, or when the car turns better one way than the other.',
  part: 'weight',
  keywords: [
    'corner weight',
    'cross weight',
    'wedge',
    'tweak',
    'scales',
    'balance',
    'left and right',
    'four scales',
    'preload',
    'pulls to one side',
  ],
  inputs: [
    wheel(
      'frontLeft',
      'Front left wheel',
      850,
      'cornerFrontLeft',
      'All four wheels on level scales of the same height, car settled, nobody touching it.',
    ),
    wheel('frontRight', 'Front right wheel', 850, 'cornerFrontRight'),
    wheel('rearLeft', 'Rear left wheel', 950, 'cornerRearLeft'),
    wheel('rearRight', 'Rear right wheel', 950, 'cornerRearRight'),
    wheelbase,
    track('trackFront', 'Front track'),
    track('trackRear', 'Rear track'),
  ],
  outputs: [
    { key: 'total', label: 'Whole car', unit: 'g', digits: 5 },
    { key: 'frontShare', label: 'On the front wheels', unit: '%', digits: 4 },
    { key: 'leftShare', label: 'On the left wheels', unit: '%', digits: 4 },
    { key: 'crossWeight', label: 'Cross weight, front right and rear left', unit: '%', digits: 4 },
    { key: 'cgFromFrontAxle', label: 'Centre of gravity behind the front axle', unit: 'mm', digits: 4 },
    { key: 'cgFromCentreLine', label: 'Centre of gravity left of the centre line', unit: 'mm', digits: 3 },
  ],
  compute: balance,
  relations({ frontLeft, frontRight, rearLeft, rearRight }) {
    if (frontLeft + frontRight + rearLeft + rearRight > 0) return []
    return [
      {
        field: 'frontLeft',
        message: say`All four wheels read ${figure(0, 'g')}: there is no car on the scales.`,
      },
    ]
  },
  warnings(car, { crossWeight }) {
    const warnings: FieldMessage[] = []
    for (const field of ['frontLeft', 'frontRight', 'rearLeft', 'rearRight'] as const) {
      if (car[field] > 0) continue
      warnings.push({
        field,
        message: say`This wheel carries nothing. It hangs in the air or stands beside its scale, or the suspension binds.`,
      })
    }
    if (Math.abs(crossWeight - 50) > 5) {
      warnings.push({
        field: 'frontRight',
        message: say`A cross weight of ${figure(crossWeight, '%')} is more than spring collars make. Check that the scales are level, and look for a twisted chassis, a bent shock shaft or a binding arm.`,
      })
    }
    return warnings
  },
  answer: cornerAnswer,
  working: cornerWorking,
  drawings: (inputs, outputs) => [cornerDrawing(inputs, outputs)],
  comparison: evenedComparison,
  limits: {
    goodBetween:
      'Any car that stands still on four level scales. Push it down and let it come up by itself before each reading; friction in the shocks alone can move the readings by tens of grams.',
    howClose:
      'As good as the scales. One gram on one wheel of a 3.6\u00A0kg car is 0.03\u00A0% of cross weight. The even readings hold while only the springs change and the car stays level.',
  },
  sources: [
    {
      text: 'W. F. and D. L. Milliken, Race Car Vehicle Dynamics, SAE 1995, chapter 18: shares of the wheel weights and centre of gravity by moments.',
      known: 'From memory; the book was not looked up.',
    },
    {
      text: 'Moments in equilibrium, with worked examples of cars on two axles.',
      url: 'https://asklearnings.org/asktema/6436263',
      known: 'Read; any school book of statics has the same.',
    },
    {
      text: 'Half a per cent as even enough, sway bars unhooked first, a quarter turn at a time.',
      known: 'Common practice.',
    },
  ],
  cautions: [],
})
