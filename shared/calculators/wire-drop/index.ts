export { calculator }

import { changeInWords } from '../common/change-in-words.ts'
import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { wireCautions } from './cautions.ts'
import { copperWire } from './copper-wire.ts'
import { heatPlot } from './plot.ts'
import { wireWorking } from './working.ts'

/** Above this the leads are for bursts only, W for each metre of one lead: still air takes away much less. */
const hotPerMetre = 30

const calculator = defineCalculator({
  slug: 'wire-drop',
  title: 'What your battery wires waste',
  purpose:
    'Says how much voltage and power is lost in the two leads between battery and speed control. Use it before you solder thinner, longer or heavier wire into the car.',
  part: 'motor and gearing',
  keywords: [
    'wire',
    'AWG',
    'gauge',
    'voltage drop',
    'battery lead',
    'solder',
    'hot wire',
    'cable',
    'thick wire',
    'resistance',
  ],
  inputs: [
    {
      key: 'gauge',
      label: 'Wire gauge',
      unit: 'AWG',
      default: 12,
      min: 0,
      max: 40,
      whole: true,
      ladder: [8, 10, 12, 13, 14, 16, 18, 20, 22],
      reason: 'thicker does not fit and thinner is not sold for R/C',
      help: 'Printed on the wire. The larger the number, the thinner the wire.',
      carKey: 'wireGauge',
    },
    {
      key: 'length',
      label: 'Length of one lead',
      unit: 'mm',
      default: 150,
      min: 1,
      max: 5000,
      step: 10,
      reason: 'there is no wire without length, and none that long in a car',
      help: 'From plug to speed control, one way. Both leads are counted.',
      carKey: 'wireLength',
    },
    {
      key: 'current',
      label: 'Current',
      unit: 'A',
      default: 60,
      min: 0.1,
      max: 300,
      step: 5,
      reason: 'without current nothing is lost, and more melts the plugs first',
      help: 'The average for the heat, the peak for the worst drop on power.',
    },
    {
      key: 'temperature',
      label: 'Temperature of the wire',
      unit: '°C',
      default: 20,
      min: -40,
      max: 200,
      step: 5,
      reason: 'nobody races colder, and hotter the insulation gives way',
      help: 'Of the copper, not of the air: 50 to 80\u00A0°C after a hard run.',
    },
  ],
  outputs: [
    { key: 'diameter', label: 'Diameter of the copper', unit: 'mm', digits: 4 },
    { key: 'resistance', label: 'Resistance of both leads', unit: 'mΩ', digits: 3 },
    { key: 'voltageDrop', label: 'Voltage lost', unit: 'V', digits: 3 },
    { key: 'heat', label: 'Heat in both leads', unit: 'W', digits: 3 },
  ],
  compute: copperWire,
  warnings({ temperature, length }, { heat }) {
    const warnings: FieldMessage[] = []
    const perMetre = (1000 * heat) / (2 * length)
    if (perMetre > hotPerMetre) {
      warnings.push({
        field: 'current',
        message: say`That is ${figure(perMetre, 'W')} for each metre of wire. For more than a burst the wire gets too hot to touch: take a thicker one.`,
      })
    }
    if (temperature > 100) {
      warnings.push({
        field: 'temperature',
        message: say`A wire at ${figure(temperature, '°C')} burns skin. Silicone insulation stands that for a while, other insulation melts, and a plug’s solder may let go: find out why it is so hot.`,
      })
    }
    return warnings
  },
  answer(inputs, { voltageDrop, heat, resistance }) {
    return {
      says: say`The two leads lose ${mainFigure(voltageDrop, 'V')} at ${figure(inputs.current, 'A')}.`,
      more: [
        say`They turn ${figure(heat, 'W')} into heat as long as that current flows.`,
        say`Their resistance is ${figure(resistance, 'mΩ')}. Plugs and joints add to it, and a worn plug can add more than the wire: feel the plugs after a run before you change the wire.`,
      ],
    }
  },
  working: wireWorking,
  plots: (inputs, outputs) => [heatPlot(inputs, outputs)],
  comparison(inputs, { diameter, voltageDrop, heat }) {
    const gauge = inputs.gauge < 2 ? inputs.gauge + 2 : inputs.gauge - 2
    const other = copperWire({ ...inputs, gauge })
    return {
      says: difference(gauge, inputs.gauge, other.heat / heat, voltageDrop - other.voltageDrop),
      caption: gauge < inputs.gauge ? 'Two sizes thicker' : 'Two sizes thinner',
      columns: [`${inputs.gauge}\u00A0AWG`, `${gauge}\u00A0AWG`],
      rows: [
        { label: say`Diameter of the copper`, unit: 'mm', digits: 3, cells: [diameter, other.diameter] },
        { label: say`Voltage lost`, unit: 'V', digits: 3, cells: [voltageDrop, other.voltageDrop] },
        { label: say`Heat`, unit: 'W', digits: 3, cells: [heat, other.heat] },
      ],
    }
  },
  limits: {
    goodBetween:
      'Copper wire, steady current, from −40 to 200\u00A0°C. Plugs, solder joints and the speed control are not in the sum; wire of copper-clad aluminium has about 1.6 times the resistance.',
    howClose:
      'Standard copper at 20\u00A0°C to a tenth of a per cent. A stranded wire of the same number may have a few per cent less copper and is a little longer than it looks.',
  },
  sources: [
    {
      text: 'ASTM B258: diameter of a wire gauge, 0.127 mm × 92^((36 − n)/39). A public table made by it was read.',
      url: 'https://wp.1728.org/?p=4314',
      known: 'The formula from memory and as read on public pages; the standard itself was not seen.',
    },
    {
      text: 'IEC 60028, International Standard of Resistance for Copper: 1/58 Ω·mm²/m (1.7241 × 10⁻⁸ Ω·m) at 20\u00A0°C and 0.00393 more per K.',
      known: 'From memory; not looked up. Public tables of copper wire agree.',
    },
    {
      text: 'A worn plug can add more than the leads; 50 to 80\u00A0°C after a hard run.',
      known: 'Common practice.',
    },
  ],
  cautions: wireCautions,
})

function difference(gauge: number, own: number, ratio: number, spared: number): Sentence {
  const share = changeInWords(ratio, 'more', 'less', 'as much')
  const volts = figure(Math.abs(spared), 'V', 2)
  return gauge < own
    ? [...say`Two sizes thicker wastes `, ...share, ...say` and leaves the motor ${volts} more.`]
    : [...say`Two sizes thinner wastes `, ...share, ...say` and takes ${volts} from the motor.`]
}
