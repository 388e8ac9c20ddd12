export { calculator }

import { changeInWords } from '../common/change-in-words.ts'
import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { atTheWheel, overshoot } from './corner.ts'
import { settlingPlot, wheelRatePlot } from './plots.ts'
import { wheelRateWorking } from './working.ts'

const largestRatio = 2
/** The change shown beside the car: about one hole on a shock tower (common practice). */
const oneHole = 0.05

const calculator = defineCalculator({
  slug: 'wheel-rate',
  title: 'What your spring is worth at the wheel',
  purpose:
    'Turns the rate of a spring into the rate that the wheel feels, with ride frequency, damping and sag. Use it when you move a shock to another hole, or to compare two ends of a car.',
  part: 'springs and shocks',
  keywords: [
    'wheel rate',
    'motion ratio',
    'leverage',
    'shock position',
    'ride frequency',
    'sag',
    'damping ratio',
    'critical',
    'tower',
    'bounce',
  ],
  inputs: [
    {
      key: 'springRate',
      label: 'Spring rate',
      unit: 'N/mm',
      default: 0.85,
      min: 0.01,
      max: 50,
      step: 0.05,
      reason: 'no spring of a model car is softer or stiffer',
      help: 'From the maker’s table, or from the wire with “How stiff a spring is”.',
      carKey: { front: 'frontSpringRate', rear: 'rearSpringRate' },
    },
    {
      key: 'motionRatio',
      label: 'Motion ratio',
      unit: '1',
      default: 0.65,
      min: 0.05,
      max: largestRatio,
      step: 0.05,
      reason:
        'a shock that hardly moves, or moves more than twice as far as its wheel, is no longer a suspension',
      help: 'Lift the wheel 10\u00A0mm and measure how much the shock shortens; divide the second by the first.',
      carKey: { front: 'frontMotionRatio', rear: 'rearMotionRatio' },
    },
    {
      key: 'sprungMass',
      label: 'Sprung weight of one wheel',
      unit: 'kg',
      default: 0.8,
      min: 0.05,
      max: 5,
      step: 0.05,
      reason: 'a wheel of a model car carries no less and no more',
      help: 'Weight on that axle, less its wheels, hubs and half its arms, divided by two.',
      carKey: { front: 'frontSprungMass', rear: 'rearSprungMass' },
    },
    {
      key: 'damping',
      label: 'Damping at the shock',
      unit: 'N·s/m',
      default: 40,
      min: 0,
      max: 5000,
      step: 5,
      reason: 'less than none there is not, and more would hold the shock like a clamp',
      help: 'For your piston and oil: “What another shock piston does”.',
    },
  ],
  outputs: [
    { key: 'wheelRate', label: 'Rate at the wheel', unit: 'N/mm', digits: 3 },
    { key: 'rideFrequency', label: 'Ride frequency', unit: 'Hz', digits: 3 },
    { key: 'criticalDamping', label: 'Critical damping at the wheel', unit: 'N·s/m', digits: 3 },
    { key: 'dampingRatio', label: 'Share of critical damping', unit: '1', digits: 2 },
    { key: 'staticDeflection', label: 'Sag at the wheel', unit: 'mm', digits: 3 },
  ],
  compute: (inputs) => atTheWheel(inputs),
  warnings({ motionRatio }, { dampingRatio, staticDeflection }) {
    const warnings: FieldMessage[] = []
    if (motionRatio > 1) {
      warnings.push({
        field: 'motionRatio',
        message: say`Above 1 the shock moves further than the wheel. Is it turned over? Here it is shock travel over wheel travel.`,
      })
    }
    if (staticDeflection > 60) {
      warnings.push({
        field: 'springRate',
        message: say`Under its weight this wheel would give ${figure(staticDeflection, 'mm')}: more than suspensions of model cars travel. Check spring, motion ratio and weight.`,
      })
    }
    if (dampingRatio >= 1) {
      warnings.push({
        field: 'damping',
        message: say`At or above critical damping the wheel creeps back. Over a row of bumps it has not come down before the next one and packs up.`,
      })
    }
    return warnings
  },
  answer({ springRate }, outputs) {
    return {
      says: say`At the wheel your ${figure(springRate, 'N/mm', 4)} spring is worth ${mainFigure(outputs.wheelRate, 'N/mm')}.`,
      more: [
        say`Without a damper that corner would bounce at ${figure(outputs.rideFrequency, 'Hz')}, and under the car’s weight it gives ${figure(outputs.staticDeflection, 'mm')}.`,
        settles(outputs.dampingRatio),
      ],
    }
  },
  working: wheelRateWorking,
  plots: (inputs, outputs) => [wheelRatePlot(inputs, outputs), settlingPlot(outputs)],
  comparison(inputs, outputs) {
    const change = inputs.motionRatio + oneHole <= largestRatio ? oneHole : -oneHole
    const moved = { ...inputs, motionRatio: inputs.motionRatio + change }
    const other = atTheWheel(moved)
    return {
      says: [
        ...say`${figure(oneHole, '1')} ${change > 0 ? 'more' : 'less'} motion ratio makes the wheel `,
        ...changeInWords(other.wheelRate / outputs.wheelRate, 'stiffer', 'softer', 'just as stiff'),
        ' on the same spring.',
      ],
      caption: change > 0 ? 'If the shock moves out on the arm' : 'If the shock moves in on the arm',
      columns: ['Now', change > 0 ? 'Moved out' : 'Moved in'],
      rows: [
        { label: say`Motion ratio`, unit: '1', digits: 3, cells: [inputs.motionRatio, moved.motionRatio] },
        {
          label: say`Rate at the wheel`,
          unit: 'N/mm',
          digits: 3,
          cells: [outputs.wheelRate, other.wheelRate],
        },
        {
          label: say`Ride frequency`,
          unit: 'Hz',
          digits: 3,
          cells: [outputs.rideFrequency, other.rideFrequency],
        },
        {
          label: say`Share of critical damping`,
          unit: '1',
          digits: 2,
          cells: [outputs.dampingRatio, other.dampingRatio],
        },
        {
          label: say`Sag at the wheel`,
          unit: 'mm',
          digits: 3,
          cells: [outputs.staticDeflection, other.staticDeflection],
        },
      ],
    }
  },
  limits: {
    goodBetween:
      'Ride height and a little around it: the motion ratio changes over the travel as the shock leans. The tyre, friction, and the sway bar are left out.',
    howClose:
      'The motion ratio counts twice: 2\u00A0% off in it is 4\u00A0% off in the wheel rate. Sag is that of a spring that is free in its seats; preload takes its own part off.',
  },
  sources: [
    {
      text: 'D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering, Springer 2018, equations (3.29) to (3.33): wheel rate as spring rate times the square of the lever.',
      url: 'https://fliphtml5.com/osspz/szqt/Automotive_Chassis_Engineering/',
      known: 'Read.',
    },
    {
      text: 'J. L. Meriam and L. G. Kraige, Engineering Mechanics: Dynamics, chapter 8: frequency, critical damping and damping ratio of one mass on a spring.',
      known: 'Read in a public transcription of its worked examples; the book was not seen.',
    },
    {
      text: 'Motion ratio is published both ways up. Here it is shock travel over wheel travel.',
      known: 'Both ways were read in manuals of general vehicle programs; no standard was found.',
    },
  ],
  cautions: [],
})

function settles(dampingRatio: number): Sentence {
  const share = figure(dampingRatio * 100, '%', 2)
  if (dampingRatio === 0) return say`With no damping it would never stop bouncing.`
  if (dampingRatio >= 1)
    return say`The shock gives ${share} of critical damping: after a bump the wheel creeps back without a swing.`
  return say`The shock gives ${share} of critical damping: after a bump the wheel swings past rest by ${figure(100 * overshoot(dampingRatio), '%', 2)} of it.`
}
