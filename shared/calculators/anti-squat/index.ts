export { calculator }

import { carMass, cgHeight, wheelbase } from '../common/car-inputs.ts'
import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { squatDrawing } from './drawing.ts'
import { carriedByArms, fullAngle, loadTransfer } from './load-sharing.ts'
import { squatWorking } from './working.ts'

const calculator = defineCalculator({
  slug: 'anti-squat',
  title: 'How much of the squat your rear arms hold',
  purpose:
    'Says what share of the load that moves to the rear on power goes through the rear arms, and what is left for the springs. Use it before you change rear hinge-pin inserts, or to compare two cars whose pins are tilted alike.',
  part: 'ride height and movement',
  keywords: [
    'anti-squat',
    'squat',
    'hinge pin',
    'inserts',
    'kick',
    'pin angle',
    'on power',
    'acceleration',
    'rear block',
    'weight transfer',
  ],
  inputs: [
    {
      key: 'pinAngle',
      label: 'Tilt of the rear hinge pins',
      unit: 'deg',
      default: 2,
      min: -30,
      max: 30,
      step: 0.5,
      reason: 'pins tilted further would let the wheel move back more than up',
      help: 'Front end of the pin higher counts plus. From the blocks’ marks, or with an angle gauge on the pin.',
      carKey: { rear: 'rearPinAngle' },
    },
    wheelbase,
    cgHeight,
    {
      key: 'rearDriveShare',
      label: 'Share of the drive at the rear',
      unit: '%',
      default: 60,
      min: 0,
      max: 100,
      step: 5,
      reason: 'the rear wheels can take none of the drive, all of it, or something between',
      help: '100 for two-wheel drive. With a centre diff about 50 to 60 while both ends grip.',
      carKey: 'rearDriveShare',
    },
    carMass,
    {
      key: 'acceleration',
      label: 'Acceleration',
      unit: 'g0',
      default: 0.5,
      min: 0,
      max: 3,
      step: 0.1,
      reason: 'below zero the car brakes, which shares the force otherwise, and no tyre pulls harder',
      help: 'About 0.3 on loose ground, 0.5 with some bite, 1 on carpet (common practice).',
    },
  ],
  outputs: [
    { key: 'antiSquat', label: 'Anti-squat', unit: '%', digits: 3 },
    { key: 'loadTransfer', label: 'Load that moves to the rear', unit: 'N', digits: 3 },
    { key: 'springLoad', label: 'Of that, on the rear springs', unit: 'N', digits: 3 },
  ],
  compute(car) {
    const antiSquat = carriedByArms(car)
    const moved = loadTransfer(car)
    return { antiSquat, loadTransfer: moved, springLoad: moved * (1 - antiSquat / 100) }
  },
  warnings({ pinAngle, acceleration, cgHeight: height, wheelbase: length }, { antiSquat }) {
    const warnings: FieldMessage[] = []
    if (antiSquat > 100) {
      warnings.push({
        field: 'pinAngle',
        message: say`Over ${figure(100, '%')} the rear rises on power. That is possible, but far beyond any usual set-up: check the angle and its sign.`,
      })
    } else if (Math.abs(pinAngle) > 10) {
      warnings.push({
        field: 'pinAngle',
        message: say`Blocks rarely tilt a pin by more than ${figure(10, 'deg')}. Past it the wheel’s path bends, and the answer holds at ride height only.`,
      })
    }
    if ((acceleration * height) / length > 0.4) {
      warnings.push({
        field: 'acceleration',
        message: say`This would move ${figure((100 * acceleration * height) / length, '%', 2)} of the car’s weight to the rear. The front wheels of most cars leave the ground before that, and then the sum no longer holds.`,
      })
    }
    return warnings
  },
  answer(inputs, { antiSquat, loadTransfer: moved, springLoad }) {
    return {
      says: answerFor(antiSquat),
      more: [
        say`At ${figure(inputs.acceleration, 'g0')} the rear axle gains ${figure(moved, 'N')}. The arms carry ${figure(moved - springLoad, 'N')} of it and the springs ${figure(springLoad, 'N')}.`,
        whole(inputs),
        say`No tilt changes how much load moves; it only decides who carries it. Springs have to sink first, arms answer at once.`,
      ],
    }
  },
  working: squatWorking,
  drawings: (inputs, outputs) => [squatDrawing(inputs, outputs)],
  comparison(inputs, { antiSquat, loadTransfer: moved, springLoad }) {
    const more = carriedByArms({ ...inputs, pinAngle: inputs.pinAngle + 1 })
    const spared = springLoad - moved * (1 - more / 100)
    return {
      says:
        inputs.rearDriveShare === 0
          ? say`With no drive at the rear, tilting the pins changes nothing.`
          : inputs.acceleration === 0
            ? say`One degree more adds ${figure(more - antiSquat, '%', 2)} of anti-squat, which the arms use once the car accelerates.`
            : say`One degree more adds ${figure(more - antiSquat, '%', 2)} of anti-squat and takes ${figure(spared, 'N', 2)} off the rear springs.`,
      caption: 'If you tilt the pins one degree more',
      columns: ['Now', 'One degree more'],
      rows: [
        {
          label: say`Tilt of the pins`,
          unit: 'deg',
          digits: 3,
          cells: [inputs.pinAngle, inputs.pinAngle + 1],
        },
        { label: say`Anti-squat`, unit: '%', digits: 3, cells: [antiSquat, more] },
        {
          label: say`On the arms`,
          unit: 'N',
          digits: 3,
          cells: [moved - springLoad, moved - springLoad + spared],
        },
        { label: say`On the springs`, unit: 'N', digits: 3, cells: [springLoad, springLoad - spared] },
      ],
    }
  },
  limits: {
    goodBetween:
      'Independent rear suspension with the diff on the chassis and both rear hinge pins parallel, front wheels on the ground, steady acceleration, the car at ride height. The front suspension and rotating parts are left out.',
    howClose:
      'As close as the height of the centre of gravity: 5\u00A0mm of error at 45\u00A0mm is 11\u00A0% of the answer. What a driver feels is more than these newtons say; the sum cannot tell you how quickly the push arrives.',
  },
  sources: [
    {
      text: 'T. D. Gillespie, Fundamentals of Vehicle Dynamics, SAE 1992, chapter 7, and W. F. and D. L. Milliken, Race Car Vehicle Dynamics, chapter 17: with the diff on the chassis the line starts at the wheel centre.',
      known: 'From memory; neither was looked up.',
    },
    {
      text: 'D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering, Springer 2018, p. 25: load transfer m a h / L; p. 197: what the rear springs gain under acceleration.',
      url: 'https://fliphtml5.com/osspz/szqt/Automotive_Chassis_Engineering/37',
      known: 'Read, page text; authors and year from memory.',
    },
  ],
  cautions: [],
})

function answerFor(antiSquat: number): Sentence {
  if (Math.abs(antiSquat) < 0.05)
    return say`Anti-squat is ${mainFigure(0, '%')}: the springs carry all of the load that moves to the rear.`
  if (antiSquat < 0)
    return say`Anti-squat is ${mainFigure(antiSquat, '%')}: the arms pull the rear down on power, and the springs carry more than the load that moves.`
  if (antiSquat > 100)
    return say`Anti-squat is ${mainFigure(antiSquat, '%')}: the arms carry more than the load that moves, and the rear rises on power.`
  return say`Anti-squat is ${mainFigure(antiSquat, '%')}: so much of the load that moves to the rear on power goes through the arms.`
}

function whole(car: { rearDriveShare: number; wheelbase: number; cgHeight: number }): Sentence {
  if (car.rearDriveShare === 0)
    return say`With no drive at the rear there is nothing for the tilt to work with.`
  return say`At ${figure(100, '%')} the rear would neither sink nor rise; on this car that takes pins tilted by ${figure(fullAngle(car), 'deg')}.`
}
