export { calculator }

import { defineCalculator, type CalculatorInput } from '../definition.ts'
import { figure, mainFigure, say } from '../sentence.ts'
import { fluidCautions, siliconeBottles, thickestFluid, thinnestFluid } from '../common/silicone-fluids.ts'
import { shareLogLinear, shareRefutas } from './blend.ts'
import { blendPlot } from './plot.ts'
import { blendWorking } from './working.ts'

const fluid = <const Key extends string>(
  key: Key,
  label: string,
  standard: number,
  help: string,
): CalculatorInput<Key> => ({
  key,
  label,
  help,
  unit: 'cSt',
  default: standard,
  min: thinnestFluid,
  max: thickestFluid,
  ladder: siliconeBottles,
  reason:
    'thinner than that the blending numbers stop making sense, and thicker silicone is a gum, not a fluid',
})

const calculator = defineCalculator({
  slug: 'fluid-blend',
  title: 'Mix two fluids to get one between',
  purpose:
    'Says how much of two silicone fluids to mix for a thickness that no bottle has. Use it when the next bottle is too far a step.',
  part: 'driveline',
  keywords: ['mix', 'blend', 'diff fluid', 'shock oil', 'viscosity', 'cSt', 'bottle', 'between'],
  inputs: [
    fluid('lowViscosity', 'Thinner fluid', 5000, 'The number on the bottle, in cSt at 25\u00A0°C.'),
    fluid('highViscosity', 'Thicker fluid', 10000, 'The same kind of silicone fluid, in cSt at 25\u00A0°C.'),
    fluid('targetViscosity', 'Thickness you want', 7000, 'Between the two fluids.'),
    {
      key: 'totalVolume',
      label: 'How much you need',
      unit: 'mL',
      default: 10,
      min: 0.1,
      max: 1000,
      step: 1,
      reason: 'less cannot be measured at a pit table, and more is not one batch',
      help: 'A diff takes a few millilitres; leave some for wetting the syringe.',
    },
  ],
  outputs: [
    { key: 'highFraction', label: 'Share of the thicker fluid', unit: '1', digits: 3 },
    { key: 'highVolume', label: 'Thicker fluid', unit: 'mL', digits: 3 },
    { key: 'lowVolume', label: 'Thinner fluid', unit: 'mL', digits: 3 },
    { key: 'highFractionVbn', label: 'Share by the second rule', unit: '1', digits: 3 },
  ],
  compute({ lowViscosity, highViscosity, targetViscosity, totalVolume }) {
    // Two bottles of the same fluid: the relations below leave only the same fluid as target, and any share
    // gives it. Half is the one answer that stays the same when the two bottles change places.
    const same = lowViscosity === highViscosity
    const highFraction = same ? 0.5 : shareLogLinear(lowViscosity, highViscosity, targetViscosity)
    return {
      highFraction,
      highVolume: highFraction * totalVolume,
      lowVolume: (1 - highFraction) * totalVolume,
      highFractionVbn: same ? 0.5 : shareRefutas(lowViscosity, highViscosity, targetViscosity),
    }
  },
  relations({ lowViscosity, highViscosity, targetViscosity }) {
    const thin = Math.min(lowViscosity, highViscosity)
    const thick = Math.max(lowViscosity, highViscosity)
    if (targetViscosity >= thin && targetViscosity <= thick) return []
    const wanted = figure(targetViscosity, 'cSt', 9)
    return [
      {
        field: 'targetViscosity',
        message:
          thin === thick
            ? say`${wanted} cannot be reached: both fluids are ${figure(thin, 'cSt', 9)}, and so is every mix of them.`
            : say`${wanted} cannot be reached: a mix always lies between its two fluids, here ${figure(thin, 'cSt', 9)} and ${figure(thick, 'cSt', 9)}.`,
      },
    ]
  },
  warnings({ lowViscosity, highViscosity }) {
    if (lowViscosity === highViscosity) {
      return [
        {
          field: 'highViscosity',
          message: say`Both fluids are the same, so any share gives the same thickness.`,
        },
      ]
    }
    const warnings = []
    if (lowViscosity > highViscosity) {
      warnings.push({
        field: 'lowViscosity',
        message: say`The first fluid is the thicker one. The answer still holds; “thicker” below means the second fluid.`,
      })
    }
    if (Math.max(lowViscosity / highViscosity, highViscosity / lowViscosity) > 10) {
      warnings.push({
        field: 'highViscosity',
        message: say`One fluid is more than ten times as thick as the other. The two rules drift apart there; choose bottles closer together if you can.`,
      })
    }
    return warnings
  },
  answer(
    { lowViscosity, highViscosity, targetViscosity, totalVolume },
    { highVolume, lowVolume, highFraction, highFractionVbn },
  ) {
    const other = highFractionVbn * totalVolume
    return {
      says: say`For ${figure(targetViscosity, 'cSt', 9)}, mix ${mainFigure(highVolume, 'mL')} of the ${figure(highViscosity, 'cSt', 9)} with ${figure(lowVolume, 'mL')} of the ${figure(lowViscosity, 'cSt', 9)}.`,
      more: [
        say`That is ${figure(highFraction * 100, '%')} of the thicker one. A second rule says ${figure(highFractionVbn * 100, '%')}, or ${figure(other, 'mL')}: the gap between the two is how well anyone knows it.`,
        say`Weigh if you can: the rule is by weight, and silicone fluids of one family weigh nearly the same for their volume. Stir slowly and let the bubbles rise.`,
      ],
    }
  },
  working: blendWorking,
  plots: (inputs, outputs) => [blendPlot(inputs, outputs)],
  limits: {
    goodBetween:
      'Two plain silicone fluids of the same family, at the same temperature, one at most ten times as thick as the other.',
    howClose:
      'Two rules are shown because neither is a standard for silicone. Neighbouring bottles differ by less than 1\u00A0%; for fluids 10 to 1 the blend may come out about 11\u00A0% thinner or 24\u00A0% thicker than the first rule says.',
  },
  sources: [
    {
      text: 'S. Arrhenius, Zeitschrift für Physikalische Chemie 1 (1887) 285: the logarithms of the viscosities, weighted by share, add up.',
      known:
        'The citation is from memory; the rule is listed under this name in Oil & Gas Science and Technology 76 (2021), article ogst210047, which was read.',
    },
    {
      text: 'R. E. Maples, Petroleum Refinery Process Economics, 2nd edition, PennWell 2000: the blending number called Refutas, by weight.',
      url: 'https://www.crazyengineers.com/threads/viscosity-blending-equations.1315',
      known: 'Read as quoted in a public discussion; the book itself was not seen.',
    },
    {
      text: 'ASTM D7152 describes blending for petroleum products and says it may not suit other products. No standard for silicone blends was found.',
      known: 'Its scope was read; its full text was not.',
    },
  ],
  cautions: fluidCautions,
})
