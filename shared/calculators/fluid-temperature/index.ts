export { calculator }

import { defineCalculator, type CalculatorInput, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import {
  bottlesAround,
  fluidCautions,
  siliconeBottles,
  thickestFluid,
  thinnestFluid,
} from '../common/silicone-fluids.ts'
import { temperaturePlot } from './plot.ts'
import { viscosityAt } from './viscosity.ts'
import { temperatureWorking } from './working.ts'

const degrees = <const Key extends string>(
  key: Key,
  label: string,
  standard: number,
  help: string,
): CalculatorInput<Key> => ({
  key,
  label,
  help,
  unit: '°C',
  default: standard,
  min: -25,
  max: 100,
  step: 5,
  reason: 'the formula was not made for anything colder or hotter',
})

const calculator = defineCalculator({
  slug: 'fluid-temperature',
  title: 'What your fluid acts like when it is hot',
  purpose:
    'Says how thin a silicone fluid gets as it warms, and which bottle would feel the same hot. Use it when the car changes during a heat, or when the weather turns.',
  part: 'driveline',
  keywords: ['hot', 'cold', 'temperature', 'fade', 'diff fluid', 'shock oil', 'viscosity', 'cSt', 'weather'],
  inputs: [
    {
      key: 'viscosityAt25',
      label: 'Fluid on the bottle',
      unit: 'cSt',
      default: 7000,
      min: thinnestFluid,
      max: thickestFluid,
      ladder: siliconeBottles,
      reason: 'there is no silicone fluid thinner or thicker than that to pour',
      help: 'The number on the bottle, in cSt at 25\u00A0°C. Plus and minus step through bottles you can buy.',
      carKey: { front: 'frontDiffFluid', centre: 'centreDiffFluid', rear: 'rearDiffFluid' },
    },
    degrees(
      'referenceTemperature',
      'Temperature it felt right at',
      25,
      'Bench or morning temperature of the diff or shock.',
    ),
    degrees(
      'temperature',
      'Temperature now',
      40,
      'Point the thermometer at a square of tape on the case. Bare metal reads too cool.',
    ),
  ],
  outputs: [
    { key: 'viscosity', label: 'Acts like, now', unit: 'cSt', digits: 3 },
    { key: 'viscosityAtReference', label: 'Acted like, when it felt right', unit: 'cSt', digits: 3 },
    { key: 'ratio', label: 'Now over then', unit: '1', digits: 3 },
    { key: 'fluidToMatch', label: 'Bottle that feels the same now', unit: 'cSt', digits: 3 },
  ],
  compute({ viscosityAt25, referenceTemperature, temperature }) {
    const viscosity = viscosityAt(viscosityAt25, temperature)
    const viscosityAtReference = viscosityAt(viscosityAt25, referenceTemperature)
    const ratio = viscosity / viscosityAtReference
    return { viscosity, viscosityAtReference, ratio, fluidToMatch: viscosityAt25 / ratio }
  },
  warnings({ viscosityAt25, referenceTemperature, temperature }) {
    const warnings: FieldMessage[] = []
    if (viscosityAt25 < 50 || viscosityAt25 > 100_000) {
      warnings.push({
        field: 'viscosityAt25',
        message: say`The formula holds best from ${figure(50, 'cSt')} to ${figure(100_000, 'cSt')}. Thinner fluids change less with temperature than it says.`,
      })
    }
    for (const [field, value] of [
      ['referenceTemperature', referenceTemperature],
      ['temperature', temperature],
    ] as const) {
      if (value >= 0 && value <= 60) continue
      warnings.push({
        field,
        message: say`${figure(value, '°C')} lies outside ${figure(0, '°C')} to ${figure(60, '°C')}, where the formula was compared with others. Take the answer as a guide.`,
      })
    }
    return warnings
  },
  answer({ viscosityAt25, referenceTemperature, temperature }, { viscosity, ratio, fluidToMatch }) {
    return {
      says: say`Your ${figure(viscosityAt25, 'cSt', 9)} fluid acts like about ${mainFigure(viscosity, 'cSt')} at ${figure(temperature, '°C')}.`,
      more: [change(ratio, referenceTemperature), matching(fluidToMatch, referenceTemperature, temperature)],
    }
  },
  working: temperatureWorking,
  plots: (inputs, outputs) => [temperaturePlot(inputs, outputs)],
  comparison({ viscosityAt25, referenceTemperature, temperature }, { fluidToMatch, ratio }) {
    const row = (label: Sentence, at: number) => ({
      label,
      unit: 'cSt' as const,
      digits: 3,
      cells: [viscosityAt(viscosityAt25, at), viscosityAt(fluidToMatch, at)],
    })
    return {
      says: differenceOnBottle(ratio),
      caption: 'If you change the fluid',
      columns: ['Your fluid', 'Fluid to match'],
      rows: [
        row(say`On the bottle, at ${figure(25, '°C')}`, 25),
        row(say`When it felt right, at ${figure(referenceTemperature, '°C')}`, referenceTemperature),
        row(say`Now, at ${figure(temperature, '°C')}`, temperature),
      ],
    }
  },
  limits: {
    goodBetween:
      '0 and 60\u00A0°C and bottles from 50 to 100,000\u00A0cSt; it accepts −25 to 100\u00A0°C. Plain dimethyl silicone fluid only, not petroleum oil and not fluid with additives.',
    howClose:
      'Two published forms of the law agree within about 0.5\u00A0%. Bottles of different makes can differ from their label by more than that.',
  },
  sources: [
    {
      text: 'Shin-Etsu Silicone, technical data brochure “Silicone Fluid KF-96”: log ν = 763.1/(273 + T) − 2.559 + log ν₂₅, here normalised to give ν₂₅ at 25\u00A0°C.',
      known: 'From memory; the brochure itself was not seen.',
    },
    {
      text: 'MaranStable, public research code on flow in silicone fluids: ν = ν₂₅ exp(5.892 (25 − T)/(273.15 + T)), the same law in another form.',
      url: 'https://github.com/fromano88/MaranStable',
      known: 'Read in fluid_properties_GUI_V3d2.m.',
    },
  ],
  cautions: fluidCautions,
})

/** What changing to the matching fluid means on the bottle: its number is `1 / ratio` times as large. */
function differenceOnBottle(ratio: number): Sentence {
  const share = Math.abs(1 / ratio - 1) * 100
  if (share < 0.05) return say`Your fluid already feels as it did.`
  return say`A fluid ${figure(share, '%', share < 1 ? 1 : 2)} ${ratio < 1 ? 'thicker' : 'thinner'} on the bottle feels now as yours did then.`
}

function change(ratio: number, referenceTemperature: number): Sentence {
  const share = Math.abs(1 - ratio) * 100
  const at = figure(referenceTemperature, '°C')
  if (share < 0.05) return say`That is as thick as at ${at}.`
  return say`That is ${figure(share, '%', share < 1 ? 1 : 2)} ${ratio < 1 ? 'thinner' : 'thicker'} than at ${at}.`
}

function matching(fluidToMatch: number, referenceTemperature: number, temperature: number): Sentence {
  const begin = say`To feel at ${figure(temperature, '°C')} as it did at ${figure(referenceTemperature, '°C')}, fill with about ${figure(fluidToMatch, 'cSt')}`
  const exact = siliconeBottles.find((bottle) => Math.abs(bottle / fluidToMatch - 1) < 0.005)
  if (exact !== undefined) return [...begin, ...say`; that is a bottle you can buy.`]
  const { below, above } = bottlesAround(fluidToMatch)
  if (below === undefined || above === undefined) return [...begin, '.']
  return [...begin, ...say`, between the ${figure(below, 'cSt', 9)} and ${figure(above, 'cSt', 9)} bottles.`]
}
