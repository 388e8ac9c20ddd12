export { calculator }

import { bottlesAround, fluidCautions, siliconeBottles } from '../common/silicone-fluids.ts'
import { changeInWords } from '../common/change-in-words.ts'
import { defineCalculator, type FieldMessage } from '../definition.ts'
import { figure, mainFigure, say, type Sentence } from '../sentence.ts'
import { packInputs } from './inputs.ts'
import { matchingViscosity, shockPack, withEnds, type PackValues } from './piston.ts'
import { packPlot } from './plot.ts'
import { packWorking } from './working.ts'

type Inputs = PackValues & { newHoles: number; newHoleDiameter: number }

const calculator = defineCalculator({
  slug: 'shock-pack',
  title: 'What another shock piston does',
  purpose:
    'Compares two shock pistons and says which oil makes the new one damp like the old. Use it when you change pistons and want to keep the feel, or to find a piston for a feel you cannot reach with oil.',
  part: 'springs and shocks',
  keywords: [
    'shock',
    'piston',
    'holes',
    'drill',
    'oil',
    'damping',
    'pack',
    'cSt',
    'bumps',
    'landing',
    'viscosity',
  ],
  inputs: packInputs,
  outputs: [
    { key: 'damping', label: 'Damping now, slow', unit: 'N·s/m', digits: 3 },
    { key: 'newDamping', label: 'Damping new, slow, same oil', unit: 'N·s/m', digits: 3 },
    { key: 'viscosityToMatch', label: 'Oil that damps the same', unit: 'cSt', digits: 3 },
    { key: 'force', label: 'Force now, at shaft speed', unit: 'N', digits: 3 },
    { key: 'reynolds', label: 'Reynolds number in a hole', unit: '1', digits: 3 },
  ],
  compute(inputs) {
    const { damping, force, reynolds } = shockPack(inputs)
    return {
      damping,
      force,
      reynolds,
      newDamping: shockPack(newPack(inputs)).damping,
      viscosityToMatch: matchingViscosity(inputs.viscosity, ownHoles(inputs), newHoles(inputs)),
    }
  },
  relations(inputs) {
    const { boreDiameter, rodDiameter } = inputs
    if (rodDiameter >= boreDiameter) {
      return [
        {
          field: 'rodDiameter',
          message: say`A rod of ${figure(rodDiameter, 'mm', 6)} does not go into a bore of ${figure(boreDiameter, 'mm', 6)}.`,
        },
      ]
    }
    const room = boreDiameter ** 2 - rodDiameter ** 2
    return (
      [
        ['holeDiameter', ownHoles(inputs)],
        ['newHoleDiameter', newHoles(inputs)],
      ] as const
    ).flatMap(([field, holes]) => {
      if (holes.count * holes.diameter ** 2 < room) return []
      return [
        {
          field,
          message: say`${String(holes.count)} holes of ${figure(holes.diameter, 'mm', 6)} are larger than the piston round its rod: nothing would be left of it.`,
        },
      ]
    })
  },
  warnings(inputs, { reynolds }) {
    const warnings: FieldMessage[] = []
    const fastest = Math.max(reynolds, shockPack(newPack(inputs)).reynolds)
    if (fastest > 2000) {
      warnings.push({
        field: 'shaftSpeed',
        message: say`In a hole the Reynolds number reaches ${figure(fastest, '1')}. Above about 2,000 the flow turns over itself and viscosity no longer rules.`,
      })
    }
    for (const [field, diameter] of [
      ['holeDiameter', inputs.holeDiameter],
      ['newHoleDiameter', inputs.newHoleDiameter],
    ] as const) {
      if (inputs.pistonThickness >= diameter) continue
      warnings.push({
        field,
        message: say`The holes are wider than the piston is thick. Their ends then matter more than their length, and even the comparison is rough.`,
      })
    }
    return warnings
  },
  answer(inputs, outputs) {
    const [own, other] = [ownHoles(inputs), newHoles(inputs)]
    const added = (withEnds(own).length / own.length - 1) * 100
    const counted = matchingViscosity(inputs.viscosity, withEnds(own), withEnds(other))
    return {
      says: say`To damp like ${String(own.count)} × ${figure(own.diameter, 'mm', 4)} in ${figure(inputs.viscosity, 'cSt', 9)}, a piston of ${String(other.count)} × ${figure(other.diameter, 'mm', 4)} needs about ${mainFigure(outputs.viscosityToMatch, 'cSt')}.`,
      more: [
        bottlesFor(outputs.viscosityToMatch),
        say`Compare pistons with this; do not trust its newtons. Bending into holes this short adds about ${figure(added, '%', 2)} to the real damping of your piston, and with that counted for both the match is ${figure(counted, 'cSt')}.`,
      ],
    }
  },
  working: packWorking,
  plots: (inputs, outputs) => [packPlot(inputs, outputs)],
  comparison(inputs, outputs) {
    const other = shockPack(newPack(inputs))
    return {
      says: [
        ...say`In the same oil the new piston damps `,
        ...changeInWords(outputs.newDamping / outputs.damping, 'more', 'less', 'just as much'),
        ...say` when the shaft moves slowly, and `,
        ...changeInWords(other.force / outputs.force, 'more', 'less', 'just as much'),
        ...say` at ${figure(inputs.shaftSpeed, 'mm/s')}.`,
      ],
      caption: 'If you change the piston and keep the oil',
      columns: ['Now', 'New piston'],
      rows: [
        { label: say`Holes`, unit: '1', digits: 3, cells: [inputs.holes, inputs.newHoles] },
        {
          label: say`Hole diameter`,
          unit: 'mm',
          digits: 4,
          cells: [inputs.holeDiameter, inputs.newHoleDiameter],
        },
        { label: say`Damping, slow`, unit: 'N·s/m', digits: 3, cells: [outputs.damping, outputs.newDamping] },
        {
          label: say`Force at ${figure(inputs.shaftSpeed, 'mm/s')}`,
          unit: 'N',
          digits: 3,
          cells: [outputs.force, other.force],
        },
        {
          label: say`Oil that damps like now`,
          unit: 'cSt',
          digits: 3,
          cells: [inputs.viscosity, outputs.viscosityToMatch],
        },
      ],
    }
  },
  limits: {
    goodBetween:
      'Two pistons of one thickness in one shock, straight round holes all of one size, no valves and no bladder, oil at one temperature. It counts what goes through the holes; what leaks past the piston is left out.',
    howClose:
      'Flow in such holes is smooth, so number and diameter rule; but holes this short have ends worth 30 to 50\u00A0% and speeding the oil up adds more. As force it can be half wrong; between two pistons it is close to a few per cent. 0.05\u00A0mm off in a 1.3\u00A0mm hole is 17\u00A0%.',
  },
  sources: [
    {
      text: 'F. M. White, Fluid Mechanics, chapter 6: Hagen–Poiseuille flow in a round pipe, Q = n π d⁴ Δp/(128 μ L).',
      known: 'From memory; worked examples of four other textbooks were read in public transcriptions.',
    },
    {
      text: 'Z. Dagan, S. Weinbaum and R. Pfeffer, Journal of Fluid Mechanics 115 (1982) 505: a short hole acts 3π/16 of its diameter longer than it is.',
      known: 'From memory; its end for a hole of no length agrees with Sampson’s law.',
    },
    {
      text: 'Discharge coefficient 0.61 of a sharp-edged hole. Standards for it (ISO 5167) begin at bores of 12.5 mm and do not cover a damper.',
      known: 'From memory.',
    },
    {
      text: 'Density of dimethyl silicone fluid of 100 cSt and more: 965 to 975 kg/m³ at 25 °C.',
      known: 'Read in public material data.',
    },
  ],
  cautions: fluidCautions,
})

function ownHoles({ holes, holeDiameter, pistonThickness }: Inputs) {
  return { count: holes, diameter: holeDiameter, length: pistonThickness }
}

function newHoles({ newHoles: count, newHoleDiameter, pistonThickness }: Inputs) {
  return { count, diameter: newHoleDiameter, length: pistonThickness }
}

/** The same shock with the new piston in it. */
function newPack(inputs: Inputs): PackValues {
  return { ...inputs, holes: inputs.newHoles, holeDiameter: inputs.newHoleDiameter }
}

function bottlesFor(viscosity: number): Sentence {
  const exact = siliconeBottles.find((bottle) => Math.abs(bottle / viscosity - 1) < 0.005)
  if (exact !== undefined) return say`That is a bottle you can buy: ${figure(exact, 'cSt', 9)}.`
  const { below, above } = bottlesAround(viscosity)
  if (below === undefined || above === undefined)
    return say`That lies outside the oils that are bottled; look for another piston.`
  return say`That lies between the ${figure(below, 'cSt', 9)} and ${figure(above, 'cSt', 9)} bottles; two of them can be mixed.`
}
