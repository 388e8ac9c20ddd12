export { calculator }

import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { packCautions } from './cautions.ts'
import { minutesAt, packFigures } from './pack.ts'
import { currentPlot } from './plot.ts'
import { packWorking } from './working.ts'

const calculator = defineCalculator({
  slug: 'run-time',
  title: 'How long a battery lasts, and how to charge it',
  purpose:
    'Says how many minutes a pack runs at your average current, what is in it, and what to set on the charger. Use it to choose a pack for a longer main, or before you charge a pack you do not know.',
  part: 'motor and gearing',
  keywords: [
    'run time',
    'battery',
    'lipo',
    'lithium',
    'capacity',
    'mAh',
    'C rate',
    'charge current',
    'minutes',
    'how long',
    'charger',
    'watt-hours',
  ],
  inputs: [
    {
      key: 'capacity',
      label: 'Battery capacity',
      unit: 'mAh',
      default: 5000,
      min: 100,
      max: 30_000,
      step: 100,
      reason: 'packs for R/C cars are not smaller or larger than that',
      help: 'On the battery’s label.',
      carKey: 'capacity',
    },
    {
      key: 'usableShare',
      label: 'How much of it you drive',
      unit: '%',
      default: 80,
      min: 1,
      max: 100,
      step: 5,
      reason: 'a pack gives something, and not more than it holds',
      help: 'Leave a fifth in it (common practice).',
    },
    {
      key: 'averageCurrent',
      label: 'Average current',
      unit: 'A',
      default: 30,
      min: 0.1,
      max: 300,
      step: 1,
      reason: 'without current there is no run time to give, and no R/C car draws more on average',
      help: 'mAh that the charger put back, times 0.06, divided by the minutes driven.',
      carKey: 'averageCurrent',
    },
    {
      key: 'cells',
      label: 'Cells in a row',
      unit: '1',
      default: 4,
      min: 1,
      max: 14,
      whole: true,
      step: 1,
      reason: 'that is how packs are built',
      help: 'The number before the S on the label.',
      carKey: 'cells',
    },
    {
      key: 'chargeRate',
      label: 'Charge rate',
      unit: 'C',
      default: 1,
      min: 0.1,
      max: 10,
      step: 0.1,
      reason: 'slower takes most of a day, and no maker’s leaflet allows faster',
      help: '1 unless the pack’s leaflet allows more. The C number on the label is for driving, not for charging.',
    },
  ],
  outputs: [
    { key: 'runTime', label: 'Run time', unit: 'min', digits: 3 },
    { key: 'energy', label: 'Energy in the whole pack', unit: 'Wh', digits: 3 },
    { key: 'power', label: 'Power on average', unit: 'W', digits: 3 },
    { key: 'dischargeRate', label: 'How hard it is used', unit: 'C', digits: 3 },
    { key: 'chargeCurrent', label: 'Charge current to set', unit: 'A', digits: 3 },
    { key: 'chargeTime', label: 'Charge time from empty, constant current part', unit: 'min', digits: 3 },
  ],
  compute: packFigures,
  warnings({ usableShare, chargeRate }, { dischargeRate, chargeCurrent }) {
    const warnings: FieldMessage[] = []
    if (usableShare > 80) {
      warnings.push({
        field: 'usableShare',
        message: say`Driving more than ${figure(80, '%')} of a pack takes its cells near the voltage that harms them. Keep a fifth in it and let the cut-off stop you.`,
      })
    }
    if (chargeRate > 1) {
      warnings.push({
        field: 'chargeRate',
        message: say`Only if the leaflets of pack and charger both allow ${figure(chargeCurrent, 'A')}. Otherwise charge at ${figure(1, 'C')}.`,
      })
    }
    if (dischargeRate > 30) {
      warnings.push({
        field: 'averageCurrent',
        message: say`${figure(dischargeRate, 'C')} on average empties a pack in about ${figure(60 / dischargeRate, 'min', 2)} and heats it. Check the current; a peak is not an average.`,
      })
    }
    return warnings
  },
  answer(inputs, outputs) {
    const { runTime, energy, power, dischargeRate, chargeCurrent } = outputs
    return {
      says: say`It runs about ${mainFigure(runTime, 'min', runTime < 10 ? 2 : 3)} at ${figure(inputs.averageCurrent, 'A')} on average.`,
      more: [
        say`The pack holds ${figure(energy, 'Wh')} and gives ${figure(power, 'W')} on average, at ${figure(dischargeRate, 'C', 2)}.`,
        say`Charge it with at most ${figure(chargeCurrent, 'A')}, if its leaflet allows that.`,
        chargeSentence(inputs, outputs),
      ],
    }
  },
  working: packWorking,
  plots: (inputs, outputs) => [currentPlot(inputs, outputs)],
  comparison(inputs, { runTime, dischargeRate }) {
    const current = inputs.averageCurrent * 0.9
    const longer = minutesAt(inputs.capacity, inputs.usableShare, current)
    return {
      says: say`A tenth less current, from gearing or a calmer thumb, runs ${figure(longer - runTime, 'min', 2)} longer.`,
      caption: 'If it draws a tenth less',
      columns: ['Now', 'A tenth less'],
      rows: [
        { label: say`Average current`, unit: 'A', digits: 3, cells: [inputs.averageCurrent, current] },
        { label: say`Run time`, unit: 'min', digits: 3, cells: [runTime, longer] },
        {
          label: say`How hard it is used`,
          unit: 'C',
          digits: 3,
          cells: [dischargeRate, dischargeRate * 0.9],
        },
      ],
    }
  },
  limits: {
    goodBetween:
      'Lithium cells of 3.7\u00A0V nominal, warm, in good health, and an average current that was measured. Cold packs, old packs and other chemistries give less.',
    howClose:
      'As close as the average current, which is the part nobody knows: measure it over a whole run. A C number on a label is the maker’s claim; no standard test stands behind it.',
  },
  sources: [
    {
      text: 'IEC 61434 and IEC 61960: the reference current that gives the rated capacity in one hour, from which the C rate comes.',
      known: 'From memory; not looked up.',
    },
    {
      text: '49 CFR § 171.8, United States transport rules: watt-hours are rated ampere-hours times nominal volts.',
      url: 'https://www.law.cornell.edu/cfr/text/49/171.8',
      known: 'The definition was read as quoted on that site.',
    },
    {
      text: '3.7\u00A0V nominal for lithium cobalt and lithium nickel-manganese-cobalt cells.',
      known: 'From memory; packs with other cells differ.',
    },
    {
      text: 'Leaving a fifth in the pack, charging at 1C, storing at about 3.8\u00A0V a cell.',
      known: 'Common practice; no standard’s clause was found.',
    },
  ],
  cautions: packCautions,
})

function chargeSentence(
  { usableShare, chargeRate }: { usableShare: number; chargeRate: number },
  { chargeTime }: { chargeTime: number },
): Sentence {
  return say`After this run that puts back ${figure(usableShare, '%')} in about ${figure((chargeTime * usableShare) / 100, 'min')} at ${figure(chargeRate, 'C')}, and then comes the slow end, which this sum leaves out. Stay with it all the while.`
}
