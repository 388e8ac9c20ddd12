export { calculator }

import { changeInWords } from '../common/change-in-words.ts'
import { shearModulusInput, youngsModulusInput } from '../common/spring-steel.ts'
import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { barCompliance, endRate, type BarValues } from './bar.ts'
import { barFromAbove, barPushed } from './drawings.ts'
import { barPlot } from './plot.ts'
import { barWorking } from './working.ts'

const thickness = {
  unit: 'mm',
  min: 0.3,
  max: 10,
  step: 0.1,
  reason: 'bars of model cars are bent from wire of that size',
} as const

const calculator = defineCalculator({
  slug: 'sway-bar',
  title: 'How stiff a sway bar is',
  purpose:
    'Works out how hard a sway bar pushes back at its ends, and what another thickness would change. Use it before you swap bars, or to see what sliding the links along the arms is worth.',
  part: 'springs and shocks',
  keywords: [
    'sway bar',
    'anti-roll bar',
    'roll bar',
    'stabiliser',
    'thicker',
    'thinner',
    'roll',
    'link',
    'wire',
  ],
  inputs: [
    {
      ...thickness,
      key: 'diameter',
      label: 'Your bar',
      default: 2.4,
      help: 'With a caliper on the straight part.',
      carKey: { front: 'frontBarDiameter', rear: 'rearBarDiameter' },
    },
    {
      ...thickness,
      key: 'comparisonDiameter',
      label: 'The other bar',
      default: 2.6,
      help: 'The thickness you are thinking of.',
    },
    {
      key: 'middleLength',
      label: 'Middle',
      unit: 'mm',
      default: 70,
      min: 5,
      max: 400,
      step: 1,
      reason: 'no bar of a model car is narrower or wider',
      help: 'Between the two bends, along the axle.',
      carKey: { front: 'frontBarMiddle', rear: 'rearBarMiddle' },
    },
    {
      key: 'armLength',
      label: 'Arm',
      unit: 'mm',
      default: 30,
      min: 2,
      max: 200,
      step: 1,
      reason: 'no arm of such a bar is shorter or longer',
      help: 'From the middle of the straight part to where the link holds the bar.',
      carKey: { front: 'frontBarArm', rear: 'rearBarArm' },
    },
    shearModulusInput,
    youngsModulusInput,
  ],
  outputs: [
    { key: 'endRate', label: 'Rate of one end', unit: 'N/mm', digits: 3 },
    { key: 'comparisonEndRate', label: 'Rate with the other bar', unit: 'N/mm', digits: 3 },
    { key: 'ratio', label: 'The other over yours', unit: '1', digits: 3 },
  ],
  compute(inputs) {
    const own = endRate(inputs)
    const other = endRate(otherBar(inputs))
    return { endRate: own, comparisonEndRate: other, ratio: other / own }
  },
  relations(inputs) {
    const length = Math.min(inputs.armLength, inputs.middleLength)
    const part = length === inputs.armLength ? 'arm' : 'middle'
    return (['diameter', 'comparisonDiameter'] as const).flatMap((field) => {
      if (inputs[field] < length) return []
      return [
        {
          field,
          message: say`${figure(inputs[field], 'mm', 6)} is no thinner than the ${part} is long, ${figure(length, 'mm', 6)}. That is a block, not a bar.`,
        },
      ]
    })
  },
  warnings({ diameter, comparisonDiameter, middleLength, armLength }) {
    const warnings: FieldMessage[] = []
    const thicker = Math.max(diameter, comparisonDiameter)
    for (const [field, length, part] of [
      ['middleLength', middleLength, 'middle'],
      ['armLength', armLength, 'arm'],
    ] as const) {
      if (length >= 5 * thicker) continue
      warnings.push({
        field,
        message: say`The ${part} is less than five times as long as the bar is thick. The bends then matter, and the real bar is softer than the formula says.`,
      })
    }
    return warnings
  },
  answer(inputs, outputs) {
    const { twist, bending } = barCompliance(inputs)
    const shorter = Math.max(1, Math.round(inputs.armLength / 10))
    return {
      says: say`Each end of your ${figure(inputs.diameter, 'mm', 4)} bar has a rate of ${mainFigure(outputs.endRate, 'N/mm')} when the wheels move opposite ways.`,
      more: [
        say`${figure((100 * twist) / (twist + bending), '%', 2)} of the give is the middle twisting, ${figure((100 * bending) / (twist + bending), '%', 2)} is the arms bending.`,
        [
          ...say`Links moved ${figure(shorter, 'mm')} in along the arms make it `,
          ...changeInWords(
            endRate({ ...inputs, armLength: inputs.armLength - shorter }) / outputs.endRate,
            'stiffer',
            'softer',
            'just as stiff',
          ),
          '.',
        ],
        say`For the rate at the wheel, multiply by the square of how far the end moves for each millimetre of wheel.`,
      ],
    }
  },
  working: barWorking,
  plots: (inputs, outputs) => [barPlot(inputs, outputs)],
  drawings: (inputs) => [barPushed(inputs), barFromAbove(inputs)],
  comparison(inputs, outputs) {
    const { diameter, comparisonDiameter } = inputs
    return {
      says: difference(comparisonDiameter - diameter, outputs.ratio),
      caption: 'If you change the bar',
      columns: ['Your bar', 'The other bar'],
      rows: [
        { label: say`Thickness`, unit: 'mm', digits: 4, cells: [diameter, comparisonDiameter] },
        {
          label: say`Rate of one end`,
          unit: 'N/mm',
          digits: 3,
          cells: [outputs.endRate, outputs.comparisonEndRate],
        },
      ],
    }
  },
  limits: {
    goodBetween:
      'Round wire, bearings close to the bends, arms square to the middle and turned by less than about 15°. A bar that is a fifth as thick as its arm is long, or thicker, is outside.',
    howClose:
      'The formula is a little high: bearings a tenth of the middle in from each bend make the real bar 1.2 to 1.5\u00A0% softer, and play in the links costs more. Between two bars of one car it is far closer than that.',
  },
  sources: [
    {
      text: 'J. M. Gere, Mechanics of Materials, and W. C. Young, Roark’s Formulas for Stress and Strain: torsion of a round shaft and a beam held at one end; their movements add up.',
      known: 'From memory.',
    },
    {
      text: 'G. Wheatley and M. Zaeimi, Anti-roll bar design for a Formula SAE vehicle suspension, Scientific Journal of Silesian University of Technology, Transport, 116 (2022) 257–270.',
      url: 'https://doi.org/10.20858/sjsutst.2022.116.17',
      known: 'Its abstract was read; it treats the middle as a torsion bar and the arms as beams too.',
    },
    {
      text: 'The same bars as a frame of beams in space, solved by finite elements.',
      known: 'Computed independently; the two agree to every digit where the bearings sit at the bends.',
    },
  ],
  cautions: [],
})

function otherBar(inputs: BarValues & { comparisonDiameter: number }): BarValues {
  return { ...inputs, diameter: inputs.comparisonDiameter }
}

function difference(change: number, ratio: number): Sentence {
  // A change far below what a caliper shows; it is there only because 2.6 − 2.4 is not exactly 0.2.
  if (Math.abs(change) < 1e-9) return say`Both bars are equally thick and equally stiff.`
  return [
    ...say`${figure(Math.abs(change), 'mm')} ${change > 0 ? 'thicker' : 'thinner'} makes this bar `,
    ...changeInWords(ratio, 'stiffer', 'softer', 'just as stiff'),
    '.',
  ]
}
