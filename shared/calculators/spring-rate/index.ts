export { calculator }

import { changeInWords } from '../common/change-in-words.ts'
import { shearModulusInput } from '../common/spring-steel.ts'
import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { formatChosen } from '#shared/units/unit-choices.ts'
import { convert } from '#shared/units/units.ts'
import { coilSpring } from './coil-spring.ts'
import { springPlot } from './plot.ts'
import { springWorking } from './working.ts'

/** The change that is shown beside the spring: wire comes in tenths of a millimetre (common practice). */
const thicker = 0.1

const calculator = defineCalculator({
  slug: 'spring-rate',
  title: 'How stiff a spring is',
  purpose:
    'Works out the rate of a coil spring from its wire, its diameter and its coils. Use it when a spring has lost its colour, or when two makers’ colours mean different things.',
  part: 'springs and shocks',
  keywords: [
    'spring',
    'rate',
    'stiffness',
    'stiff',
    'soft',
    'coil',
    'wire',
    'colour',
    'unmarked',
    'N/mm',
    'lb/in',
    'gf/mm',
  ],
  inputs: [
    {
      key: 'wireDiameter',
      label: 'Wire',
      unit: 'mm',
      default: 1.6,
      min: 0.2,
      max: 10,
      step: 0.05,
      reason: 'springs of model cars are wound from wire of that size',
      help: 'With a caliper, at three places. Paint makes it read too thick: scrape a spot.',
      carKey: { front: 'frontSpringWire', rear: 'rearSpringWire' },
    },
    {
      key: 'outsideDiameter',
      label: 'Outside diameter',
      unit: 'mm',
      default: 23,
      min: 2,
      max: 100,
      step: 0.5,
      reason: 'a spring of a model car is not smaller or larger than that',
      help: 'With a caliper across the coils, in the middle of the spring, off the car.',
      carKey: { front: 'frontSpringOutside', rear: 'rearSpringOutside' },
    },
    {
      key: 'activeCoils',
      label: 'Working coils',
      unit: '1',
      default: 7.5,
      min: 0.5,
      max: 60,
      step: 0.25,
      reason: 'fewer than half a coil is no spring, and more than that does not fit on a shock',
      help: 'Count the coils that touch neither a neighbour nor a seat; quarters count.',
      carKey: { front: 'frontSpringCoils', rear: 'rearSpringCoils' },
    },
    shearModulusInput,
  ],
  outputs: [
    { key: 'rate', label: 'Rate', unit: 'N/mm', digits: 3 },
    { key: 'rateLbfPerIn', label: 'Rate in lbf/in', unit: 'lbf/in', digits: 3, fixedUnit: true },
    { key: 'rateGfPerMm', label: 'Rate in gf/mm', unit: 'gf/mm', digits: 3, fixedUnit: true },
    { key: 'springIndex', label: 'Coil over wire (index)', unit: '1', digits: 3 },
  ],
  compute(inputs) {
    const { rate, springIndex } = coilSpring(inputs)
    return {
      rate,
      rateLbfPerIn: convert(rate, 'N/mm', 'lbf/in'),
      rateGfPerMm: convert(rate, 'N/mm', 'gf/mm'),
      springIndex,
    }
  },
  relations({ wireDiameter, outsideDiameter }) {
    if (outsideDiameter > 2 * wireDiameter) return []
    return [
      {
        field: 'outsideDiameter',
        message: say`A spring of ${figure(wireDiameter, 'mm', 6)} wire must be more than ${figure(2 * wireDiameter, 'mm', 6)} across: two wires side by side leave no hole.`,
      },
    ]
  },
  warnings({ activeCoils }, { springIndex }) {
    const warnings: FieldMessage[] = []
    if (springIndex < 4) {
      warnings.push({
        field: 'outsideDiameter',
        message: say`Coils only ${figure(springIndex, '1')} times as wide as their wire are wound so tightly that the formula reads a few per cent too stiff.`,
      })
    }
    if (activeCoils < 3) {
      warnings.push({
        field: 'activeCoils',
        message: say`With so few coils the ends decide as much as the formula does. Measure this spring: hang a known weight on it.`,
      })
    }
    return warnings
  },
  answer(inputs, { rate, rateLbfPerIn, rateGfPerMm, springIndex }) {
    const misread = coilSpring({ ...inputs, wireDiameter: inputs.wireDiameter + 0.02 }).rate / rate
    return {
      says: say`This spring has a rate of ${mainFigure(rate, 'N/mm')}.`,
      more: [
        // Labels are in one unit or another, so all three stand here whatever the reader chose.
        say`Labels may call it ${formatChosen(rate, 'N/mm', 3, {})}, ${formatChosen(rateLbfPerIn, 'lbf/in', 3, {})} or ${formatChosen(rateGfPerMm, 'gf/mm', 3, {})}.`,
        say`Measure the wire with care: ${figure(0.02, 'mm')} of paint makes it read ${figure((misread - 1) * 100, '%', 2)} too stiff.`,
        woundLike(springIndex),
      ],
    }
  },
  working: springWorking,
  plots: (inputs, outputs) => [springPlot(inputs, outputs)],
  comparison(inputs, { rate }) {
    const wire = inputs.wireDiameter + thicker
    const hasHole = inputs.outsideDiameter > 2 * wire
    const change = hasHole ? thicker : -Math.min(thicker, inputs.wireDiameter / 2)
    const other = { ...inputs, wireDiameter: inputs.wireDiameter + change }
    const otherRate = coilSpring(other).rate
    return {
      says: [
        ...say`${figure(Math.abs(change), 'mm')} ${change > 0 ? 'thicker' : 'thinner'} wire, with the same outside and coils, makes the spring `,
        ...changeInWords(otherRate / rate, 'stiffer', 'softer', 'just as stiff'),
        '.',
      ],
      caption: change > 0 ? 'If the wire were a size thicker' : 'If the wire were a size thinner',
      columns: ['This spring', change > 0 ? 'Thicker wire' : 'Thinner wire'],
      rows: [
        { label: say`Wire`, unit: 'mm', digits: 4, cells: [inputs.wireDiameter, other.wireDiameter] },
        { label: say`Rate`, unit: 'N/mm', digits: 3, cells: [rate, otherRate] },
      ],
    }
  },
  limits: {
    goodBetween:
      'Coils 4 to 12 times as wide as their wire by the handbooks; shock springs are often wound more loosely and the formula still holds. Straight, evenly wound springs of round wire only.',
    howClose:
      'Handbook values of the shear modulus of steel differ by 2\u00A0%. A caliper reading 0.02\u00A0mm off on the wire is worth 5\u00A0% on a 1.6\u00A0mm spring, a quarter coil about 3\u00A0%.',
  },
  sources: [
    {
      text: 'J. E. Shigley and others, Mechanical Engineering Design, chapter 10: k = G d⁴/(8 D³ N).',
      known: 'From memory; the same formula was read in transcriptions of three other textbooks.',
    },
    {
      text: 'D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering, Springer 2018, page 213: the formula with worked coils.',
      url: 'https://fliphtml5.com/osspz/szqt/Automotive_Chassis_Engineering/224',
      known: 'Read.',
    },
    {
      text: 'Shear modulus of music wire (ASTM A228): 11.5 million psi, or 79.3 GPa.',
      known:
        'Read in the material data of a public spring design program; other handbooks give 80.0 to 82.7 GPa by thickness (from memory).',
    },
  ],
  cautions: [],
})

function woundLike(springIndex: number): Sentence {
  const times = figure(springIndex, '1')
  return springIndex > 12
    ? say`Its coils are ${times} times as wide as their wire: looser than the 4 to 12 that handbooks advise, as shock springs often are. The formula still holds.`
    : say`Its coils are ${times} times as wide as their wire.`
}
