export { calculator }

import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { toeDrawing } from './drawing.ts'
import { angleOfToe, toeDistance } from './toe.ts'
import { toeWorking } from './working.ts'

/** How far racers usually go in one change, in degrees of one wheel (common practice). */
const usualStep = 0.5

const calculator = defineCalculator({
  slug: 'toe',
  title: 'Toe in degrees and in millimetres',
  purpose:
    'Says how many millimetres an angle of toe is at the edges of the rim, for one wheel and for both. Use it when your gauge reads one and your set-up sheet wants the other.',
  part: 'wheel angles',
  keywords: ['toe-in', 'toe-out', 'degrees', 'millimetres', 'gauge', 'rim', 'pointing in', 'alignment'],
  inputs: [
    {
      key: 'toeAngle',
      label: 'Toe of one wheel',
      unit: 'deg',
      default: 2,
      min: -20,
      max: 20,
      step: 0.5,
      reason: 'a wheel turned further than that is steering, not toe',
      help: 'Toe-in counts plus, toe-out minus. If your figure is for both wheels together, enter half of it.',
      carKey: { front: 'frontToe', rear: 'rearToe' },
    },
    {
      key: 'rimDiameter',
      label: 'Rim diameter',
      unit: 'mm',
      default: 83,
      min: 10,
      max: 1000,
      step: 1,
      reason: 'that is the range of what one holds a toe gauge to, from a small rim to a full-size one',
      help: 'Across the outer edge of the rim, where you hold the gauge; not the tyre.',
      carKey: 'rimDiameter',
    },
  ],
  outputs: [
    { key: 'toeDistance', label: 'One wheel, front edge to back edge', unit: 'mm', digits: 3 },
    { key: 'totalToe', label: 'Both wheels together', unit: 'mm', digits: 3 },
  ],
  compute({ toeAngle, rimDiameter }) {
    const distance = toeDistance(toeAngle, rimDiameter)
    return { toeDistance: distance, totalToe: 2 * distance }
  },
  warnings({ toeAngle }) {
    const warnings: FieldMessage[] = []
    if (Math.abs(toeAngle) > 6) {
      warnings.push({
        field: 'toeAngle',
        message: say`More than ${figure(6, 'deg')} at one wheel is rare. Check that the figure is not for both wheels, and is not in millimetres.`,
      })
    }
    return warnings
  },
  answer({ toeAngle, rimDiameter }, outputs) {
    const more = [
      say`Between the two rims that is ${figure(Math.abs(outputs.totalToe), 'mm')} less in front than behind, when the other wheel has the same.`,
      say`On this rim ${figure(1, 'mm')} from edge to edge is ${figure(angleOfToe(1, rimDiameter), 'deg')} of one wheel.`,
    ]
    if (toeAngle === 0) {
      return {
        says: say`With no toe both edges of the rim stand equally far from the centre line: ${mainFigure(0, 'mm')}.`,
        more: more.slice(1),
      }
    }
    const [name, nearer] = toeAngle > 0 ? ['toe-in', 'nearer to'] : ['toe-out', 'further from']
    return {
      says: say`At ${figure(Math.abs(toeAngle), 'deg')} of ${name}, the front edge of the rim stands ${mainFigure(Math.abs(outputs.toeDistance), 'mm')} ${nearer} the centre line than its back edge.`,
      more:
        toeAngle > 0
          ? more
          : [
              say`Between the two rims that is ${figure(Math.abs(outputs.totalToe), 'mm')} more in front than behind, when the other wheel has the same.`,
              ...more.slice(1),
            ],
    }
  },
  working: toeWorking,
  drawings: (inputs, outputs) => [toeDrawing(inputs, outputs)],
  comparison({ toeAngle, rimDiameter }, outputs) {
    const further = toeDistance(toeAngle + usualStep, rimDiameter)
    return {
      says: furtherIn(further - outputs.toeDistance),
      caption: 'If you take half a degree more toe-in',
      columns: ['Now', 'Half a degree more'],
      rows: [
        { label: say`Toe of one wheel`, unit: 'deg', digits: 4, cells: [toeAngle, toeAngle + usualStep] },
        { label: say`One wheel`, unit: 'mm', digits: 3, cells: [outputs.toeDistance, further] },
        { label: say`Both wheels`, unit: 'mm', digits: 3, cells: [outputs.totalToe, 2 * further] },
      ],
    }
  },
  limits: {
    goodBetween:
      'Any toe one can set. The diameter must be the one the gauge touches, measured right across; toe read at the tyre needs the tyre’s diameter.',
    howClose:
      'Exact for a true rim. A rim that wobbles by 0.3\u00A0mm upsets the reading by as much; turn the wheel half round, read again and take the middle.',
  },
  sources: [
    {
      text: 'ISO 8855:2011, 7.1.6 and 7.1.7: static toe angle of one wheel, toe-in positive; total static toe is the sum of both.',
      known: 'Read in excerpts; the millimetres follow by plane trigonometry.',
    },
    {
      text: 'J. Reimpell, H. Stoll, J. W. Betzler, The Automotive Chassis: toe-in as a length is the difference of the distances between the rim flanges.',
      known: 'From memory; the book was not seen.',
    },
    { text: 'Half a degree at a time, and usual toe below 6°.', known: 'Common practice.' },
  ],
  cautions: [],
})

function furtherIn(difference: number): Sentence {
  return say`Half a degree more toe-in brings the front edge ${figure(difference, 'mm', 2)} further in, at each wheel.`
}
