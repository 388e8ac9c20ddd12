export { calculator }

import { changeInWords } from '../common/change-in-words.ts'
import { roundedUp } from '../common/plot-window.ts'
import { defineCalculator, type FieldMessage } from '../definition.ts'
import { NoAnswerError } from '../run-definition.ts'
import { figure, say } from '../sentence.ts'
import { rollBalance, type BalanceValues } from './balance.ts'
import { rollAxisDrawing } from './drawing.ts'
import { balanceInputs } from './inputs.ts'
import { insidePlot } from './plot.ts'
import { balanceAnswer, goesBothWays } from './sentences.ts'
import { balanceWorking } from './working.ts'

const calculator = defineCalculator({
  slug: 'roll-balance',
  title: 'Which end takes the load in a corner',
  purpose:
    'Works out how far the car leans and how springs, bars and roll centres share the load between front and rear. Use it to see which way a spring, a bar or a roll centre moves the balance, and when a wheel lifts.',
  part: 'springs and shocks',
  keywords: [
    'roll',
    'lean',
    'balance',
    'load transfer',
    'weight transfer',
    'push',
    'loose',
    'lift',
    'traction roll',
    'sway bar',
    'roll centre',
    'corner',
  ],
  inputs: balanceInputs,
  outputs: [
    { key: 'frontShare', label: 'Front share of the transfer', unit: '%', digits: 3 },
    { key: 'rollAngle', label: 'Lean', unit: 'deg', digits: 3 },
    { key: 'rollStiffnessFront', label: 'Roll stiffness, front', unit: 'N·m/deg', digits: 3 },
    { key: 'rollStiffnessRear', label: 'Roll stiffness, rear', unit: 'N·m/deg', digits: 3 },
    { key: 'loadTransferFront', label: 'Moves across, front', unit: 'N', digits: 3 },
    { key: 'loadTransferRear', label: 'Moves across, rear', unit: 'N', digits: 3 },
    { key: 'insideLoadFront', label: 'Left on inside front', unit: 'N', digits: 3 },
    { key: 'insideLoadRear', label: 'Left on inside rear', unit: 'N', digits: 3 },
  ],
  compute(inputs) {
    const { reserve, stiffnessFront, stiffnessRear, rollAngle, front, rear } = rollBalance(inputs)
    if (reserve <= 0) {
      throw new NoAnswerError(
        'wheelRateFront',
        say`Springs and bars this soft do not hold the car up: it falls onto its side at rest. Stiffen them, widen the track or lower the centre of gravity.`,
      )
    }
    const moved = front.moved + rear.moved
    if (moved <= 0) {
      throw new NoAnswerError(
        'rollCentreFront',
        say`With these roll centres and tracks no load moves outward, so it cannot be shared out. Check the roll centres.`,
      )
    }
    return {
      frontShare: (100 * front.moved) / moved,
      rollAngle,
      rollStiffnessFront: stiffnessFront,
      rollStiffnessRear: stiffnessRear,
      loadTransferFront: front.moved,
      loadTransferRear: rear.moved,
      insideLoadFront: front.inside,
      insideLoadRear: rear.inside,
    }
  },
  warnings(inputs, { rollAngle, insideLoadFront, insideLoadRear }) {
    const warnings: FieldMessage[] = []
    if (insideLoadFront < 0 || insideLoadRear < 0) {
      warnings.push({
        field: 'lateralAcceleration',
        message: say`A load below zero means that the wheel is in the air. From there on the car stands on three wheels or fewer, and this formula has four.`,
      })
    }
    if (Math.abs(rollAngle) > 8) {
      warnings.push({
        field: 'wheelRateFront',
        message: say`A lean of ${figure(rollAngle, 'deg', 2)} is more than suspensions allow: one end would be on its stops, and roll centres would have moved.`,
      })
    }
    if (rollBalance(inputs).lever < 0) {
      warnings.push({
        field: 'cgHeight',
        message: say`The centre of gravity lies below the roll axis, so the car leans into the corner. Check the roll centres.`,
      })
    }
    return warnings
  },
  answer: balanceAnswer,
  working: balanceWorking,
  plots: (inputs) => [insidePlot(inputs)],
  drawings: (inputs) => [rollAxisDrawing(inputs)],
  comparison(inputs, outputs) {
    const added = stifferBy(inputs)
    const other = rollBalance({ ...inputs, barRateFront: inputs.barRateFront + added })
    const share = (100 * other.front.moved) / (other.front.moved + other.rear.moved)
    // With the mass on the roll axis nothing leans, with one bar or the other.
    const lean = outputs.rollAngle === 0 ? 1 : other.rollAngle / outputs.rollAngle
    const oneWay = !goesBothWays(outputs) && !goesBothWays({ loadTransferFront: other.front.moved, loadTransferRear: other.rear.moved })
    return {
      says: [
        ...(oneWay
          ? say`${figure(added, 'N/mm')} more front bar takes the front’s share from ${figure(outputs.frontShare, '%')} to ${figure(share, '%')}, and the car leans `
          : say`With ${figure(added, 'N/mm')} more front bar the car leans `),
        ...changeInWords(lean, 'more', 'less', 'just as much'),
        '.',
      ],
      caption: 'If the front bar were stiffer',
      columns: ['Now', 'Stiffer front bar'],
      rows: [
        {
          label: say`Front bar at the wheel`,
          unit: 'N/mm',
          digits: 3,
          cells: [inputs.barRateFront, inputs.barRateFront + added],
        },
        { label: say`Front share`, unit: '%', digits: 3, cells: [outputs.frontShare, share] },
        { label: say`Lean`, unit: 'deg', digits: 3, cells: [outputs.rollAngle, other.rollAngle] },
        {
          label: say`Left on inside front`,
          unit: 'N',
          digits: 3,
          cells: [outputs.insideLoadFront, other.front.inside],
        },
        {
          label: say`Left on inside rear`,
          unit: 'N',
          digits: 3,
          cells: [outputs.insideLoadRear, other.rear.inside],
        },
      ],
    }
  },
  limits: {
    goodBetween:
      'A steady corner with all four wheels on the ground and no end on its stops. Roll centres stay where they are, tyres do not give, and the whole weight leans as one body.',
    howClose:
      'Good to show which way a change moves the balance. The shares of a real car differ by some per cent, because wheels and arms do not lean with the body and roll centres move. While the car is still turning in, the shocks decide as much.',
  },
  sources: [
    {
      text: 'T. D. Gillespie, Fundamentals of Vehicle Dynamics, chapter 6: lean with the part of the weight in it.',
      known: 'From memory; the same form was read in Barton and Fieldhouse, equation (3.18).',
    },
    {
      text: 'W. F. and D. L. Milliken, Race Car Vehicle Dynamics, chapters 16 and 18: load transfer of each axle through springs and through roll centres.',
      known: 'From memory; the inputs and formulas of its example were read in a public program.',
    },
    {
      text: 'D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering, Springer 2018, page 174: a worked example.',
      url: 'https://fliphtml5.com/osspz/szqt/Automotive_Chassis_Engineering/185',
      known: 'Read. Its printed front total, 1919 N, is a slip: its own parts add up to 1909 N.',
    },
    {
      text: 'A tyre gains less grip from more load than it loses with less; so the end that moves more load gives up grip first.',
      known: 'Common practice; how much depends on the tyre and is not computed here.',
    },
  ],
  cautions: [],
})

/** A fifth of what holds the front now, as a round number. */
function stifferBy({ wheelRateFront, barRateFront }: BalanceValues): number {
  return roundedUp((wheelRateFront + barRateFront) / 5)
}
