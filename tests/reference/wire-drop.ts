export { cases }

import { all, create, type Unit } from 'mathjs'
import { calculator } from '#shared/calculators/wire-drop/index.ts'
import { outputOf, relative, type ReferenceCase } from './reference-case.ts'

const mathjs = create(all ?? {})
const got = (inputs: Record<string, number>, key: string) => () => outputOf(calculator, inputs, key)
/** One kilometre cannot be asked for; half a metre each way is one metre, and 1 Ω/km is 1 mΩ/m. */
const oneMetre = { length: 500, temperature: 20 }

const table = 'Public table of wire gauges, wp.1728.org/?p=4314: diameter in mm and Ω per km'
const tester =
  'Table of a maker of cable testers, cirris.com/wire-resistance-calculator: diameter in mils and Ω per 100 ft'
const base = { calculator: 'wire-drop' } as const
const cases: readonly ReferenceCase[] = [
  ...(
    [
      [10, 2.5883, 3.28],
      [12, 2.0523, 5.21],
      [14, 1.6281, 8.28],
      [16, 1.2903, 13.17],
      [20, 0.8128, 33.29],
      [36, 0.127, 1360],
    ] as const
  ).flatMap(([gauge, millimetres, ohmsPerKilometre]): ReferenceCase[] => [
    {
      ...base,
      what: `${gauge} AWG: diameter`,
      source: table,
      evidence: 'read',
      unit: 'mm',
      expected: millimetres,
      tolerance: 0.0013,
      toleranceReason: 'the table converts from inches rounded to a ten-thousandth, which is 0.00127 mm',
      got: got({ gauge }, 'diameter'),
    },
    {
      ...base,
      what: `${gauge} AWG: resistance of a metre at 20 °C`,
      source: table,
      evidence: 'read',
      unit: 'mΩ',
      ...relative(ohmsPerKilometre, 2.5e-3),
      toleranceReason: 'printed to three or four digits, and made with a resistivity rounded otherwise',
      got: got({ ...oneMetre, gauge }, 'resistance'),
    },
  ]),
  ...(
    [
      [12, 80.808, 0.1588],
      [16, 50.82, 0.4016],
      [24, 20.1, 2.567],
    ] as const
  ).flatMap(([gauge, mils, ohms]): ReferenceCase[] => [
    {
      ...base,
      what: `${gauge} AWG: diameter, printed as ${mils} mils`,
      source: tester,
      evidence: 'read',
      unit: 'mm',
      ...relative(mils * 0.0254, 5e-5),
      toleranceReason: 'printed to five digits, the rest cut off rather than rounded',
      got: got({ gauge }, 'diameter'),
    },
    {
      ...base,
      what: `${gauge} AWG: resistance of a metre, printed as ${ohms} Ω per 100 ft`,
      source: tester,
      evidence: 'read',
      unit: 'mΩ',
      ...relative((ohms * 1000) / 30.48, 1e-3),
      toleranceReason: 'printed to four digits, and made with a resistivity rounded otherwise',
      got: got({ ...oneMetre, gauge }, 'resistance'),
    },
  ]),
  {
    ...base,
    what: '20 A through 100 ft of 12 AWG and back: voltage (a tenth of the length at ten times the current)',
    source: 'Worked example of voltagedropcalculator.net/examples: 6.4 V',
    evidence: 'read',
    unit: 'V',
    expected: 6.4,
    tolerance: 0.05,
    toleranceReason: 'half a unit of the last printed digit',
    got: got({ gauge: 12, length: 3048, current: 200, temperature: 20 }, 'voltageDrop'),
  },
  {
    ...base,
    what: 'heat of 45 A in twice 180 mm of 14 AWG at 70 °C',
    source:
      'The quantities with units, from the gauge in inches (0.005 in × 92^(22/39)), evaluated by mathjs 15',
    evidence: 'computed independently',
    unit: 'W',
    ...relative(
      (
        mathjs.evaluate(
          '(45 A)^2 * (1/58) ohm mm^2/m * (1 + 0.00393 * 50) * 2 * 180 mm / (pi/4 * (0.005 in * 92^(22/39))^2)',
        ) as Unit
      ).toNumber('W'),
      3e-5,
    ),
    toleranceReason: 'IEC 60028 defines 1/58 Ω·mm²/m; the contract rounds that to 1.7241',
    got: got({ gauge: 14, length: 180, current: 45, temperature: 70 }, 'heat'),
  },
]
