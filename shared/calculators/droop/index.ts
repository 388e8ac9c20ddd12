export { calculator }

import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say } from '../sentence.ts'
import { droopDrawing } from './drawing.ts'
import { armSwing, wheelDrop } from './droop.ts'
import { droopWorking } from './working.ts'

type Inputs = Record<'armLength' | 'screwRadius' | 'screwPitch' | 'turns', number>

/** How far racers usually go in one change, in turns (common practice). */
const usualStep = 0.5
const tableTurns = [0.25, 0.5, 1, 2]

const calculator = defineCalculator({
  slug: 'droop',
  title: 'What a turn of the droop screw does',
  purpose:
    'Says how far the wheel moves down or up when you turn the droop screw in its arm. Use it to change droop by millimetres at the wheel without measuring twice.',
  part: 'ride height and movement',
  keywords: [
    'droop screw',
    'turns',
    'downtravel',
    'down travel',
    'rebound',
    'uptravel',
    'arm',
    'thread',
    'pitch',
  ],
  inputs: [
    {
      key: 'armLength',
      label: 'Arm, inner pin to outer pin',
      unit: 'mm',
      default: 100,
      min: 10,
      max: 300,
      step: 1,
      reason: 'that is the range of arms from the smallest cars to the largest',
      help: 'Between the middles of the two pins, straight across the car.',
      carKey: { front: 'frontArmLength', rear: 'rearArmLength' },
    },
    {
      key: 'screwRadius',
      label: 'Inner pin to droop screw',
      unit: 'mm',
      default: 20,
      min: 2,
      max: 150,
      step: 0.5,
      reason: 'closer to the pin the screw would foul it, and further out it would miss the chassis',
      help: 'From the middle of the inner pin to where the tip of the screw touches.',
      carKey: { front: 'frontDroopScrewRadius', rear: 'rearDroopScrewRadius' },
    },
    {
      key: 'screwPitch',
      label: 'Pitch of the screw',
      unit: 'mm',
      default: 0.7,
      min: 0.1,
      max: 3,
      ladder: [0.35, 0.4, 0.45, 0.5, 0.7, 0.8, 1],
      reason: 'no screw of a model car is finer or coarser',
      help: 'How far it goes in one turn: 0.5\u00A0mm for an M3 screw, 0.7\u00A0mm for M4, 0.8\u00A0mm for M5.',
      carKey: { front: 'frontDroopScrewPitch', rear: 'rearDroopScrewPitch' },
    },
    {
      key: 'turns',
      label: 'Turns out',
      unit: '1',
      default: 1,
      min: -20,
      max: 20,
      step: 0.25,
      reason: 'no droop screw has more thread than that',
      help: 'Out gives more droop. Turning in counts minus and takes droop away.',
    },
  ],
  outputs: [
    { key: 'screwTravel', label: 'Screw goes', unit: 'mm', digits: 3 },
    { key: 'armAngle', label: 'Arm swings', unit: 'deg', digits: 3 },
    { key: 'wheelTravel', label: 'Droop changes at the wheel by', unit: 'mm', digits: 3 },
  ],
  compute(inputs) {
    const screwTravel = inputs.screwPitch * inputs.turns
    const armAngle = armSwing(screwTravel, inputs.screwRadius)
    return { screwTravel, armAngle, wheelTravel: wheelDrop(inputs.armLength, armAngle) }
  },
  warnings({ armLength, screwRadius }, { armAngle }) {
    const warnings: FieldMessage[] = []
    if (screwRadius >= armLength) {
      warnings.push({
        field: 'screwRadius',
        message: say`The screw would sit beyond the outer pin. Measure it from the inner pin again.`,
      })
    }
    if (Math.abs(armAngle) > 20) {
      warnings.push({
        field: 'turns',
        message: say`The arm swings by ${figure(Math.abs(armAngle), 'deg')}. An arm that already hangs moves its wheel less than this says, and the shock or a joint may stop it first.`,
      })
    }
    return warnings
  },
  answer(inputs, { wheelTravel, screwTravel }) {
    const { turns } = inputs
    if (turns === 0) {
      return {
        says: say`Without turning the screw droop stays as it is: ${mainFigure(0, 'mm')}.`,
        more: [leverage(inputs)],
      }
    }
    const way = turns > 0 ? 'out' : 'in'
    return {
      says: say`Turning the screw ${turnsInWords(Math.abs(turns))} ${way} ${turns > 0 ? 'adds' : 'takes away'} ${mainFigure(Math.abs(wheelTravel), 'mm')} of droop at the wheel.`,
      more: [
        say`The screw itself goes ${figure(Math.abs(screwTravel), 'mm')}.`,
        leverage(inputs),
        say`Turn both sides alike, then check with the tyres on a flat board.`,
      ],
    }
  },
  working: droopWorking,
  drawings: (inputs, outputs) => [droopDrawing(inputs, outputs)],
  comparison(inputs, outputs) {
    const further = dropAfter(inputs, inputs.turns + usualStep)
    return {
      says: say`Another half turn out adds ${figure(further - outputs.wheelTravel, 'mm')} of droop.`,
      caption: 'If you go half a turn further out',
      columns: ['As entered', 'Half a turn more'],
      rows: [
        { label: say`Turns out`, unit: '1', digits: 4, cells: [inputs.turns, inputs.turns + usualStep] },
        {
          label: say`Screw goes`,
          unit: 'mm',
          digits: 3,
          cells: [outputs.screwTravel, outputs.screwTravel + usualStep * inputs.screwPitch],
        },
        { label: say`At the wheel`, unit: 'mm', digits: 3, cells: [outputs.wheelTravel, further] },
      ],
    }
  },
  tables: (inputs) => [
    {
      caption: 'By turns out, from level',
      columns: ['¼', '½', '1', '2'],
      rows: [
        {
          label: say`At the wheel`,
          unit: 'mm',
          digits: 3,
          cells: tableTurns.map((turns) => dropAfter(inputs, turns)),
        },
      ],
    },
  ],
  limits: {
    goodBetween:
      'An arm near level, a screw at right angles to it, a chassis plate not far below the inner pin, a wheel that hangs at the outer pin.',
    howClose:
      'An arm that hangs 10° below level moves its wheel about 2\u00A0% less than this for a turn out, at 20° about 7\u00A0%. A screw tip 10\u00A0mm below the pin makes less than 0.2\u00A0mm of difference at the screw up to 10°. Play in the pins adds more; measure at the tyre.',
  },
  sources: [
    {
      text: 'A lever with a screw for a stop: plane trigonometry.',
      known:
        'Common practice; checked against a numerical solution of the same screw, arm and plate with mathjs.',
    },
    {
      text: 'ISO 261, ISO general purpose metric screw threads: coarse pitch 0.5\u00A0mm for M3, 0.7\u00A0mm for M4, 0.8\u00A0mm for M5.',
      known: 'From memory; the standard was not seen. Measure your own screw.',
    },
    { text: 'Half a turn as the usual change; out means more droop.', known: 'Common practice.' },
  ],
  cautions: [],
})

function dropAfter({ armLength, screwRadius, screwPitch }: Inputs, turns: number): number {
  return wheelDrop(armLength, armSwing(screwPitch * turns, screwRadius))
}

function leverage({ armLength, screwRadius }: Inputs) {
  return say`Near level the wheel moves ${figure(armLength / screwRadius, '1')} times as far as the screw.`
}

function turnsInWords(turns: number) {
  return turns === 0.5 ? 'half a turn' : turns === 1 ? 'one turn' : `${Number(turns.toPrecision(4))} turns`
}
